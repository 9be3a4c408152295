const FIRST_MINUTES = 1;
const LONGEST_MINUTES = 6 * 60;

/** A letter that could not be sent after this many tries, about three days, is given up. */
export const MOST_TRIES = 20;

/** Minutes to wait after so many failed tries: 1, 2, 4 … at most six hours. */
export function backOffMinutes(tries: number): number {
  return Math.min(FIRST_MINUTES * 2 ** Math.max(0, tries - 1), LONGEST_MINUTES);
}
