import { symbolText } from '../../../shared/format/symbol-parts';

/** The symbol of a finding in words: `Re`; of a property equation's own bound `T (for ρ)`. */
export function findingLabel(symbol: string): string {
  const [head = symbol, inner] = symbol.split('.');
  return inner === undefined ? symbolText(head) : `${symbolText(inner)} (for ${symbolText(head)})`;
}
