import type { ApiProblem } from '../../../shared/api/api-problem';

/** Whether something was refused because the content is no longer the one that was read. */
export function isStale({ status, code }: ApiProblem): boolean {
  return status === 412 || code === 'stale';
}
