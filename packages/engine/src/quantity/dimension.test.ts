import { describe, expect, test } from 'vitest';
import { dimensionText, isDimensionless, power, product, quotient, sameDimension } from './dimension.js';

const velocity = { m: 1, s: -1 };

describe('dimensions', () => {
  test('multiply, divide and are raised', () => {
    expect(product(velocity, { s: 1 })).toEqual({ m: 1 });
    expect(quotient(velocity, velocity)).toEqual({});
    expect(power(power({ m: 1 }, 1 / 3), 3)).toEqual({ m: 1 });
    expect(power(velocity, 0)).toEqual({});
  });

  test('compare with absent exponents as zero', () => {
    expect(sameDimension({ m: 1, s: 0 }, { m: 1 })).toBe(true);
    expect(sameDimension({ m: 1 }, { m: 1.001 })).toBe(false);
    expect(isDimensionless({ kg: 0 })).toBe(true);
  });

  test.each([
    [{}, '1'],
    [{ m: 1 }, 'm'],
    [{ m: 2, s: -1 }, 'm^2/s'],
    [{ s: -1 }, '1/s'],
    [{ kg: 1, m: -1, s: -2 }, 'kg/(m s^2)'],
    [{ m: 1 / 3 }, 'm^0.3333'],
    [{ kg: 1, m: 2, s: -2, K: -1, mol: -1 }, 'kg m^2/(s^2 K mol)'],
  ])('%o in words is %s', (dimension, text) => {
    expect(dimensionText(dimension)).toBe(text);
  });
});
