/** Relative distance below which a value counts as the limit itself: unit conversion may shift the last digits. */
const ROUNDING = 1e-12;

/** −1 below, 0 on, 1 above the limit. */
export function compareWithLimit(value: number, limit: number): -1 | 0 | 1 {
  if (Math.abs(value - limit) <= ROUNDING * Math.abs(limit)) return 0;
  return value < limit ? -1 : 1;
}

export interface Interval {
  lo?: number | undefined;
  hi?: number | undefined;
  loClosed: boolean;
  hiClosed: boolean;
}

/** Whether a value lies in an interval; on a limit only where that is closed. */
export function holds(value: number, { lo, hi, loClosed, hiClosed }: Interval): boolean {
  if (lo !== undefined && compareWithLimit(value, lo) < (loClosed ? 0 : 1)) return false;
  return !(hi !== undefined && compareWithLimit(value, hi) > (hiClosed ? 0 : -1));
}

/** Whether two intervals share no value. */
export function apart(a: Interval, b: Interval): boolean {
  return endsBefore(a, b) || endsBefore(b, a);
}

/** Whether every value of the first lies below every value of the second. */
export function endsBefore(a: Interval, b: Interval): boolean {
  if (a.hi === undefined || b.lo === undefined) return false;
  return a.hi < b.lo || (a.hi === b.lo && !(a.hiClosed && b.loClosed));
}
