import type { EvaluationRequest } from '@merestone/engine';
import { api, ask } from '../../../shared/api/client';
import type { KeptEvaluation } from '../../../shared/api/types';

/** Has the server compute and keep an evaluation of one revision. A refusal comes back as a thrown `ApiProblem`. */
export function keepEvaluation(
  slug: string,
  revision: number,
  request: EvaluationRequest,
): Promise<KeptEvaluation> {
  return ask(
    api.POST('/api/correlations/{slug}/evaluations', {
      params: { path: { slug } },
      body: { revision, ...request },
    }),
  );
}
