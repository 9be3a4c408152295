import type { Outcome, Problem } from '@merestone/engine';
import { ApiProblem, type Alternative } from '../common/problem.js';

/** The inputs cannot be used: 400, or 422 where they are of the right form and the formula has no value there. */
export function inputProblem(problems: readonly Problem[]): ApiProblem {
  const first = problems.find(({ code }) => code !== 'domain') ?? problems[0];
  const detail = problems
    .map(({ message }) => message)
    .slice(0, 3)
    .join(' ');
  const fields = problems.map(({ code, field, message }) => ({ code, field, message }));
  return new ApiProblem(first?.code ?? 'malformed', detail, { fields });
}

/** A value is outside a bound: 422, with what was found and where to turn instead. No number is in it. */
export function refusalProblem(
  { code, findings, message }: Extract<Outcome, { outcome: 'refused' }>,
  alternatives: readonly Alternative[],
): ApiProblem {
  return new ApiProblem(code, message, { findings, alternatives });
}
