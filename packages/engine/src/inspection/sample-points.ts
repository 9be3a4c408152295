import type { Reckoner } from '../evaluation/reckoner.js';
import type { BoundEnd } from '../sheet/common-schema.js';
import { toSI } from '../quantity/unit.js';
import { unitOf, type CompiledSheet } from '../sheet/compiled.js';

/** A box to sample: each bounded symbol with its limits in SI, and everything else held at a known point. */
export interface SampleBox {
  sides: { symbol: string; lo: number; hi: number }[];
  /** Symbols held, with their SI values. */
  held: Map<string, number>;
}

/** A side without a stated limit is followed for this factor past the held value or the other limit. */
const OPEN_SIDE = 100;
const OPEN_INSET = 1e-6;

/**
 * The bounded box of a sheet around a point that was worked out (a worked check): symbols with stretches are varied over
 * them, one box for each stretch of each symbol at most; all other leaves keep their value.
 */
export function boxAround(sheet: CompiledSheet, point: Reckoner): SampleBox {
  const sides = sheet.bounds.flatMap(({ on, stretches }) => {
    const unit = unitOf(sheet, on);
    const first = stretches[0];
    const ends = stretches.flatMap(({ lo, hi }) => [lo, hi]).filter((end) => end !== undefined);
    // What is bounded by physics alone has no range of validity to be sampled.
    if (!unit || !first || !point.has(on) || ends.every(({ nature }) => nature === 'physical')) return [];
    const here = point.valueOf(on);
    const lo = first.lo ? toSI(first.lo.value, unit) : null;
    const hi = stretches.at(-1)?.hi ? toSI(stretches.at(-1)?.hi?.value ?? 0, unit) : null;
    const from = lo ?? Math.min(here, hi ?? here) / OPEN_SIDE;
    const to = hi ?? Math.max(here, from) * OPEN_SIDE;
    // An open limit is not part of the range: stay a hair inside it.
    const inset = (end: BoundEnd | undefined) => (end?.closed === false ? (to - from) * OPEN_INSET : 0);
    return [{ symbol: on, lo: from + inset(first.lo), hi: to - inset(stretches.at(-1)?.hi) }];
  });
  const varied = new Set(sides.map(({ symbol }) => symbol));
  const held = new Map<string, number>();
  for (const symbol of sheet.quantities.keys())
    if (!varied.has(symbol) && point.has(symbol)) held.set(symbol, point.valueOf(symbol));
  for (const [symbol, { line }] of sheet.lines)
    if (line.kind === 'group' && !varied.has(symbol) && point.has(symbol) && !point.solved.includes(symbol))
      held.set(symbol, point.valueOf(symbol));
  return { sides, held };
}

const PRIMES = [2, 3, 5, 7, 11, 13, 17, 19, 23, 29, 31, 37];

/** Point `index` of a Halton sequence over the box: the corners' neighbourhood early, evenly later, the same every time. */
export function samplePoint({ sides, held }: SampleBox, index: number): Map<string, number> {
  const point = new Map(held);
  for (const [i, { symbol, lo, hi }] of sides.entries()) {
    const share = index === 0 ? 0 : index === 1 ? 1 : radicalInverse(index, PRIMES[i % PRIMES.length] ?? 2);
    point.set(symbol, lo > 0 ? lo * (hi / lo) ** share : lo + (hi - lo) * share);
  }
  return point;
}

function radicalInverse(index: number, base: number): number {
  let result = 0;
  let fraction = 1 / base;
  for (let rest = index; rest > 0; rest = Math.floor(rest / base)) {
    result += (rest % base) * fraction;
    fraction /= base;
  }
  return result;
}
