import fc from 'fast-check';
import { all, create, type Unit } from 'mathjs';
import { describe, expect, test } from 'vitest';
import { dimensionText, sameDimension, type Dimension } from '../quantity/dimension.js';
import { readUnit } from '../quantity/unit.js';
import { dimensionOf } from './dimension-of.js';
import { parse } from './parse.js';
import { bracketedText } from '../testing/random-tree.js';
import type { Tree } from './tree.js';

const math = create(all ?? {}, {});

/** Symbols with a unit each, written so that both readers understand it. */
const UNITS = {
  u: 'm/s',
  d: 'm',
  rho: 'kg/m^3',
  mu: 'kg/(m s)',
  D: 'm^2/s',
  p: 'kg/(m s^2)',
  T: 'K',
  c: 'mol/m^3',
  one: '1',
} as const;
type Symbols = keyof typeof UNITS;
const NAMES = Object.keys(UNITS) as Symbols[];

function dimension(unit: string): Dimension {
  const reading = readUnit(unit);
  if (!reading.ok) throw new Error(reading.reason);
  return reading.unit.dimension;
}

function verdict(text: string) {
  const parsed = parse(text);
  if (!parsed.ok) throw new Error(`${text}: ${parsed.fault.reason}`);
  return dimensionOf(parsed.tree, (name) => dimension(UNITS[name as Symbols]));
}

/** The same by mathjs: quantities of value 1 with their units; null where it finds that they do not fit. */
function byMathjs(text: string): Unit | number | null {
  const scope = Object.fromEntries(
    NAMES.map((name) => [name, name === 'one' ? 1 : math.unit(1, UNITS[name].replace(' ', '*'))]),
  );
  try {
    const value: unknown = math.evaluate(text, scope);
    return value as Unit | number;
  } catch {
    return null;
  }
}

function matches(found: Dimension, theirs: Unit | number): boolean {
  const text = dimensionText(found);
  if (typeof theirs === 'number') return text === '1';
  if (text === '1') return theirs.equalBase(math.unit('1 rad'));
  return theirs.equalBase(math.unit(1, text.replaceAll(/(?<=[a-z0-9]) (?=[a-zK])/gi, '*')));
}

const product: fc.Arbitrary<string> = fc
  .array(fc.tuple(fc.constantFrom(...NAMES), fc.constantFrom('*', '/'), fc.constantFrom(1, 2, 3, -1, -2)), {
    minLength: 1,
    maxLength: 5,
  })
  .map((links) =>
    links
      .map(
        ([name, operator, power], i) =>
          `${i === 0 ? '' : operator}${power === 1 ? name : `${name}^${power}`}`,
      )
      .join(''),
  );

/** Products and sums of them, most of which do not fit. */
const sum: fc.Arbitrary<Tree> = fc
  .tuple(
    fc.constantFrom('+', '-'),
    fc.constantFrom(...NAMES),
    fc.constantFrom(...NAMES),
    fc.constantFrom(...NAMES),
  )
  .map(([operator, a, b, c]): Tree => ({
    kind: 'binary',
    operator,
    left: {
      kind: 'binary',
      operator: '*',
      left: { kind: 'symbol', name: a },
      right: { kind: 'symbol', name: b },
    },
    right: {
      kind: 'binary',
      operator: '*',
      left: { kind: 'symbol', name: c },
      right: { kind: 'symbol', name: b },
    },
  }));

describe('dimensions against an independent reader of units (mathjs)', () => {
  test('products and whole powers of quantities', () => {
    fc.assert(
      fc.property(product, (text) => {
        const found = verdict(text);
        const expected = byMathjs(text);
        expect(found.ok).toBe(true);
        if (found.ok && expected !== null)
          expect(matches(found.dimension, expected), `${text}: ${dimensionText(found.dimension)}`).toBe(true);
      }),
      { numRuns: 1500, seed: 5 },
    );
  });

  test('sums of what fits and of what does not', () => {
    let refused = 0;
    fc.assert(
      fc.property(sum, (tree) => {
        const text = bracketedText(tree);
        const found = verdict(text);
        const expected = byMathjs(text);
        if (expected === null) refused += 1;
        expect(found.ok, text).toBe(expected !== null);
      }),
      { numRuns: 1000, seed: 6 },
    );
    expect(refused).toBeGreaterThan(300);
  });
});

describe('rules', () => {
  test.each([
    ['rho*u*d/mu', ''],
    ['mu/(rho*D)', ''],
    ['(rho*u*d/mu)^0.83', ''],
    ['(d^3)^(1/3)', 'm'],
    ['sqrt(u^2)', 'm/s'],
    ['sqrt(D*d/u)', 'm'],
    ['abs(-u)', 'm/s'],
    ['min(u, 2*u)', 'm/s'],
    ['exp(one) + ln(one)', ''],
    ['2*d + d/3', 'm'],
    ['one^one', ''],
    ['u^0', ''],
    ['2^(u*d/D)', ''],
  ])('%s comes out in "%s"', (text, unit) => {
    const found = verdict(text);
    expect(found.ok).toBe(true);
    if (found.ok) expect(sameDimension(found.dimension, dimension(unit))).toBe(true);
  });

  test.each([
    ['u + d', 'm is added to m/s'],
    ['u - 1', '1 is subtracted from m/s'],
    ['exp(u)', 'exp is taken of something of dimension m/s'],
    ['ln(d)', 'ln is taken of something of dimension m'],
    ['tanh(T)', 'tanh is taken of something of dimension K'],
    ['2^u', 'an exponent has the dimension m/s'],
    ['u^one', 'something of dimension m/s is raised to a power that varies'],
    ['min(u, d)', 'm is compared with m/s'],
    ['max(u, u, 1)', '1 is compared with m/s'],
    ['(rho*u)^(0/0)', 'an exponent has no finite value'],
    ['d^(1/0)', 'an exponent has no finite value'],
  ])('%s is refused: %s', (text, reason) => {
    expect(verdict(text)).toEqual({ ok: false, reason });
  });
});
