import type { CompiledSheet } from '../sheet/compiled.js';
import type { EvaluationRequest, Problem } from './outcome.js';

/** A group given together with everything it is made of says the same thing twice. */
export function checkOverDetermined(sheet: CompiledSheet, request: EvaluationRequest): Problem[] {
  const given = new Set([...Object.keys(request.inputs), ...Object.keys(request.equations ?? {})]);
  for (const [symbol, { definition }] of sheet.quantities)
    if (definition.table && Object.hasOwn(request.rows ?? {}, definition.table)) given.add(symbol);
  return Object.keys(request.inputs)
    .filter((symbol) => sheet.lines.get(symbol)?.line.kind === 'group')
    .filter((symbol) => made(sheet, symbol, given))
    .map((symbol) => ({
      code: 'over-determined',
      field: `inputs.${symbol}`,
      message: `${symbol} is given and so is everything it is made of: give one or the other.`,
    }));
}

/** Whether all quantities (and given groups) behind a group are given; `known` keeps the answers of lines on the way. */
function made(
  sheet: CompiledSheet,
  symbol: string,
  given: ReadonlySet<string>,
  known = new Map<string, boolean>(),
): boolean {
  const before = known.get(symbol);
  if (before !== undefined) return before;
  const variants = sheet.lines.get(symbol)?.variants;
  const answer =
    variants?.every(({ needs }) =>
      needs.every((need) => given.has(need) || made(sheet, need, given, known)),
    ) ?? false;
  known.set(symbol, answer);
  return answer;
}
