import type { Problem } from '../evaluation/outcome.js';
import { definition } from './check-symbols.js';
import type { Calculable } from './lines.js';

/** Worked checks speak of symbols that exist; a published one names its source. */
export function checkWorkedChecks({ checks, quantities, lines, answers }: Calculable): Problem[] {
  const inputs = new Set([
    ...quantities.map((q) => q.symbol),
    ...lines.filter((l) => l.kind === 'group').map((l) => l.symbol),
  ]);
  const outputs = new Set([...lines.map((l) => l.symbol), ...quantities.map((q) => q.symbol), ...answers]);
  return checks.flatMap((check, i) => [
    ...Object.keys(check.inputs)
      .filter((symbol) => !inputs.has(symbol.split('.')[0] ?? symbol))
      .map((symbol) =>
        definition(`checks[${i}].inputs.${symbol}`, `There is no quantity or group ${symbol}.`),
      ),
    ...Object.keys(check.expected)
      .filter((symbol) => !outputs.has(symbol))
      .map((symbol) => definition(`checks[${i}].expected.${symbol}`, `There is no symbol ${symbol}.`)),
    ...(Object.keys(check.expected).length === 0
      ? [definition(`checks[${i}].expected`, 'A check expects something.')]
      : []),
    ...(check.kind === 'published' && !check.source
      ? [definition(`checks[${i}].source`, 'A published check names its source.')]
      : []),
  ]);
}
