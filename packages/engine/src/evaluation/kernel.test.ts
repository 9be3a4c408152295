import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { aSheet, compiled } from '../testing/a-sheet.js';
import { evaluate } from './evaluate.js';
import { kernelFor, POINT } from './kernel.js';

const sheet = compiled(aSheet());
const inputs = ['u', 'd', 'rho', 'mu', 'D'];

function atPoint(values: readonly number[]) {
  const kernel = kernelFor(sheet.sheet, inputs);
  for (const [i, symbol] of inputs.entries()) kernel.values[kernel.slotOf(symbol)] = values[i] ?? 0;
  return { status: kernel.run(), value: kernel.values[kernel.answerSlot] };
}

describe('kernelFor', () => {
  it('agrees with evaluate on the number and on whether there is one', () => {
    const around = (value: number) => fc.double({ min: value / 8, max: value * 8, noNaN: true });
    fc.assert(
      fc.property(around(5), around(0.05), around(1.2), around(1.8e-5), around(2.4e-5), (...values) => {
        const request = {
          inputs: Object.fromEntries(inputs.map((symbol, i) => [symbol, { value: values[i] ?? 0 }])),
        };
        const whole = evaluate(sheet, request, () => undefined);
        const point = atPoint(values);
        if (!whole.ok) throw new Error('the request is complete');
        if (whole.outcome.outcome === 'refused') expect(point.status).toBe(POINT.outside);
        else {
          expect(point.status).toBe(POINT.within);
          expect(point.value).toBe(whole.outcome.result.value);
        }
      }),
      { numRuns: 2000 },
    );
  });

  it('takes groups in place of quantities', () => {
    const kernel = kernelFor(sheet.sheet, ['Re', 'Sc']);
    kernel.values[kernel.slotOf('Re')] = 10_000;
    kernel.values[kernel.slotOf('Sc')] = 0.6;
    expect(kernel.run()).toBe(POINT.within);
    // 0.023 × 10 000^0.83 × 0.6^0.44, by hand: 0.023 × 2089.296 × 0.798714 = 38.381
    expect(kernel.values[kernel.answerSlot]).toBeCloseTo(38.381, 2);
  });

  it('holds on a closed limit and not past it', () => {
    const kernel = kernelFor(sheet.sheet, ['Re', 'Sc']);
    kernel.values[kernel.slotOf('Sc')] = 2.5;
    kernel.values[kernel.slotOf('Re')] = 35_000;
    expect(kernel.run()).toBe(POINT.within);
    kernel.values[kernel.slotOf('Re')] = 35_000.001;
    expect(kernel.run()).toBe(POINT.outside);
  });
});
