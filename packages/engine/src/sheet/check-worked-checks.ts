import type { Problem } from '../evaluation/outcome.js';
import { measuresSame, readUnit } from '../quantity/unit.js';
import { definition } from './check-symbols.js';
import type { WorkedCheck } from './common-schema.js';
import type { Calculable } from './lines.js';

/** Worked checks speak of symbols that exist, in units that fit them; a published one names its source. */
export function checkWorkedChecks({ checks, quantities, lines }: Calculable): Problem[] {
  const inputs = new Set([
    ...quantities.map(({ symbol }) => symbol),
    ...lines.filter(({ kind }) => kind === 'group').map(({ symbol }) => symbol),
  ]);
  const units = new Map([...quantities, ...lines].map(({ symbol, unit }) => [symbol, unit]));
  return checks.flatMap((check, i) => [
    ...Object.keys(check.inputs)
      .filter((symbol) => !inputs.has(symbol.split('.')[0] ?? symbol))
      .map((symbol) =>
        definition(`checks[${i}].inputs.${symbol}`, `There is no quantity or group ${symbol}.`),
      ),
    ...checkExpected(check, units, `checks[${i}].expected`),
    ...(check.kind === 'published' && !check.source
      ? [definition(`checks[${i}].source`, 'A published check names its source.')]
      : []),
  ]);
}

function checkExpected(
  { expected }: WorkedCheck,
  units: ReadonlyMap<string, string>,
  field: string,
): Problem[] {
  const entries = Object.entries(expected);
  if (entries.length === 0) return [definition(field, 'A check expects something.')];
  return entries.flatMap(([symbol, { unit }]): Problem[] => {
    const own = units.get(symbol);
    if (own === undefined) return [definition(`${field}.${symbol}`, `There is no symbol ${symbol}.`)];
    if (unit === undefined) return [];
    const [given, needed] = [readUnit(unit), readUnit(own)];
    if (!given.ok) return [{ code: 'unit', field: `${field}.${symbol}`, message: `${given.reason}.` }];
    // Where the sheet's own unit cannot be read, that is told at its place.
    return !needed.ok || measuresSame(given.unit, needed.unit)
      ? []
      : [
          {
            code: 'unit',
            field: `${field}.${symbol}`,
            message: `${symbol} is in ${own}; "${unit}" does not fit.`,
          },
        ];
  });
}
