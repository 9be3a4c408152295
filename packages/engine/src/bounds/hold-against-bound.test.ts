import { describe, expect, test } from 'vitest';
import type { Bound, BoundEnd, BoundNature, Stretch } from '../sheet/common-schema.js';
import { holdAgainstBound } from './hold-against-bound.js';
import { DEFAULT_REACH } from './reach.js';

const end = (value: number, nature: BoundNature = 'data', more: Partial<BoundEnd> = {}): BoundEnd => ({
  value,
  nature,
  ...more,
});
const bound = (...stretches: Stretch[]): Bound => ({ on: 'Re', basis: 'stated', stretches });

/** The wetted-wall range of Gilliland and Sherwood (1934), 2000 < Re < 35 000 (from memory). */
const WETTED_WALL = bound({ lo: end(2000, 'regime', { beyond: ['laminar-sheet'] }), hi: end(35000) });
/** Two stretches with nothing measured between, as of Linton and Sherwood (1950) in Sc. */
const GAP: Bound = {
  on: 'Sc',
  basis: 'stated',
  stretches: [
    { lo: end(0.6), hi: end(2.5, 'data', { beyond: ['other'] }) },
    { lo: end(1000), hi: end(2260) },
  ],
};

const hold = (subject: Bound, value: number | null, unit = '1') => holdAgainstBound(subject, value, unit);

describe('inside', () => {
  test.each([
    ['well inside', WETTED_WALL, 13000, 'within', 13000 / 35000],
    ['nearer to the lower limit, as a ratio', WETTED_WALL, 3000, 'within', 2000 / 3000],
    ['just short of 5 % to the upper limit', WETTED_WALL, 33200, 'within', 33200 / 35000],
    ['within 5 % of the upper limit', WETTED_WALL, 33300, 'near', 33300 / 35000],
    ['within 5 % of the lower limit', WETTED_WALL, 2100, 'near', 2000 / 2100],
    ['on the upper limit', WETTED_WALL, 35000, 'near', 1],
    ['on the lower limit', WETTED_WALL, 2000, 'near', 1],
    ['in the second stretch', GAP, 1500, 'within', 1000 / 1500],
    ['one-sided below', bound({ hi: end(10) }), 1, 'within', 0.1],
    ['one-sided above', bound({ lo: end(10) }), 1e9, 'within', 1e-8],
    [
      'a lower limit of zero says nothing of nearness',
      bound({ lo: end(0), hi: end(10) }),
      1e-6,
      'within',
      1e-7,
    ],
    ['negative limits have no ratio', bound({ lo: end(-2), hi: end(-1) }), -1.01, 'within', null],
    ['a value of zero has none', bound({ lo: end(0), hi: end(10) }), 0, 'within', null],
  ])('%s', (_where, subject, value, kind, ratio) => {
    const finding = hold(subject, value);
    expect(finding.kind).toBe(kind);
    expect(finding.deviable).toBe(false);
    if (ratio === null) expect(finding.ratio).toBeNull();
    else expect(finding.ratio).toBeCloseTo(ratio, 12);
  });

  test('says the limits of its stretch, and which one is near', () => {
    expect(hold(GAP, 1500)).toMatchObject({
      lo: 1000,
      hi: 2260,
      nature: null,
      message: 'Sc = 1500 is in bounds.',
    });
    expect(hold(WETTED_WALL, 2050)).toMatchObject({
      nature: 'regime',
      message: 'Re = 2050 is in bounds, near the lower bound 2000.',
    });
    expect(hold(WETTED_WALL, 34000)).toMatchObject({
      nature: 'data',
      message: 'Re = 34\u2009000 is in bounds, near the upper bound 35\u2009000.',
    });
  });
});

describe('outside', () => {
  test('of data, within reach: deviable, with the ratio value over limit', () => {
    const finding = hold(WETTED_WALL, 42000);
    expect(finding).toMatchObject({ kind: 'outside', nature: 'data', deviable: true, lo: 2000, hi: 35000 });
    expect(finding.ratio).toBeCloseTo(1.2, 12);
    expect(finding.message).toBe(
      'Re = 42\u2009000 is 1.2 × the upper bound 35\u2009000 (stated in the source). The data end there: choose another correlation, or record a deviation.',
    );
  });

  test('of data below, within reach: the ratio is limit over value', () => {
    const finding = hold(GAP, 0.4);
    expect(finding).toMatchObject({ kind: 'outside', deviable: true });
    expect(finding.ratio).toBeCloseTo(1.5, 12);
    expect(finding.message).toMatch(/^Sc = 0\.4 is 0\.667 × the lower bound 0\.6/);
  });

  test.each([
    ['exactly at the reach', 70000, 'outside', true],
    ['just past the reach', 70001, 'past-reach', false],
    ['at the reach by rounding', 70000 * (1 + 1e-13), 'outside', true],
  ])('%s', (_where, value, kind, deviable) => {
    expect(DEFAULT_REACH).toBe(2);
    expect(hold(WETTED_WALL, value)).toMatchObject({ kind, deviable });
  });

  test('past the reach the message names it', () => {
    expect(hold(WETTED_WALL, 100000).message).toMatch(
      /a deviation reaches to 70\u2009000 at most: no number is given/,
    );
    expect(hold(GAP, 0.1).message).toMatch(/a deviation reaches to 0\.3 at most/);
  });

  test.each([
    ['a reach of the sheet above', bound({ hi: end(100, 'data', { reach: 1.2 }) }), 119, 'outside'],
    ['past it', bound({ hi: end(100, 'data', { reach: 1.2 }) }), 121, 'past-reach'],
    ['a reach of the sheet below', bound({ lo: end(100, 'data', { reach: 4 }) }), 26, 'outside'],
    ['past it', bound({ lo: end(100, 'data', { reach: 4 }) }), 24, 'past-reach'],
    ['the lower reach by default', bound({ lo: end(100) }), 50, 'outside'],
    ['past it', bound({ lo: end(100) }), 49.9, 'past-reach'],
    ['zero under a positive limit', bound({ lo: end(100) }), 0, 'past-reach'],
  ])('%s', (_which, subject, value, kind) => {
    expect(hold(subject, value).kind).toBe(kind);
  });

  test.each([
    ['zero', bound({ lo: end(0) }), -0.001],
    ['a negative number below', bound({ lo: end(-1) }), -1.001],
    ['a negative number above', bound({ hi: end(-1) }), -0.999],
    ['zero above', bound({ hi: end(0) }), 0.001],
  ])('a limit of data at %s has no reach', (_what, subject, value) => {
    const finding = hold(subject, value);
    expect(finding).toMatchObject({ kind: 'past-reach', deviable: false, ratio: null });
    expect(finding.message).toMatch(/no reach from such a limit/);
  });

  test.each([
    ['regime', /change of regime: no deviation is possible/],
    ['definition', /the formula has no meaning: no deviation is possible/],
    ['physical', /Such a value cannot be/],
  ] as const)('of a %s bound there is no deviation, however near', (nature, message) => {
    const finding = hold(bound({ hi: end(100, nature) }), 100.1);
    expect(finding).toMatchObject({ kind: 'outside', nature, deviable: false });
    expect(finding.message).toMatch(message);
  });

  test('the sheets of the other side are named', () => {
    expect(hold(WETTED_WALL, 1500).beyond).toEqual(['laminar-sheet']);
    expect(hold(WETTED_WALL, 50000).beyond).toEqual([]);
  });

  test('on an open limit is outside', () => {
    const subject = bound({ lo: end(1, 'data', { closed: false }), hi: end(10, 'data', { closed: false }) });
    expect(hold(subject, 10)).toMatchObject({ kind: 'outside', deviable: true, ratio: 1, hiClosed: false });
    expect(hold(subject, 1)).toMatchObject({ kind: 'outside', deviable: true, ratio: 1, loClosed: false });
    expect(hold(subject, 10 * (1 - 1e-9)).kind).toBe('near');
  });
});

describe('between stretches', () => {
  test('both neighbours are named and no deviation is possible', () => {
    const finding = hold(GAP, 100);
    expect(finding).toMatchObject({
      kind: 'between',
      lo: 2.5,
      hi: 1000,
      deviable: false,
      ratio: null,
      nature: 'data',
      beyond: ['other'],
    });
    expect(finding.message).toBe(
      'Sc = 100 lies between the stretch that ends at 2.5 and the one that begins at 1000; neither holds there.',
    );
  });

  test('outside of the first and of the last stretch the usual rules hold', () => {
    expect(hold(GAP, 0.5)).toMatchObject({ kind: 'outside', lo: 0.6, hi: 2.5, deviable: true });
    expect(hold(GAP, 3000)).toMatchObject({ kind: 'outside', lo: 1000, hi: 2260, deviable: true });
    expect(hold(GAP, 5000)).toMatchObject({ kind: 'past-reach', deviable: false });
  });

  test('a point that two stretches leave out lies between them', () => {
    const subject = bound(
      { hi: end(2300, 'regime', { closed: false }) },
      { lo: end(2300, 'regime', { closed: false }) },
    );
    expect(hold(subject, 2300)).toMatchObject({ kind: 'between', lo: 2300, hi: 2300 });
    expect(hold(subject, 2299).kind).toBe('near');
  });
});

describe('unchecked', () => {
  test('no bound on record is said in words', () => {
    const finding = hold({ on: 'L_d', basis: 'none', stretches: [] }, 3);
    expect(finding).toMatchObject({ kind: 'unchecked', value: 3, lo: null, hi: null, basis: 'none' });
    expect(finding.message).toMatch(/No bound is on record for L_d/);
  });

  test('an unknown value cannot be held against the bound', () => {
    expect(hold(WETTED_WALL, null)).toMatchObject({ kind: 'unchecked', value: null, lo: 2000, hi: 35000 });
    expect(hold(GAP, null)).toMatchObject({ kind: 'unchecked', value: null, lo: null, hi: null });
    expect(hold(WETTED_WALL, null).message).toMatch(/it is not known here/);
  });
});

test('units and labels stand in the message', () => {
  const subject: Bound = { on: 'T', basis: 'handbook', stretches: [{ lo: end(200), hi: end(400) }] };
  const finding = holdAgainstBound(subject, 500, 'K', 'rho.T');
  expect(finding.symbol).toBe('rho.T');
  expect(finding.unit).toBe('K');
  expect(finding.message).toMatch(
    /^rho\.T = 500\u2009K is 100 degrees above the upper bound 400 \(from a handbook\)/,
  );
});

describe('where near says nothing', () => {
  test('a stretch that stands for a single value is never near', () => {
    expect(hold(bound({ lo: end(0.99), hi: end(1.01) }), 1).kind).toBe('within');
  });

  test('a physical limit is never near: a fraction of 0.99 is just a fraction', () => {
    expect(hold(bound({ lo: end(0, 'physical'), hi: end(1, 'physical') }), 0.99).kind).toBe('within');
  });
});

describe('units in a sentence', () => {
  test('are set as in print', () => {
    const unit = 'kg/(m^2 s)';
    const bounded: Bound = { on: 'L', basis: 'stated', stretches: [{ hi: end(5) }] };
    expect(holdAgainstBound(bounded, 8, unit).message).toMatch(/^L = 8\u2009kg\/\(m²\u2009s\) is/);
    expect(holdAgainstBound(bounded, 8, 'degC').message).toContain('°C');
  });
});

describe('the end of a definition', () => {
  const constant = bound({ lo: end(0, 'definition'), hi: end(871, 'definition') });
  test('is an ordinary value, such as a constant from a table; a value beside it is near', () => {
    expect(hold(constant, 871).kind).toBe('within');
    expect(hold(constant, 860).kind).toBe('near');
  });
});

describe('temperatures', () => {
  const warm = bound({ lo: end(0), hi: end(50) });

  test('are compared in kelvin, whatever the sheet counts in', () => {
    // 60 °C over 50 °C is 333.15 K over 323.15 K
    expect(hold(warm, 60, 'degC')).toMatchObject({ kind: 'outside', deviable: true });
    expect(hold(warm, 60, 'degC').ratio).toBeCloseTo(333.15 / 323.15, 12);
  });

  test('reach a tenth further in kelvin, not twice as far', () => {
    // 323.15 K × 1.1 = 355.465 K = 82.315 °C
    expect(hold(warm, 82.3, 'degC').kind).toBe('outside');
    expect(hold(warm, 82.4, 'degC').kind).toBe('past-reach');
    // 273.15 K / 1.1 = 248.32 K = −24.83 °C: zero degrees is a limit like any other
    expect(hold(warm, -24, 'degC').kind).toBe('outside');
    expect(hold(warm, -25, 'degC').kind).toBe('past-reach');
  });

  test('are told in degrees', () => {
    expect(hold(warm, 60, 'degC').message).toContain('is 10 degrees above the upper bound 50');
  });
});
