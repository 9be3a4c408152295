import type { components } from '@merestone/api-client';
import { api, ask } from '../../../shared/api/client';

type Schemas = components['schemas'];

export function fileReport(slug: string, body: Schemas['ProblemReportBody']) {
  return ask(api.POST('/api/correlations/{slug}/problem-reports', { params: { path: { slug } }, body }));
}

export function answerReport(id: number, body: Schemas['ProblemReportAnswerBody']) {
  return ask(api.POST('/api/problem-reports/{id}/answer', { params: { path: { id } }, body }));
}
