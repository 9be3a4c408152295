import { formatNumber } from '../expression/number-text.js';
import type { Finding } from '../evaluation/outcome.js';
import { printedUnit } from '../quantity/printed-unit.js';
import type { Bound, BoundEnd, Stretch } from '../sheet/common-schema.js';
import { compareWithLimit, holds } from './interval.js';
import { isTemperature, isWithinReach, ratioTo, reachLimit, type Side } from './reach.js';

/** A value this close to a limit (as a share of it) is told as near. */
const NEAR = 0.05;
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
  const toHi = ratioTo(hi, value, 'hi', blank.unit);
  const toLo = ratioTo(lo, value, 'lo', blank.unit);
  const upper = (toHi ?? 0) >= (toLo ?? 0);
  const ratio = upper ? toHi : toLo;
  const end = upper ? hi : lo;
  const near =
    ratio !== null &&
    ratio > 1 - NEAR &&
    end?.nature !== 'physical' &&
    !narrow(lo, hi) &&
    !onDefinition(end, value);
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

/** The very end of a definition is an ordinary value of it, such as a constant that a table gives. */
function onDefinition(end: BoundEnd | undefined, value: number): boolean {
  return end?.nature === 'definition' && compareWithLimit(value, end.value) === 0;
}

/** A stretch so short that all of it would be near: it stands for a single value. */
function narrow(lo: BoundEnd | undefined, hi: BoundEnd | undefined): boolean {
  return lo !== undefined && hi !== undefined && lo.value > 0 && hi.value / lo.value < 1 + 2 * NEAR;
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

function beyondFinding(blank: Finding, end: BoundEnd | undefined, value: number, side: Side): Finding {
  if (!end) return blank;
  const { unit } = blank;
  const reached = isWithinReach(end, value, side, unit);
  const sideWord = side === 'hi' ? 'upper' : 'lower';
  const shown = `${blank.symbol} = ${formatNumber(value)}${unitText(unit)}`;
  return {
    ...blank,
    kind: end.nature === 'data' && !reached ? 'past-reach' : 'outside',
    nature: end.nature,
    ratio: ratioTo(end, value, side, unit),
    deviable: reached,
    beyond: end.beyond ?? [],
    message: `${shown} is ${farText(end, value, side, unit)} the ${sideWord} bound ${formatNumber(end.value)} (${BASIS_WORDS[blank.basis]}). ${consequence(end, reached, side, unit)}`,
  };
}

/** How far out: as a multiple of the bound, in degrees for a temperature, else just on which side. */
function farText(end: BoundEnd, value: number, side: Side, unit: string): string {
  const aside = side === 'hi' ? 'above' : 'below';
  if (isTemperature(unit)) return `${formatNumber(Math.abs(value - end.value), 3)} degrees ${aside}`;
  const ratio = ratioTo(end, value, side, unit);
  if (ratio === null) return aside;
  return `${formatNumber(side === 'hi' ? ratio : 1 / ratio, 3)} ×`;
}

function consequence(end: BoundEnd, reached: boolean, side: Side, unit: string): string {
  switch (end.nature) {
    case 'regime':
      return 'The limit is a change of regime: no deviation is possible; choose a correlation for the other side.';
    case 'definition':
      return 'Beyond it the formula has no meaning: no deviation is possible.';
    case 'physical':
      return 'Such a value cannot be.';
    case 'data': {
      if (reached) return 'The data end there: choose another correlation, or record a deviation.';
      const furthest = reachLimit(end, side, unit);
      if (furthest === null) return 'The data end there, and a deviation has no reach from such a limit.';
      return `The data end there, and a deviation reaches to ${formatNumber(furthest)} at most: no number is given.`;
    }
  }
}

function unitText(unit: string): string {
  const printed = printedUnit(unit);
  return printed === '' ? '' : `\u2009${printed}`;
}
