import { asApiProblem } from '../../../shared/api/api-problem';

/** Why somebody is not signed in, and what to do about it. */
export function refusalWords(thrown: unknown): string {
  const problem = asApiProblem(thrown);
  if (problem.status === 401)
    return 'E-mail address and password do not belong together. Check both and try again.';
  if (problem.status === 429) return 'Too many attempts. Wait a few minutes, then try again.';
  return problem.detail ? `${problem.title}. ${problem.detail}` : `${problem.title}.`;
}
