import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { formatNumber, numberTex, putInTex } from './number-text.js';

describe('numbers as text', () => {
  test.each([
    [0, 4, '0'],
    [0.61, 4, '0.61'],
    [52345, 4, '52\u2009350'],
    [1234, 4, '1234'],
    [12345.678, 6, '12\u2009345.7'],
    [999999, 4, '1e6'],
    [999949, 4, '999\u2009900'],
    [1e6, 4, '1e6'],
    [1.84321e-5, 4, '1.843e-5'],
    [0.001, 4, '0.001'],
    [0.00099996, 4, '0.001'],
    [0.0009999, 4, '9.999e-4'],
    [-52345, 3, '-52\u2009300'],
    [2, 4, '2'],
    [2.0004, 4, '2'],
    [100, 1, '100'],
    [Number.NaN, 4, 'NaN'],
    [Number.POSITIVE_INFINITY, 4, 'Infinity'],
  ])('%d in %d digits is %s', (value, digits, expected) => {
    expect(formatNumber(value, digits)).toBe(expected);
  });

  test('the text reads back as the number rounded to its digits', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 1e-290, max: 1e290, noNaN: true }),
        fc.integer({ min: 1, max: 12 }),
        (value, digits) => {
          const back = Number(formatNumber(value, digits).replaceAll('\u2009', ''));
          expect(Math.abs(back - Number(value.toPrecision(digits)))).toBeLessThanOrEqual(1e-12 * value);
        },
      ),
      { numRuns: 2000, seed: 10 },
    );
  });
});

describe('numbers in TeX', () => {
  test.each([
    [52345, '52\\,350'],
    [1.84321e-5, '1.843\\times 10^{-5}'],
    [-2, '-2'],
  ])('%d is set as %s', (value, expected) => {
    expect(numberTex(value)).toBe(expected);
  });

  test.each([
    [101325, '101\\,325', false],
    [298.15, '298.15', false],
    [1 / 3, '0.3333', false],
    [1.92e-5, '1.92\\times 10^{-5}', true],
    [-3, '-3', true],
  ])('%d put into a formula is %s', (value, tex, compound) => {
    expect(putInTex(value)).toEqual({ tex, compound });
  });
});
