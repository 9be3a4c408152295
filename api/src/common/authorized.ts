import { ApiProblem } from './problem.js';
import type { ProblemCode } from './problem-codes.js';

declare const authorized: unique symbol;

/**
 * Proof, in the type, that the caller may do the act at hand to this very object. Functions that change a record
 * take `Authorized<T>`, so that leaving the check out does not compile.
 */
export type Authorized<T> = T & { readonly [authorized]: true };

/** What a policy says. The reason is a sentence for the person who is refused. */
export type Decision =
  | { readonly allowed: true }
  | { readonly allowed: false; readonly code: ProblemCode; readonly reason: string };

export const ALLOWED: Decision = { allowed: true };

export function denied(reason: string, code: ProblemCode = 'forbidden'): Decision {
  return { allowed: false, code, reason };
}

/** The only way to an `Authorized<T>`. Throws the policy's refusal as a problem. */
export function authorize<T extends object>(subject: T, decision: Decision): Authorized<T> {
  if (!decision.allowed) throw new ApiProblem(decision.code, decision.reason);
  return subject as Authorized<T>;
}
