import type { EvaluationRequest } from '@merestone/engine';
import { sendJson } from '../../../shared/api/http';
import type { KeptEvaluation } from '../../../shared/api/types';

/** Has the server compute and keep an evaluation of one revision. A refusal comes back as a thrown `ApiProblem`. */
export function keepEvaluation(
  slug: string,
  revision: number,
  request: EvaluationRequest,
): Promise<KeptEvaluation> {
  return sendJson<KeptEvaluation>('POST', `/api/correlations/${encodeURIComponent(slug)}/evaluations`, {
    revision,
    ...request,
  });
}
