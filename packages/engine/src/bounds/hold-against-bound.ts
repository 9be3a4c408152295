import { formatNumber } from '../expression/number-text.js';
import type { Finding } from '../evaluation/outcome.js';
import type { Bound, BoundEnd, Stretch } from '../sheet/common-schema.js';
import { compareWithLimit, holds } from './interval.js';

/** A value this close to a limit (as a share of it) is told as near. */
const NEAR = 0.05;
/** How far past a limit of data a deviation may go, where the sheet says nothing else. */
export const DEFAULT_REACH = 2;

const BASIS_WORDS = {
  stated: 'stated in the source',
  handbook: 'from a handbook',
  'common-practice': 'common practice',
  none: 'no source',
} as const;

/** Holds one value (in the symbol's unit on the sheet) against its bound; null where it is not known. */
export function holdAgainstBound(
  bound: Bound,
  value: number | null,
  unit: string,
  label = bound.on,
): Finding {
  const blank: Finding = {
    symbol: label,
    kind: 'unchecked',
    value,
    unit,
    lo: null,
    hi: null,
    loClosed: true,
    hiClosed: true,
    nature: null,
    basis: bound.basis,
    ratio: null,
    deviable: false,
    beyond: [],
    message: '',
  };
  if (bound.stretches.length === 0)
    return {
      ...blank,
      message: `No bound is on record for ${label}: whether it holds here is the engineer's to judge.`,
    };
  if (value === null) {
    const [only] = bound.stretches;
    const limits = bound.stretches.length === 1 && only ? limitsOf(only) : {};
    return {
      ...blank,
      ...limits,
      message: `${label} could not be held against its bound: it is not known here.`,
    };
  }
  const inside = bound.stretches.find((stretch) => holds(value, intervalOf(stretch)));
  if (inside) return insideFinding({ ...blank, ...limitsOf(inside) }, inside, value);
  return outsideFinding(blank, bound, value);
}

function intervalOf({ lo, hi }: Stretch) {
  return { lo: lo?.value, hi: hi?.value, loClosed: lo?.closed ?? true, hiClosed: hi?.closed ?? true };
}

function limitsOf({ lo, hi }: Stretch): Pick<Finding, 'lo' | 'hi' | 'loClosed' | 'hiClosed'> {
  return {
    lo: lo?.value ?? null,
    hi: hi?.value ?? null,
    loClosed: lo?.closed ?? true,
    hiClosed: hi?.closed ?? true,
  };
}

function insideFinding(blank: Finding, { lo, hi }: Stretch, value: number): Finding {
  const toHi = ratioTo(hi, value, 'hi');
  const toLo = ratioTo(lo, value, 'lo');
  const upper = (toHi ?? 0) >= (toLo ?? 0);
  const ratio = upper ? toHi : toLo;
  const end = upper ? hi : lo;
  const near = ratio !== null && ratio > 1 - NEAR && end?.nature !== 'physical' && !narrow(lo, hi);
  const shown = `${blank.symbol} = ${formatNumber(value)}${unitText(blank.unit)}`;
  return {
    ...blank,
    kind: near ? 'near' : 'within',
    ratio,
    nature: near ? (end?.nature ?? null) : null,
    message: near
      ? `${shown} is in bounds, near the ${upper ? 'upper' : 'lower'} bound ${formatNumber(end?.value ?? 0)}.`
      : `${shown} is in bounds.`,
  };
}

/** A stretch so short that all of it would be near: it stands for a single value. */
function narrow(lo: BoundEnd | undefined, hi: BoundEnd | undefined): boolean {
  return lo !== undefined && hi !== undefined && lo.value > 0 && hi.value / lo.value < 1 + 2 * NEAR;
}

/** Value over upper limit, or lower limit over value; null where that says nothing. */
function ratioTo(end: BoundEnd | undefined, value: number, side: 'lo' | 'hi'): number | null {
  if (!end || end.value <= 0 || value <= 0) return null;
  return side === 'hi' ? value / end.value : end.value / value;
}

function outsideFinding(blank: Finding, bound: Bound, value: number): Finding {
  const above = bound.stretches.findIndex(
    ({ lo }) => lo !== undefined && compareWithLimit(value, lo.value) <= 0,
  );
  const next = bound.stretches[above];
  const previous = above < 0 ? bound.stretches.at(-1) : bound.stretches[above - 1];
  if (next && previous) return betweenFinding(blank, previous, next, value);
  if (next) return beyondFinding({ ...blank, ...limitsOf(next) }, next.lo, value, 'lo');
  return beyondFinding({ ...blank, ...(previous ? limitsOf(previous) : {}) }, previous?.hi, value, 'hi');
}

function betweenFinding(blank: Finding, below: Stretch, above: Stretch, value: number): Finding {
  const [lo, hi] = [below.hi?.value ?? null, above.lo?.value ?? null];
  return {
    ...blank,
    kind: 'between',
    lo,
    hi,
    loClosed: below.hi?.closed ?? true,
    hiClosed: above.lo?.closed ?? true,
    nature: below.hi?.nature ?? null,
    beyond: [...(below.hi?.beyond ?? []), ...(above.lo?.beyond ?? [])],
    message: `${blank.symbol} = ${formatNumber(value)}${unitText(blank.unit)} lies between the stretch that ends at ${formatNumber(lo ?? 0)} and the one that begins at ${formatNumber(hi ?? 0)}; neither holds there.`,
  };
}

function beyondFinding(blank: Finding, end: BoundEnd | undefined, value: number, side: 'lo' | 'hi'): Finding {
  if (!end) return blank;
  const ratio = ratioTo(end, value, side);
  const data = end.nature === 'data';
  const reached = data && withinReach(end, value, side);
  const sideWord = side === 'hi' ? 'upper' : 'lower';
  const shown = `${blank.symbol} = ${formatNumber(value)}${unitText(blank.unit)}`;
  const far =
    ratio === null ? `is ${side === 'hi' ? 'above' : 'below'} the` : `is ${farText(ratio, side)} the`;
  return {
    ...blank,
    kind: data && !reached ? 'past-reach' : 'outside',
    nature: end.nature,
    ratio,
    deviable: reached,
    beyond: end.beyond ?? [],
    message: `${shown} ${far} ${sideWord} bound ${formatNumber(end.value)} (${BASIS_WORDS[blank.basis]}). ${consequence(end, reached, side)}`,
  };
}

function farText(ratio: number, side: 'lo' | 'hi'): string {
  return side === 'hi' ? `${formatNumber(ratio, 3)} ×` : `${formatNumber(1 / ratio, 3)} ×`;
}

function withinReach(end: BoundEnd, value: number, side: 'lo' | 'hi'): boolean {
  if (end.value <= 0) return false;
  const reach = end.reach ?? DEFAULT_REACH;
  return side === 'hi'
    ? compareWithLimit(value, end.value * reach) <= 0
    : compareWithLimit(value, end.value / reach) >= 0;
}

function consequence(end: BoundEnd, reached: boolean, side: 'lo' | 'hi'): string {
  switch (end.nature) {
    case 'regime':
      return 'The limit is a change of regime: no deviation is possible; choose a correlation for the other side.';
    case 'definition':
      return 'Beyond it the formula has no meaning: no deviation is possible.';
    case 'physical':
      return 'Such a value cannot be.';
    case 'data':
      if (reached) return 'The data end there: choose another correlation, or record a deviation.';
      if (end.value <= 0) return 'The data end there, and a deviation has no reach from such a limit.';
      return `The data end there, and a deviation reaches to ${formatNumber(reachLimit(end, side))} at most: no number is given.`;
  }
}

function reachLimit(end: BoundEnd, side: 'lo' | 'hi'): number {
  const reach = end.reach ?? DEFAULT_REACH;
  return side === 'hi' ? end.value * reach : end.value / reach;
}

function unitText(unit: string): string {
  return unit === '1' ? '' : `\u2009${unit}`;
}
