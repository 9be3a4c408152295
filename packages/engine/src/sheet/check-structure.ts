import type { Static, TSchema } from '@sinclair/typebox';
import { Value } from '@sinclair/typebox/value';
import type { Problem } from '../evaluation/outcome.js';
import { CorrelationDefinition, PropertyEquationDefinition } from './definition.js';

export type Structure<T> = { ok: true; definition: T } | { ok: false; problems: Problem[] };
const MOST_PROBLEMS = 40;

/** Whether a value from outside has the form of a sheet; each fault with its path. Interpreted, nothing is generated. */
export function checkStructure(value: unknown): Structure<CorrelationDefinition> {
  return check(CorrelationDefinition, value);
}

export function checkPropertyStructure(value: unknown): Structure<PropertyEquationDefinition> {
  return check(PropertyEquationDefinition, value);
}

function check<S extends TSchema>(schema: S, value: unknown): Structure<Static<S>> {
  if (Value.Check(schema, value)) return { ok: true, definition: value };
  const problems: Problem[] = [];
  const seen = new Set<string>();
  for (const error of Value.Errors(schema, value)) {
    const field = error.path
      .slice(1)
      .replace(/\/(\d+)/g, '[$1]')
      .replaceAll('/', '.');
    if (seen.has(field)) continue;
    seen.add(field);
    problems.push({ code: 'malformed', field: field || 'definition', message: sentence(error.message) });
    if (problems.length >= MOST_PROBLEMS) break;
  }
  return { ok: false, problems };
}

function sentence(message: string): string {
  return `${message.replace(/^Expected/, 'must be').replace(/^Required property/, 'is missing')}.`;
}
