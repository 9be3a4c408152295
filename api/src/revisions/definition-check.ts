import {
  checkPropertyStructure,
  checkStructure,
  compileCorrelation,
  compilePropertyEquation,
  type CompiledCorrelation,
  type CompiledEquation,
  type Problem,
} from '@merestone/engine';
import { ApiProblem, type FieldProblem } from '../common/problem.js';

/** Reads a correlation's definition and makes it ready for evaluation. Throws with every fault at its path. */
export function readCorrelation(value: unknown): CompiledCorrelation {
  const structure = checkStructure(value);
  if (!structure.ok) throw definitionProblem(structure.problems);
  const compilation = compileCorrelation(structure.definition);
  if (!compilation.ok) throw definitionProblem(compilation.problems);
  return compilation.compiled;
}

/** The same for a property equation; `slug` is its name in the register. */
export function readPropertyEquation(slug: string, value: unknown): CompiledEquation {
  const structure = checkPropertyStructure(value);
  if (!structure.ok) throw definitionProblem(structure.problems);
  const compilation = compilePropertyEquation(slug, structure.definition);
  if (!compilation.ok) throw definitionProblem(compilation.problems);
  return compilation.compiled;
}

/** The engine's problems as one answer, their paths under `definition`. */
export function definitionProblem(problems: readonly Problem[]): ApiProblem {
  const fields = problems.map(({ code, field, message }): FieldProblem => ({
    field: field === 'definition' ? field : `definition.${field}`,
    code,
    message,
  }));
  const detail = fields
    .map(({ field, message }) => `${field}: ${message}`)
    .slice(0, 3)
    .join(' ');
  return new ApiProblem(problems[0]?.code ?? 'definition', detail, { fields });
}
