import { expect } from 'vitest';

/** Agreement with a published value within a share of it, in percent; a missing number fails. */
export function expectWithin(found: number | null | undefined, published: number, percent: number): void {
  expect(found).toBeTypeOf('number');
  expect(Math.abs((found ?? Number.NaN) / published - 1) * 100).toBeLessThanOrEqual(percent);
}
