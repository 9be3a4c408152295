import type { Static, TSchema } from '@sinclair/typebox';
import { Value } from '@sinclair/typebox/value';
import { ApiProblem, type FieldProblem } from '../common/problem.js';

const MOST_PROBLEMS = 40;

/** A value of the form asked for; else `malformed` with every fault at its path. Interpreted: nothing is generated. */
export function readForm<S extends TSchema>(schema: S, value: unknown): Static<S> {
  if (Value.Check(schema, value)) return value;
  const fields: FieldProblem[] = [];
  for (const { path, message } of Value.Errors(schema, value)) {
    const field = path.slice(1).replaceAll('/', '.') || 'file';
    if (fields.some((one) => one.field === field)) continue;
    fields.push({ field, code: 'malformed', message: `${message.replace(/^Expected/, 'must be')}.` });
    if (fields.length >= MOST_PROBLEMS) break;
  }
  throw new ApiProblem('malformed', 'The file is not of the form asked for.', { fields });
}
