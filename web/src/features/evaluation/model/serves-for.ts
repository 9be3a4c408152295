import { QUANTITIES } from '@merestone/engine';

/** Whether a quantity of the sheet serves as an input of a property equation: the same entry, or one covers the other. */
export function servesFor(given: string, wanted: string): boolean {
  return (
    given === wanted ||
    (QUANTITIES[given]?.covers?.includes(wanted) ?? false) ||
    (QUANTITIES[wanted]?.covers?.includes(given) ?? false)
  );
}
