import type { CompiledQuantity, CompiledSheet, PropertyLibrary } from '../sheet/compiled.js';
import { ownValue } from './given-values.js';
import type { EvaluationRequest, Problem } from './outcome.js';

/** What must be given first, each with the other ways to get it. `rho.T` is the T of the equation that fills rho. */
export function missingProblems(
  sheet: CompiledSheet,
  request: EvaluationRequest,
  library: PropertyLibrary,
  missing: ReadonlySet<string>,
): Problem[] {
  return [...missing].map((symbol): Problem => {
    const [head = symbol, inner] = symbol.split('.');
    const slug = inner === undefined ? undefined : ownValue(request.equations, head);
    const equation = slug === undefined ? undefined : library(slug);
    const quantity = inner === undefined ? sheet.quantities.get(head) : equation?.sheet.quantities.get(inner);
    const title = quantity?.entry.title ?? symbol;
    const purpose = equation ? ` for "${equation.definition.title}"` : '';
    return {
      code: 'missing',
      field: `inputs.${symbol}`,
      message: `${title} (${symbol}) is needed${purpose}: ${waysText(quantity, equation !== undefined)}.`,
    };
  });
}

function waysText(quantity: CompiledQuantity | undefined, inEquation: boolean): string {
  const { table, equations } = quantity?.definition ?? {};
  return [
    'give it',
    ...(table ? [`choose a row of "${table}"`] : []),
    // A property equation's own inputs are never filled by another one.
    ...(equations?.length && !inEquation ? ['name a property equation for it'] : []),
  ].join(', or ');
}
