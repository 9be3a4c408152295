import { describe, expect, test } from 'vitest';
import { aRequest, aSheet, compiled, LIBRARY, numbersOf } from '../testing/a-sheet.js';
import { evaluate } from './evaluate.js';

const sheet = aSheet({ phase: 'gas-or-liquid' });
const bases = (request: Parameters<typeof numbersOf>[1]) =>
  numbersOf(sheet, request).conversions.map(({ basis }) => basis);

describe('the phase of a fluid that may be a gas or a liquid', () => {
  test('is not guessed: without a sign of it there are no other bases', () => {
    expect(bases(aRequest())).toEqual([]);
  });

  test('is told by a pressure', () => {
    expect(bases(aRequest({ P: { value: 1, unit: 'atm' } }))).toContain('k_G');
  });

  test('is told by a property equation that fills a quantity', () => {
    const request = aRequest(
      { mu: null, T: { value: 25, unit: 'degC' } },
      { equations: { mu: 'straight-viscosity' } },
    );
    expect(bases(request)).toContain('k_y');
    expect(bases(request)).not.toContain('k_L');
  });

  test('is asked for where a basis or a flux cannot do without it', () => {
    const [asked] = numbersOf(sheet, aRequest({}, { bases: ['k_L'] })).conversions;
    expect(asked).toMatchObject({ value: null, missing: ['whether the fluid is a gas or a liquid'] });
    const evaluation = evaluate(
      compiled(sheet),
      aRequest(
        {},
        { drivingForce: { kind: 'mole-fraction', interface: { value: 0.02 }, bulk: { value: 0.01 } } },
      ),
      LIBRARY,
    );
    expect(evaluation).toMatchObject({ ok: false, problems: [{ code: 'missing', field: 'drivingForce' }] });
  });

  test('does not matter on a concentration difference', () => {
    const { flux, coefficient } = numbersOf(
      sheet,
      aRequest(
        {},
        {
          drivingForce: {
            kind: 'concentration',
            interface: { value: 3, unit: 'mol/m^3' },
            bulk: { value: 1, unit: 'mol/m^3' },
          },
        },
      ),
    );
    expect(flux?.value).toBeCloseTo(2 * (coefficient?.value ?? Number.NaN), 12);
  });
});
