import { describe, expect, test } from 'vitest';
import type { DrivingForce, InputValue } from '../evaluation/outcome.js';
import {
  aRequest,
  aSheet,
  GAS_PART,
  numbersOf,
  partWith,
  problemsOf,
  STAGNANT_PART,
} from '../testing/a-sheet.js';
import { logMean } from './flux.js';

const STATE: Record<string, InputValue> = { T: { value: 300 }, P: { value: 101325 } };
const force = (kind: DrivingForce['kind'], at: number, bulk: number, unit?: string): DrivingForce => ({
  kind,
  interface: { value: at, unit },
  bulk: { value: bulk, unit },
});
/** p_BM of a film between these mole fractions at the pressure of STATE. */
const inert = (yi: number, yb: number): InputValue => ({ value: 101325 * logMean(1 - yi, 1 - yb) });

function fluxOf(
  drivingForce: DrivingForce,
  inputs: Record<string, InputValue | null> = STATE,
  part = GAS_PART,
) {
  const numbers = numbersOf(aSheet({ parts: [part] }), aRequest(inputs, { drivingForce }));
  return { flux: numbers.flux, k: numbers.coefficient?.value ?? Number.NaN, steps: numbers.steps };
}

describe('flux from interface to bulk', () => {
  const c = 101325 / (8.314462618 * 300);

  test('is coefficient times difference, the same in each measure of the driving force', () => {
    const byFraction = fluxOf(force('mole-fraction', 0.03, 0.01));
    expect(byFraction.flux?.value).toBeCloseTo(byFraction.k * c * 0.02, 10);
    expect(byFraction.flux).toMatchObject({ unit: 'mol/(m^2 s)', basis: 'mole-fraction', warnings: [] });
    const byPressure = fluxOf(force('partial-pressure', 3.03975, 1.01325, 'kPa'));
    const byConcentration = fluxOf(force('concentration', 0.03 * c, 0.01 * c));
    expect((byPressure.flux?.value ?? 0) / (byFraction.flux?.value ?? 1)).toBeCloseTo(1, 12);
    expect((byConcentration.flux?.value ?? 0) / (byFraction.flux?.value ?? 1)).toBeCloseTo(1, 12);
  });

  test('is negative into the interface', () => {
    expect(fluxOf(force('mole-fraction', 0.01, 0.03)).flux?.value).toBeLessThan(0);
  });

  test('is the last step, written out', () => {
    const step = fluxOf(force('mole-fraction', 0.03, 0.01)).steps.at(-1);
    expect(step).toMatchObject({ kind: 'flux', symbol: 'N_A', unit: 'mol/(m^2 s)' });
    expect(step?.tex).toContain('y_{A,i} - y_{A,b}');
    expect(step?.texWithNumbers).toContain('\\times 0.02 =');
  });

  test('through stagnant gas k_y (y_i - y_b) equals F ln((1-y_b)/(1-y_i)) of the same case', () => {
    // R. B. Bird, W. E. Stewart, E. N. Lightfoot, Transport Phenomena, diffusion through a stagnant film (from memory).
    const [yi, yb] = [0.4, 0.1];
    const { flux, k } = fluxOf(
      force('mole-fraction', yi, yb),
      { ...STATE, p_BM: inert(yi, yb) },
      STAGNANT_PART,
    );
    const F = k * c * logMean(1 - yi, 1 - yb);
    expect((flux?.value ?? 0) / (F * Math.log((1 - yb) / (1 - yi)))).toBeCloseTo(1, 12);
    expect(flux?.warnings).toEqual([]);
  });
});

describe('what belongs to the number', () => {
  test('a low-flux coefficient at a high mole fraction: what the drift would make of it', () => {
    const { flux } = fluxOf(force('mole-fraction', 0.4, 0));
    expect(flux?.warnings).toHaveLength(1);
    // 1/y_BM = ln(1/0.6)/0.4 = 1.277.
    expect(flux?.warnings[0]).toMatch(/mole fraction reaches 0\.400: .* 1\.28 times as large/);
    expect(fluxOf(force('mole-fraction', 0.05, 0)).flux?.warnings).toEqual([]);
    expect(fluxOf(force('mole-fraction', 0.051, 0)).flux?.warnings).toHaveLength(1);
  });

  test('two p_BM that disagree', () => {
    const { flux } = fluxOf(
      force('mole-fraction', 0.4, 0),
      { ...STATE, p_BM: { value: 101325 } },
      STAGNANT_PART,
    );
    expect(flux?.warnings[0]).toMatch(
      /p_BM\/P is 1\.000 in the coefficient, and 0\.7830 by this driving force/,
    );
    const agreeing = fluxOf(force('mole-fraction', 0.4, 0), { ...STATE, p_BM: inert(0.4, 0) }, STAGNANT_PART);
    expect(agreeing.flux?.warnings).toEqual([]);
  });
});

describe('what is refused', () => {
  test.each<[string, DrivingForce, Record<string, InputValue | null>, string, string, RegExp]>([
    [
      'a mole fraction above one',
      force('mole-fraction', 1.2, 0),
      STATE,
      'domain',
      'drivingForce',
      /at most 1/,
    ],
    [
      'a partial pressure above the total',
      force('partial-pressure', 2e5, 0, 'Pa'),
      STATE,
      'domain',
      'drivingForce',
      /at most the total pressure/,
    ],
    [
      'a negative mole fraction',
      force('mole-fraction', -0.1, 0),
      STATE,
      'domain',
      'drivingForce.interface',
      /Mole fraction cannot be negative/,
    ],
    [
      'a negative bulk pressure',
      force('partial-pressure', 1, -1, 'kPa'),
      STATE,
      'domain',
      'drivingForce.bulk',
      /in the bulk gas cannot be negative/,
    ],
    [
      'a unit of another kind',
      force('concentration', 1, 0, 'Pa'),
      STATE,
      'unit',
      'drivingForce.interface',
      /measured in mol\/m\^3/,
    ],
    [
      'a gauge pressure',
      force('partial-pressure', 1, 0, 'barg'),
      STATE,
      'unit',
      'drivingForce.interface',
      /gauge reading/,
    ],
    [
      'not a number',
      force('mole-fraction', Number.NaN, 0),
      STATE,
      'malformed',
      'drivingForce.interface',
      /finite number/,
    ],
    [
      'no temperature where one is needed',
      force('partial-pressure', 1, 0, 'kPa'),
      { P: { value: 1e5 } },
      'missing',
      'drivingForce',
      /gas temperature must be known/,
    ],
    [
      'neither temperature nor pressure',
      force('mole-fraction', 0.1, 0),
      {},
      'missing',
      'drivingForce',
      /gas temperature and the total pressure must be known/,
    ],
    [
      'no coefficient',
      force('concentration', 1, 0),
      { D: null, Sc: { value: 1 } },
      'missing',
      'drivingForce',
      /no coefficient here/,
    ],
  ])('%s', (_what, drivingForce, inputs, code, field, message) => {
    const problems = problemsOf(aSheet(), aRequest(inputs, { drivingForce }));
    expect(problems.map((problem) => [problem.code, problem.field])).toContainEqual([code, field]);
    expect(problems.map((problem) => problem.message).join(' ')).toMatch(message);
  });

  test('a partial pressure in a liquid', () => {
    const part = { ...partWith({}), phase: 'liquid' as const, coefficient: GAS_PART.coefficient };
    const problems = problemsOf(
      aSheet({ parts: [part], phase: 'liquid' }),
      aRequest({}, { drivingForce: force('partial-pressure', 1, 0, 'kPa') }),
    );
    expect(problems).toEqual([expect.objectContaining({ code: 'malformed', field: 'drivingForce' })]);
  });
});

describe('logarithmic mean', () => {
  test.each([
    [1, 1, 1],
    [2, 1, 1 / Math.log(2)],
    [1, 2, 1 / Math.log(2)],
    [1, 1 + 1e-9, 1 + 5e-10],
    [1, 0, 0],
    [1, 1.00001, 1.000005],
  ])('of %d and %d is %d', (a, b, expected) => {
    expect(logMean(a, b)).toBeCloseTo(expected, 10);
  });
});
