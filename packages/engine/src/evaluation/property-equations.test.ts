import { describe, expect, test } from 'vitest';
import {
  aRequest,
  aSheet,
  idealDensity,
  LIBRARY,
  libraryOf,
  numbersOf,
  outcomeOf,
  problemsOf,
  quantitiesWith,
  straightViscosity,
} from '../testing/a-sheet.js';
import type { EvaluationRequest, InputValue } from './outcome.js';

const REASON = 'The gas law holds well at this temperature too.';
const STATE: Record<string, InputValue> = { T: { value: 25, unit: 'degC' }, P: { value: 101325 } };
const byEquation = (
  inputs: Record<string, InputValue | null> = STATE,
  rest: Omit<EvaluationRequest, 'inputs'> = {},
): EvaluationRequest =>
  aRequest({ rho: null, ...inputs }, { equations: { rho: 'ideal-density' }, rows: { gas: 'air' }, ...rest });

/** Density of dry air at 25 °C and 101 325 Pa: P M/(R T) = 1.184 kg/m³ (as in the tables of CIPM-2007, from memory). */
const AIR = (101325 * 0.0289647) / (8.314462618 * 298.15);

describe('a quantity filled by a property equation', () => {
  test('takes temperature and pressure of the sheet, and says so', () => {
    const numbers = numbersOf(aSheet(), byEquation());
    expect(AIR).toBeCloseTo(1.184, 3);
    expect(numbers.equations).toEqual([
      {
        symbol: 'rho',
        key: 'ideal-density',
        title: 'Ideal gas density of dry air',
        value: expect.closeTo(AIR, 12) as number,
        unit: 'kg/m^3',
        assumes: 'The gas is dry air.',
      },
    ]);
    expect(numbers.rows).toEqual({ 'rho.gas': 'air' });
    expect(numbers.groups['Re']).toBeCloseTo((AIR * 8.72 * 0.0254) / 1.92e-5, 8);
    expect(numbers.steps[0]).toMatchObject({
      kind: 'property',
      symbol: 'rho',
      tex: '\\rho = \\frac{P \\, M}{R \\, T}',
      note: 'Ideal gas density of dry air. Assumes: The gas is dry air.',
    });
    expect(numbers.findings).toContainEqual(expect.objectContaining({ symbol: 'rho.T', kind: 'within' }));
  });

  test('is not filled unless it is asked for', () => {
    expect(problemsOf(aSheet(), aRequest({ ...STATE, rho: null }))).toEqual([
      expect.objectContaining({ code: 'missing', field: 'inputs.rho' }),
    ]);
  });

  test('takes its own input by its path before that of the sheet', () => {
    const numbers = numbersOf(aSheet(), byEquation({ ...STATE, 'rho.T': { value: 350 } }));
    expect(numbers.equations[0]?.value).toBeCloseTo((AIR * 298.15) / 350, 12);
  });

  test.each([
    ['by its name', { gas: 'helium' }, 'rho.gas'],
    ['by its path', { 'rho.gas': 'helium' }, 'rho.gas'],
    ['the path before the name', { gas: 'air', 'rho.gas': 'helium' }, 'rho.gas'],
  ])('takes the row of its table %s', (_how, rows, used) => {
    const numbers = numbersOf(
      aSheet({ bounds: aSheet().bounds.map(({ on }) => ({ on, basis: 'none', stretches: [] })) }),
      byEquation(STATE, { rows }),
    );
    expect(numbers.rows).toEqual({ [used]: 'helium' });
    expect(numbers.equations[0]?.value).toBeCloseTo((AIR * 0.0040026) / 0.0289647, 10);
  });

  test('serves another equation', () => {
    // A viscosity that stands on the density: only to see a chain, no physics.
    const kinematic = idealDensity({
      title: 'Viscosity from the density',
      gives: 'gas-viscosity',
      unit: 'Pa s',
      quantities: [{ symbol: 'r', is: 'gas-density', unit: 'kg/m^3' }],
      tables: undefined,
      bounds: [],
      expression: '1.6e-5*r',
      dimensional: true,
      checks: [
        {
          title: 'Round',
          kind: 'computed',
          inputs: { r: { value: 1 } },
          expected: { value: { value: 1.6e-5 } },
          tolerancePercent: 0.01,
        },
      ],
    });
    const library = libraryOf({ 'ideal-density': idealDensity(), kinematic });
    const sheet = aSheet({ quantities: quantitiesWith('mu', { equations: ['kinematic'] }) });
    const request = {
      ...byEquation(),
      equations: { rho: 'ideal-density', mu: 'kinematic' },
    };
    delete request.inputs['mu'];
    const numbers = numbersOf(sheet, request, library);
    expect(numbers.equations.map(({ symbol }) => symbol)).toEqual(['rho', 'mu']);
    expect(numbers.groups['Re']).toBeCloseTo((8.72 * 0.0254) / 1.6e-5, 8);
  });

  test('comes in its own units where its formula is dimensional', () => {
    const numbers = numbersOf(
      aSheet(),
      aRequest({ mu: null, T: { value: 77, unit: 'degF' } }, { equations: { mu: 'straight-viscosity' } }),
    );
    expect(numbers.outcome).toBe('unchecked');
    expect(numbers.equations[0]?.value).toBeCloseTo((17.2 + 0.048 * 25) * 1e-6, 14);
    expect(numbers.equations[0]?.unit).toBe('Pa s');
    expect(numbers.equations[0]).not.toHaveProperty('assumes');
  });
});

describe('the bounds of a property equation', () => {
  test('refuse under its path', () => {
    const outcome = outcomeOf(aSheet(), byEquation({ ...STATE, T: { value: 150, unit: 'degC' } }));
    expect(outcome).toMatchObject({ outcome: 'refused', code: 'out-of-bounds' });
    expect(outcome.findings).toContainEqual(
      expect.objectContaining({
        symbol: 'rho.T',
        kind: 'outside',
        unit: 'K',
        lo: 200,
        hi: 400,
        deviable: true,
      }),
    );
  });

  test('take a deviation under their path', () => {
    const outcome = outcomeOf(
      aSheet(),
      byEquation(
        { ...STATE, T: { value: 150, unit: 'degC' } },
        { deviations: [{ symbol: 'rho.T', reason: REASON }] },
      ),
    );
    expect(outcome).toMatchObject({ outcome: 'deviating', deviations: [{ symbol: 'rho.T' }] });
  });

  test('past the reach no deviation helps', () => {
    const request = byEquation(
      { ...STATE, 'rho.T': { value: 801 } },
      { deviations: [{ symbol: 'rho.T', reason: REASON }] },
    );
    expect(outcomeOf(aSheet(), request)).toMatchObject({ outcome: 'refused', code: 'past-reach' });
  });

  test('refuse also where the value serves a conversion only', () => {
    // p_BM of a low-flux coefficient is in no formula of the sheet; only F stands on it.
    const inert = idealDensity({
      title: 'Inert pressure',
      gives: 'log-mean-inert-pressure',
      unit: 'Pa',
      quantities: [{ symbol: 'P', is: 'total-pressure', unit: 'Pa' }],
      tables: undefined,
      bounds: [{ on: 'P', basis: 'stated', stretches: [{ hi: { value: 1e5, nature: 'data' } }] }],
      expression: '0.9*P',
      checks: [
        {
          title: 'One',
          kind: 'computed',
          inputs: { P: { value: 1000 } },
          expected: { value: { value: 900 } },
          tolerancePercent: 1,
        },
      ],
    });
    const sheet = aSheet({ quantities: quantitiesWith('p_BM', { equations: ['inert'] }) });
    const request = aRequest(STATE, { equations: { p_BM: 'inert' } });
    const outcome = outcomeOf(sheet, request, libraryOf({ inert }));
    expect(outcome).toMatchObject({ outcome: 'refused', code: 'out-of-bounds' });
    expect(outcome.findings).toContainEqual(expect.objectContaining({ symbol: 'p_BM.P', kind: 'outside' }));
    const within = numbersOf(
      sheet,
      { ...request, inputs: { ...request.inputs, P: { value: 90000 } } },
      libraryOf({ inert }),
    );
    expect(within.equations).toEqual([expect.objectContaining({ symbol: 'p_BM', value: 81000 })]);
    expect(within.findings).toContainEqual(expect.objectContaining({ symbol: 'p_BM.P', kind: 'within' }));
  });

  test('name the bound even where the equation has no value at all', () => {
    const pieces = idealDensity({
      expression: undefined,
      pieces: [
        { when: [{ on: 'T', lo: 200, hi: 300 }], expression: 'P*M/(R*T)' },
        { when: [{ on: 'T', lo: 300, hi: 400 }], expression: 'P*M/(R*T)' },
      ],
    });
    const outcome = outcomeOf(
      aSheet(),
      byEquation({ ...STATE, T: { value: 430 } }),
      libraryOf({ 'ideal-density': pieces }),
    );
    expect(outcome).toMatchObject({ outcome: 'refused', code: 'between-pieces' });
    expect(outcome.findings).toContainEqual(
      expect.objectContaining({ symbol: 'rho.T', kind: 'outside', hi: 400 }),
    );
    expect(outcome.findings).toContainEqual(
      expect.objectContaining({
        symbol: 'rho.T',
        kind: 'between',
        message: 'No piece of the equation for rho covers T = 430: the last one ends at 400.',
      }),
    );
  });

  test('a value that no fluid has is an error, where a deviation would have let it through', () => {
    const falling = idealDensity({
      expression: 'P*M/(R*T)*(1 - T/(500 K_1))'.replace('(500 K_1)', 'T_0'),
      bounds: [],
    });
    const sinking = {
      ...falling,
      quantities: [...falling.quantities, { symbol: 'T_0', is: 'reference-temperature', unit: 'K' }],
    };
    const library = libraryOf({ 'ideal-density': sinking });
    const problems = problemsOf(aSheet(), byEquation({ ...STATE, 'rho.T_0': { value: 290 } }), library);
    expect(problems).toEqual([
      {
        code: 'domain',
        field: 'rho.value',
        message: expect.stringMatching(
          /^Ideal gas density of dry air gives -0\.03\d+ kg\/m\^3 here, which gas density cannot be\.$/,
        ) as string,
      },
    ]);
  });
});

describe('what is refused', () => {
  test.each<[string, EvaluationRequest, string, string]>([
    [
      'an equation the sheet does not list',
      aRequest({ ...STATE, D: null }, { equations: { D: 'ideal-density' } }),
      'unknown-equation',
      'equations.D',
    ],
    [
      'an equation nobody has',
      byEquation(STATE, { equations: { rho: 'moist-density' }, rows: {} }),
      'unknown-equation',
      'equations.rho',
    ],
    [
      'an inherited name as equation',
      byEquation(STATE, { equations: { rho: 'constructor' }, rows: {} }),
      'unknown-equation',
      'equations.rho',
    ],
    [
      'an equation for what is no quantity',
      aRequest({}, { equations: { Re: 'ideal-density' } }),
      'unknown-symbol',
      'equations.Re',
    ],
    [
      'a value and an equation',
      aRequest(STATE, { equations: { rho: 'ideal-density' }, rows: { gas: 'air' } }),
      'over-determined',
      'equations.rho',
    ],
    ['a table nobody has', aRequest({}, { rows: { packing: 'ring' } }), 'unknown-row', 'rows.packing'],
    ['a row nobody has', byEquation(STATE, { rows: { gas: 'neon' } }), 'unknown-row', 'rows.gas'],
    ['an inherited name as row', byEquation(STATE, { rows: { gas: 'toString' } }), 'unknown-row', 'rows.gas'],
    [
      'an inherited name as table',
      byEquation(STATE, { rows: { constructor: 'name', gas: 'air' } }),
      'unknown-row',
      'rows.constructor',
    ],
    [
      'a unit that does not fit, at its path',
      byEquation({ ...STATE, 'rho.T': { value: 3, unit: 'm' } }),
      'unit',
      'inputs.rho.T',
    ],
    [
      'an input the equation does not know',
      byEquation({ ...STATE, 'rho.x': { value: 3 } }),
      'unknown-symbol',
      'inputs.rho.x',
    ],
    ['no temperature', byEquation({ P: { value: 101325 } }), 'missing', 'inputs.T'],
    ['no row', byEquation(STATE, { rows: {} }), 'missing', 'inputs.rho.M'],
  ])('%s', (_what, request, code, field) => {
    expect(problemsOf(aSheet(), request).map((problem) => [problem.code, problem.field])).toContainEqual([
      code,
      field,
    ]);
  });

  test('what an equation lacks is told in words', () => {
    expect(problemsOf(aSheet(), byEquation(STATE, { rows: {} }))).toEqual([
      {
        code: 'missing',
        field: 'inputs.rho.M',
        message:
          'Molar mass of the carrier gas (rho.M) is needed for "Ideal gas density of dry air": give it, or choose a row of "gas".',
      },
    ]);
  });

  test('an equation that gives another kind of quantity', () => {
    const sheet = aSheet({ quantities: quantitiesWith('rho', { equations: ['straight-viscosity'] }) });
    expect(
      problemsOf(
        sheet,
        aRequest({ ...STATE, rho: null }, { equations: { rho: 'straight-viscosity' } }),
        LIBRARY,
      ),
    ).toEqual([
      {
        code: 'unknown-equation',
        field: 'equations.rho',
        message: '"straight-viscosity" gives gas-viscosity in uPa s, which is no value for rho.',
      },
    ]);
  });

  test('two temperatures of which either could serve: a person says which', () => {
    const sheet = aSheet({
      quantities: [
        ...aSheet().quantities,
        { symbol: 'T_L', is: 'liquid-temperature', unit: 'K', role: 'state' },
      ],
    });
    const library = libraryOf({ 'straight-viscosity': straightViscosity() });
    const request = aRequest(
      { mu: null, T: { value: 300 }, T_L: { value: 280 } },
      { equations: { mu: 'straight-viscosity' } },
    );
    expect(problemsOf(sheet, request, library)).toEqual([
      expect.objectContaining({ code: 'missing', field: 'inputs.mu.t' }),
    ]);
    const told = { ...request, inputs: { ...request.inputs, 'mu.t': { value: 280, unit: 'K' } } };
    expect(numbersOf(sheet, told, library).equations[0]?.value).toBeCloseTo((17.2 + 0.048 * 6.85) * 1e-6, 14);
  });

  test('equations that need one another ask for what would end the circle', () => {
    const density = idealDensity({
      quantities: [{ symbol: 'm', is: 'gas-viscosity', unit: 'Pa s' }],
      tables: undefined,
      bounds: [],
      expression: '60000*m',
      dimensional: true,
      checks: [
        {
          title: 'One',
          kind: 'computed',
          inputs: { m: { value: 2e-5 } },
          expected: { value: { value: 1.2 } },
          tolerancePercent: 1,
        },
      ],
    });
    const viscosity = {
      ...density,
      gives: 'gas-viscosity',
      unit: 'Pa s',
      quantities: [{ symbol: 'r', is: 'gas-density', unit: 'kg/m^3' }],
      expression: 'r/60000',
      checks: [
        {
          title: 'One',
          kind: 'computed' as const,
          inputs: { r: { value: 1.2 } },
          expected: { value: { value: 2e-5 } },
          tolerancePercent: 1,
        },
      ],
    };
    const problems = problemsOf(
      aSheet(),
      aRequest({ rho: null, mu: null }, { equations: { rho: 'ideal-density', mu: 'straight-viscosity' } }),
      libraryOf({ 'ideal-density': density, 'straight-viscosity': viscosity }),
    );
    expect(problems.map(({ code, field }) => [code, field])).toContainEqual(['missing', 'inputs.mu.r']);
  });
});
