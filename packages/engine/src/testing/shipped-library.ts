import { readdirSync, readFileSync } from 'node:fs';
import { basename } from 'node:path';
import { fileURLToPath } from 'node:url';
import { parse } from 'yaml';
import type { EvaluationRequest, InputValue } from '../evaluation/outcome.js';
import type { CompiledCorrelation, CompiledEquation } from '../sheet/compiled.js';
import type { CorrelationDefinition, PropertyEquationDefinition } from '../sheet/definition.js';
import { compiled, compiledEquation, numbersOf } from './a-sheet.js';

const FIXTURES = fileURLToPath(new URL('../../../../fixtures/', import.meta.url));

const files = new Map(
  ['correlations', 'properties'].flatMap((folder) =>
    readdirSync(`${FIXTURES}${folder}`, { recursive: true })
      .map(String)
      .filter((name) => name.endsWith('.yaml'))
      .map((name) => [basename(name, '.yaml'), `${FIXTURES}${folder}/${name}`] as const),
  ),
);

function contentOf(slug: string): unknown {
  const path = files.get(slug);
  if (!path) throw new Error(`The library has no "${slug}".`);
  return parse(readFileSync(path, 'utf8'));
}

/** A sheet of the library that ships with the program, compiled. */
export function shippedSheet(slug: string): CompiledCorrelation {
  return compiled(contentOf(slug) as CorrelationDefinition);
}

/** A property equation of the library that ships with the program. */
export function shippedEquation(slug: string): CompiledEquation {
  return compiledEquation(slug, contentOf(slug) as PropertyEquationDefinition);
}

/** Evaluates a shipped sheet with its own property equations at hand, and gives the numbers. */
export function evaluateShipped(
  slug: string,
  inputs: Record<string, InputValue>,
  rest: Omit<EvaluationRequest, 'inputs'> = {},
) {
  return numbersOf(shippedSheet(slug), { inputs, ...rest }, (key) =>
    files.has(key) ? shippedEquation(key) : undefined,
  );
}
