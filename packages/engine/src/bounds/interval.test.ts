import { describe, expect, test } from 'vitest';
import { apart, compareWithLimit, endsBefore, holds, type Interval } from './interval.js';

const closed = (lo?: number, hi?: number): Interval => ({ lo, hi, loClosed: true, hiClosed: true });
const open = (lo?: number, hi?: number): Interval => ({ lo, hi, loClosed: false, hiClosed: false });

describe('a value against a limit', () => {
  test.each([
    [1, 2, -1],
    [2, 2, 0],
    [3, 2, 1],
    [2 * (1 + 1e-13), 2, 0],
    [2 * (1 - 1e-13), 2, 0],
    [2 * (1 + 1e-11), 2, 1],
    [2 * (1 - 1e-11), 2, -1],
    [-2 * (1 + 1e-13), -2, 0],
    [-2.1, -2, -1],
    [0, 0, 0],
    [1e-300, 0, 1],
    [-1e-300, 0, -1],
    // 0.1 + 0.2 is not 0.3 in doubles; a converted value must not fail for that.
    [0.1 + 0.2, 0.3, 0],
  ])('%d against %d is %d', (value, limit, expected) => {
    expect(compareWithLimit(value, limit)).toBe(expected);
  });
});

describe('a value in an interval', () => {
  test.each([
    ['on a closed lower limit', 1, closed(1, 2), true],
    ['on a closed upper limit', 2, closed(1, 2), true],
    ['on an open lower limit', 1, open(1, 2), false],
    ['on an open upper limit', 2, open(1, 2), false],
    ['between', 1.5, open(1, 2), true],
    ['below', 0.9, closed(1, 2), false],
    ['above', 2.1, closed(1, 2), false],
    ['without a lower limit', -1e9, closed(undefined, 2), true],
    ['without an upper limit', 1e9, closed(1), true],
    ['without any', 0, closed(), true],
    ['rounding past a closed limit', 2 * (1 + 1e-13), closed(1, 2), true],
    ['rounding short of an open limit', 2 * (1 - 1e-13), open(1, 2), false],
    ['on a closed limit of zero', 0, closed(0, 2), true],
    ['on an open limit of zero', 0, open(0, 2), false],
  ])('%s', (_where, value, interval, expected) => {
    expect(holds(value, interval)).toBe(expected);
  });
});

describe('two intervals', () => {
  test.each([
    ['apart', closed(1, 2), closed(3, 4), true],
    ['apart the other way round', closed(3, 4), closed(1, 2), true],
    ['meeting in a point', closed(1, 2), closed(2, 3), false],
    ['meeting, one end open', open(1, 2), closed(2, 3), true],
    ['meeting, the other end open', closed(1, 2), open(2, 3), true],
    ['overlapping', closed(1, 3), closed(2, 4), false],
    ['one in the other', closed(1, 4), closed(2, 3), false],
    ['without limits', closed(), closed(2, 3), false],
    ['half-lines apart', closed(undefined, 2), closed(3), true],
  ])('%s', (_how, a, b, expected) => {
    expect(apart(a, b)).toBe(expected);
  });

  test('ends before is not symmetric', () => {
    expect(endsBefore(closed(1, 2), closed(3, 4))).toBe(true);
    expect(endsBefore(closed(3, 4), closed(1, 2))).toBe(false);
  });
});
