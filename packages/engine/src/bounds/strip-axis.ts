import type { Stretch } from '../sheet/common-schema.js';

export type StripScale = 'log' | 'linear';

/** The values at the two ends of a strip. */
export interface StripAxis {
  from: number;
  to: number;
}

/** From a value to its share of the width, held at the edges. */
export function placer({ from, to }: StripAxis, scale: StripScale): (value: number) => number {
  const map = scale === 'log' ? (v: number) => (v > 0 ? Math.log(v) : -Infinity) : (v: number) => v;
  const start = map(from);
  const span = map(to) - start || 1;
  return (value) => Math.min(1, Math.max(0, (map(value) - start) / span));
}

/**
 * An axis that shows the limits with room on both sides, so that it stands still while a value moves about them;
 * a value farther out stretches it.
 */
export function naturalAxis(
  stretches: readonly Stretch[],
  scale: StripScale,
  value: number | null,
): StripAxis {
  const map = scale === 'log' ? Math.log10 : (v: number) => v;
  const back = scale === 'log' ? (v: number) => 10 ** v : (v: number) => v;
  const limits = stretches
    .flatMap(({ lo, hi }) => [lo?.value, hi?.value])
    .filter((v) => v !== undefined)
    .map(map);
  const shown = value !== null && (scale === 'linear' || value > 0) ? map(value) : null;
  if (limits.length === 0) limits.push(shown ?? (scale === 'log' ? 0 : 0.5));

  const low = Math.min(...limits);
  const high = Math.max(...limits);
  const room = roomBeside(low, high, scale);
  // Where no limit is stated there must be ground for a stretch that runs out.
  let from = low - (stretches[0]?.lo ? room : 2 * room);
  let to = high + (stretches.at(-1)?.hi ? room : 2 * room);
  if (shown !== null) {
    const edge = 0.08 * (Math.max(to, shown) - Math.min(from, shown));
    from = Math.min(from, shown - edge);
    to = Math.max(to, shown + edge);
  }
  return { from: back(from), to: back(to) };
}

/** Nearly half the span on each side; of a single limit a good half decade, or half its size. */
function roomBeside(low: number, high: number, scale: StripScale): number {
  const span = high - low;
  if (span > 0) return scale === 'log' ? Math.min(0.45 * span, 1.2) : 0.4 * span;
  return scale === 'log' ? 0.6 : Math.max(Math.abs(high) * 0.5, 0.5);
}
