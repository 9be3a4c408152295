import type { EvaluationRequest } from '@merestone/engine';
import type { ApiProblem } from '../../../shared/api/api-problem';
import type { KeptEvaluation } from '../../../shared/api/types';

/** How the last sending to the server went. `asked` is the duty it was about, so that a later change shows. */
export type Keeping =
  | { state: 'none' }
  | { state: 'sending'; asked: string }
  | { state: 'kept'; asked: string; kept: KeptEvaluation; request: EvaluationRequest }
  | { state: 'refused'; asked: string; problem: ApiProblem }
  | { state: 'failed'; asked: string; problem: ApiProblem };

/** A duty as one text, to tell whether it has changed since. */
export function askedOf(request: EvaluationRequest): string {
  return JSON.stringify(request);
}
