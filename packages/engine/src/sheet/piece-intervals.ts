import type { Interval } from '../bounds/interval.js';
import { apart } from '../bounds/interval.js';
import type { Condition, Piece } from './common-schema.js';

/** A condition as an interval: closed below and open above where it says nothing else. */
export function intervalOf(condition: Condition): Interval {
  return {
    lo: condition.lo,
    hi: condition.hi,
    loClosed: condition.loClosed ?? true,
    hiClosed: condition.hiClosed ?? false,
  };
}

/** Whether no point can satisfy both pieces: some symbol's intervals are apart. */
export function piecesApart(a: Piece, b: Piece): boolean {
  return a.when.some((one) =>
    b.when.some((other) => one.on === other.on && apart(intervalOf(one), intervalOf(other))),
  );
}
