import { describe, expect, test } from 'vitest';
import { aRequest, aSheet, compiled, LIBRARY, quantitiesWith, STAGNANT_PART } from '../testing/a-sheet.js';
import { evaluate } from './evaluate.js';

const sheet = compiled(aSheet({ parts: [STAGNANT_PART] }));
const problemsWith = (inert: number, total: number) => {
  const request = aRequest({ p_BM: { value: inert, unit: 'kPa' }, P: { value: total, unit: 'kPa' } });
  const evaluation = evaluate(sheet, request, LIBRARY);
  return evaluation.ok ? [] : evaluation.problems;
};

describe('pressures of a part of the gas', () => {
  test('above the total pressure are an error at their field', () => {
    const [problem, ...others] = problemsWith(120, 101.325);
    expect(others).toEqual([]);
    expect(problem).toMatchObject({ code: 'domain', field: 'inputs.p_BM' });
    expect(problem?.message).toMatch(/at most the total pressure, which is 101\.3 kPa here/);
  });

  test('up to the total pressure are taken', () => {
    expect(problemsWith(101.325, 101.325)).toEqual([]);
    expect(problemsWith(98, 101.325)).toEqual([]);
  });
});

describe('a part of a whole', () => {
  test('is at most one, whether given as a number or in per cent', () => {
    const wet = compiled(
      aSheet({
        quantities: [...quantitiesWith('T', {}), { symbol: 'phi', is: 'relative-humidity', unit: '1' }],
      }),
    );
    for (const [value, unit] of [
      [60, '1'],
      [101, '%'],
    ] as const) {
      const evaluation = evaluate(wet, aRequest({ phi: { value, unit } }), LIBRARY);
      expect(evaluation).toMatchObject({ ok: false, problems: [{ code: 'domain', field: 'inputs.phi' }] });
    }
    expect(evaluate(wet, aRequest({ phi: { value: 60, unit: '%' } }), LIBRARY).ok).toBe(true);
  });
});
