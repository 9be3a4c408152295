import { describe, expect, test } from 'vitest';
import { formatBriefly, formatExactly, formatNumber, fullPrecision, setNumber } from './format-number';

/** Plain spaces for the no-break spaces, so that the tables below can be read. */
const plain = (text: string) => text.replaceAll('\u00a0', ' ');

describe('formatNumber', () => {
  test.each([
    [52312, 3, '52 300'],
    [52312, 4, '52 310'],
    [0.60957, 3, '0.610'],
    [1.18412, 4, '1.184'],
    [101325, 4, '101 300'],
    [-1.8449, 3, '−1.84'],
    [0.001, 4, '0.001000'],
    [2000, 4, '2 000'],
    [999.96, 4, '1 000'],
    [1.84e-9, 3, '1.84 × 10⁻⁹'],
    [1e-7, 2, '1.0 × 10⁻⁷'],
    [2.5e6, 4, '2.500 × 10⁶'],
    [999_999.9, 4, '1.000 × 10⁶'],
    [0, 4, '0'],
    [-0, 4, '0'],
  ])('%d with %d figures is %s', (value, digits, set) => {
    expect(plain(formatNumber(value, digits))).toBe(set);
  });

  test.each([
    [Number.NaN, 'not a number'],
    [Infinity, '∞'],
    [-Infinity, '−∞'],
  ])('%d is said in words or by its sign', (value, set) => {
    expect(formatNumber(value)).toBe(set);
  });

  test('tells the power of ten apart from the digits, for typesetting', () => {
    expect(setNumber(2.5e-5, 3)).toEqual({ mantissa: '2.50', exponent: -5 });
  });
});

describe('formatExactly adds and loses no digit', () => {
  test.each([
    [35000, '35 000'],
    [0.6, '0.6'],
    [101325, '101 325'],
    [273.15, '273.15'],
    [1e13, '10¹³'],
    [3.5e-4, '3.5 × 10⁻⁴'],
    [1_234_567, '1.234567 × 10⁶'],
    [0.0012345678, '0.0012345678'],
    [-40, '−40'],
  ])('%d is %s', (value, set) => {
    expect(plain(formatExactly(value))).toBe(set);
  });
});

test('formatBriefly leaves closing zeros out', () => {
  expect([0.61, 50, 0.609_57, 8e-6].map((value) => plain(formatBriefly(value)))).toEqual([
    '0.61',
    '50',
    '0.6096',
    '8 × 10⁻⁶',
  ]);
});

test('figures are kept together by spaces that break no line', () => {
  expect(formatNumber(52312)).not.toMatch(/[ \u2009]/);
});

test('fullPrecision can be read back to the same number', () => {
  for (const value of [1 / 3, 5.231_2e-7, 1e21, -0.1]) expect(Number(fullPrecision(value))).toBe(value);
});
