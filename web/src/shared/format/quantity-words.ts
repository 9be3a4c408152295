import type { Quantity } from '@merestone/engine';
import { quantityName } from './symbol-on-sheet';

type Place = NonNullable<Quantity['at']>;

const WORDS: Readonly<Record<Place, string>> = {
  bulk: 'in the bulk',
  film: 'at film conditions',
  interface: 'at the interface',
  wall: 'at the wall',
  inlet: 'at the inlet',
};
/** Titles that say already where the value is taken. */
const SAID: Readonly<Record<Place, RegExp>> = {
  bulk: /\bbulk\b/,
  film: /\bfilm\b/,
  interface: /\b(interface|boundary|surface)\b/,
  wall: /\bwall\b/,
  inlet: /\binlet\b/,
};

/** A quantity's title with the place or state at which its sheet takes it: `Gas density, in the bulk`. */
export function quantityWords({ is, at }: Pick<Quantity, 'is' | 'at'>): string {
  const name = quantityName(is);
  return at === undefined || SAID[at].test(name) ? name : `${name}, ${WORDS[at]}`;
}
