import type { EvaluationRequest, Numbers, Part } from '@merestone/engine';
import { namesIn } from './names-in';

/** Symbols that a part's coefficient still needs, where there is a result but no coefficient yet. */
export function lackingForCoefficient(
  part: Part | undefined,
  quantities: readonly { symbol: string; table?: string }[],
  request: EvaluationRequest,
  numbers: Numbers,
): string[] {
  if (!part?.coefficient) return [];
  const names = new Set(namesIn(part.coefficient.expression));
  return quantities
    .filter(({ symbol }) => names.has(symbol))
    .filter(({ symbol, table }) => {
      const given = Object.hasOwn(request.inputs, symbol) || Object.hasOwn(request.equations ?? {}, symbol);
      return !given && !(table !== undefined && Object.hasOwn(numbers.rows, table));
    })
    .map(({ symbol }) => symbol);
}
