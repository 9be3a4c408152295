import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { COEFFICIENT_BASES, type CoefficientBasis } from '../evaluation/outcome.js';
import { readUnit } from '../quantity/unit.js';
import {
  BASES,
  basisSymbol,
  basisUnit,
  convertBasis,
  type CoefficientInSI,
  type FluidState,
} from './convert-basis.js';

const R = 8.314462618;
const KNOWN: FluidState = {
  temperature: 300,
  pressure: 101325,
  inertPressure: 95000,
  liquidDensity: 990,
  molarMass: 0.018,
};
const NOTHING: FluidState = {
  temperature: null,
  pressure: null,
  inertPressure: null,
  liquidDensity: null,
  molarMass: null,
};

const gas = (
  basis: CoefficientInSI['basis'],
  rateForm: CoefficientInSI['rateForm'],
  value = 0.01,
): CoefficientInSI => ({ value, basis, rateForm, per: 'area', phase: 'gas' });

const on = (from: CoefficientInSI, to: CoefficientBasis, state: FluidState = KNOWN): number =>
  convertBasis(from, to, state).value ?? Number.NaN;

/** States of a gas in which all is known. */
const state = fc
  .record({
    temperature: fc.double({ min: 200, max: 1500, noNaN: true }),
    pressure: fc.double({ min: 1e3, max: 1e7, noNaN: true }),
    share: fc.double({ min: 0.01, max: 1, noNaN: true }),
  })
  .map(({ temperature, pressure, share }): FluidState => ({
    temperature,
    pressure,
    inertPressure: share * pressure,
    liquidDensity: null,
    molarMass: null,
  }));
const form = fc.constantFrom<CoefficientInSI['rateForm']>(
  'dilute-or-equimolar',
  'stagnant-inert',
  'drift-free',
);
const measure = fc.constantFrom<CoefficientInSI['basis']>(
  'concentration',
  'partial-pressure',
  'mole-fraction',
);

const close = (found: number, expected: number): void =>
  expect(Math.abs(found / expected - 1)).toBeLessThan(1e-12);

/** Identities of a coefficient through ideal gas: R. E. Treybal, Mass-Transfer Operations, 3rd ed., Table 3.1 (from memory). */
describe('identities in a gas', () => {
  test('one flux, whatever the coefficient is counted in: k_c Δc = k_G Δp = k_y Δy', () => {
    fc.assert(
      fc.property(measure, form, state, (basis, rateForm, at) => {
        const from = gas(basis, rateForm);
        const k_y = on(from, 'k_y', at);
        const { temperature: T, pressure: P } = at;
        close(on(from, 'k_G', at) * (P ?? 0), k_y);
        close((on(from, 'k_c', at) * (P ?? 0)) / (R * (T ?? 0)), k_y);
      }),
      { numRuns: 300, seed: 16 },
    );
  });

  test('the drift of the inert gas goes in once: F = k_y p_BM/P, from a stagnant or a drift-free coefficient', () => {
    fc.assert(
      fc.property(
        measure,
        fc.constantFrom('stagnant-inert' as const, 'drift-free' as const),
        state,
        (basis, rateForm, at) => {
          const from = gas(basis, rateForm);
          close(on(from, 'F', at), (on(from, 'k_y', at) * (at.inertPressure ?? 0)) / (at.pressure ?? 1));
        },
      ),
      { numRuns: 300, seed: 17 },
    );
  });

  test('a stagnant coefficient keeps its value on its own basis, a drift-free one takes the factor P/p_BM', () => {
    const drift = 101325 / 95000;
    expect(on(gas('concentration', 'stagnant-inert'), 'k_c')).toBe(0.01);
    close(on(gas('concentration', 'drift-free'), 'k_c'), 0.01 * drift);
    close(on(gas('mole-fraction', 'drift-free'), 'k_y'), 0.01 * drift);
    expect(on(gas('mole-fraction', 'drift-free'), 'F')).toBe(0.01);
    close(on(gas('concentration', 'stagnant-inert'), 'F'), (0.01 * 95000) / (R * 300));
  });

  test('a low-flux coefficient is F itself, and says what that assumes', () => {
    const conversion = convertBasis(gas('concentration', 'dilute-or-equimolar'), 'F', KNOWN);
    close(conversion.value ?? 0, (0.01 * 101325) / (R * 300));
    expect(conversion.assumes).toMatch(/low-flux/);
    expect(convertBasis(gas('concentration', 'stagnant-inert'), 'F', KNOWN)).not.toHaveProperty('assumes');
    expect(convertBasis(gas('concentration', 'dilute-or-equimolar'), 'k_y', KNOWN)).not.toHaveProperty(
      'assumes',
    );
  });

  test('N = F ln((1-y_2)/(1-y_1)) and N = k_y (y_1 - y_2) are the same flux when p_BM is that of the film', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 0.01, max: 0.95, noNaN: true }),
        fc.double({ min: 0, max: 0.95, noNaN: true }),
        (y1, y2) => {
          fc.pre(Math.abs(y1 - y2) > 1e-3);
          const P = 101325;
          const inertPressure = (P * (y1 - y2)) / Math.log((1 - y2) / (1 - y1));
          const at: FluidState = { ...KNOWN, inertPressure };
          const from = gas('concentration', 'stagnant-inert');
          const byLogarithm = on(from, 'F', at) * Math.log((1 - y2) / (1 - y1));
          expect(Math.abs(byLogarithm / (on(from, 'k_y', at) * (y1 - y2)) - 1)).toBeLessThan(1e-10);
        },
      ),
      { numRuns: 300, seed: 18 },
    );
  });
});

describe('what must be known', () => {
  test.each<[string, CoefficientInSI, CoefficientBasis, Partial<FluidState>, string[]]>([
    ['its own basis needs nothing', gas('concentration', 'dilute-or-equimolar'), 'k_c', {}, []],
    [
      'k_G from k_c needs a temperature',
      gas('concentration', 'dilute-or-equimolar'),
      'k_G',
      {},
      ['gas temperature'],
    ],
    ['and no pressure', gas('concentration', 'dilute-or-equimolar'), 'k_G', { temperature: 300 }, []],
    [
      'k_y from k_c needs both',
      gas('concentration', 'dilute-or-equimolar'),
      'k_y',
      {},
      ['gas temperature', 'total pressure'],
    ],
    [
      'k_y from k_G needs the pressure',
      gas('partial-pressure', 'dilute-or-equimolar'),
      'k_y',
      {},
      ['total pressure'],
    ],
    [
      'F from a stagnant k_y needs the inert',
      gas('mole-fraction', 'stagnant-inert'),
      'F',
      {},
      ['total pressure', 'log-mean inert pressure'],
    ],
    [
      'k_y from F too',
      gas('mole-fraction', 'drift-free'),
      'k_y',
      {},
      ['total pressure', 'log-mean inert pressure'],
    ],
    ['F from F does not', gas('mole-fraction', 'drift-free'), 'F', {}, []],
    ['F from a low-flux k_y is k_y', gas('mole-fraction', 'dilute-or-equimolar'), 'F', {}, []],
    [
      'a liquid basis is not for a gas',
      gas('concentration', 'dilute-or-equimolar'),
      'k_L',
      KNOWN,
      ['another phase'],
    ],
  ])('%s', (_what, from, to, known, missing) => {
    const conversion = convertBasis(from, to, { ...NOTHING, ...known });
    expect(conversion.missing).toEqual(missing);
    expect(conversion.value === null).toBe(missing.length > 0);
  });

  test('k_G from k_c without a pressure is k_c/(R T)', () => {
    close(
      on(gas('concentration', 'stagnant-inert'), 'k_G', { ...NOTHING, temperature: 300 }),
      0.01 / (R * 300),
    );
  });
});

describe('in a liquid', () => {
  const liquid: CoefficientInSI = {
    value: 3.3e-5,
    basis: 'concentration',
    per: 'area',
    rateForm: 'dilute-or-equimolar',
    phase: 'liquid',
  };

  test('k_x = k_L c and back', () => {
    close(on(liquid, 'k_x'), 3.3e-5 * 55000);
    close(on({ ...liquid, basis: 'mole-fraction' }, 'k_L'), 3.3e-5 / 55000);
    expect(on(liquid, 'k_L', NOTHING)).toBe(3.3e-5);
  });

  test('without density and molar mass k_x has no value', () => {
    expect(convertBasis(liquid, 'k_x', NOTHING)).toMatchObject({
      value: null,
      missing: ['liquid density', 'molar mass of the solvent'],
    });
    expect(convertBasis(liquid, 'k_x', { ...NOTHING, liquidDensity: 998 })).toMatchObject({
      value: null,
      missing: ['molar mass of the solvent'],
    });
    expect(convertBasis(liquid, 'k_G', KNOWN)).toMatchObject({ value: null, missing: ['another phase'] });
  });
});

describe('units and symbols', () => {
  test('each basis has a unit that can be read, per area and per volume a metre apart', () => {
    for (const basis of COEFFICIENT_BASES) {
      const [area, volume] = [readUnit(basisUnit(basis, 'area')), readUnit(basisUnit(basis, 'volume'))];
      expect(area.ok && volume.ok, basis).toBe(true);
      if (area.ok && volume.ok) {
        expect(area.unit.factor).toBe(1);
        expect((area.unit.dimension.m ?? 0) - (volume.unit.dimension.m ?? 0)).toBe(1);
      }
      expect(BASES[basis].words).not.toBe('');
      expect(basisSymbol(basis, 'volume')).toBe(`${basis}a`);
    }
  });
});
