import {
  evaluate,
  type CompiledCorrelation,
  type EvaluationRequest,
  type Outcome,
  type PropertyLibrary,
} from '@merestone/engine';
import type { BuiltRequest } from './build-request';
import type { FormSection } from './duty-form';
import { fieldErrors, type FieldError } from './field-error';

/** What the browser's own engine makes of the duty as it stands. Nothing of it is on record. */
export type Preview =
  | { state: 'empty' }
  /** Something typed cannot be read or cannot be. */
  | { state: 'wrong'; errors: FieldError[] }
  /** Readable so far, but not yet all that is needed. */
  | { state: 'incomplete'; missing: FieldError[] }
  | { state: 'outcome'; outcome: Outcome; request: EvaluationRequest };

/** Evaluates the duty as far as it goes. */
export function previewOf(
  { compiled, library }: { compiled: CompiledCorrelation; library: PropertyLibrary },
  built: BuiltRequest,
  sections: readonly FormSection[],
): Preview {
  if (!built.started) return { state: 'empty' };
  if (built.errors.length > 0) return { state: 'wrong', errors: built.errors };
  const evaluation = evaluate(compiled, built.request, library);
  if (evaluation.ok) return { state: 'outcome', outcome: evaluation.outcome, request: built.request };
  const others = evaluation.problems.filter((problem) => problem.code !== 'missing');
  return others.length > 0
    ? { state: 'wrong', errors: fieldErrors(others, sections) }
    : { state: 'incomplete', missing: fieldErrors(evaluation.problems, sections) };
}
