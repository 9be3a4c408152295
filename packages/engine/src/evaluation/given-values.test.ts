import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { unitsFor } from '../quantity/unit-choices.js';
import { readUnit, toSI, fromSI } from '../quantity/unit.js';
import {
  aRequest,
  aSheet,
  compiled,
  DUTY,
  GAS_PART,
  numbersOf,
  outcomeOf,
  problemsOf,
  quantitiesWith,
} from '../testing/a-sheet.js';
import type { InputValue } from './outcome.js';

const value = (v: number, unit?: string): InputValue => ({ value: v, unit });
const only = (problems: { code: string; field: string }[]) =>
  problems.map(({ code, field }) => [code, field]);

describe('what is refused, at its field', () => {
  test.each<[string, Record<string, InputValue | null>, string, string, RegExp]>([
    ['an unknown symbol', { w: value(1) }, 'unknown-symbol', 'inputs.w', /no quantity or group w/],
    ['a result as input', { Sh: value(50) }, 'unknown-symbol', 'inputs.Sh', /no quantity or group Sh/],
    [
      'a coefficient as input',
      { k_g: value(50) },
      'unknown-symbol',
      'inputs.k_g',
      /no quantity or group k_g/,
    ],
    ['a constant as input', { g: value(1.62) }, 'unknown-symbol', 'inputs.g', /no quantity or group g/],
    [
      'an inherited name',
      { constructor: value(1) },
      'unknown-symbol',
      'inputs.constructor',
      /no quantity or group/,
    ],
    [
      'an input of an equation that is not asked for',
      { 'rho.T': value(300) },
      'unknown-symbol',
      'inputs.rho.T',
      /no quantity/,
    ],
    ['a path too long', { 'rho.T.x': value(300) }, 'unknown-symbol', 'inputs.rho.T.x', /no quantity/],
    ['an empty name', { '': value(300) }, 'unknown-symbol', 'inputs.', /no quantity/],
    [
      'a unit nobody knows',
      { u: value(1, 'smoot/s') },
      'unit',
      'inputs.u',
      /"smoot\/s" is not a unit we know\./,
    ],
    [
      'a unit of another dimension',
      { u: value(1, 'Pa') },
      'unit',
      'inputs.u',
      /velocity relative to the wall is measured in m\/s; "Pa" is kg\/\(m s\^2\)/,
    ],
    [
      'a plain number where a length is meant',
      { d: value(1, '1') },
      'unit',
      'inputs.d',
      /"1" is a plain number/,
    ],
    [
      'zero where it cannot be',
      { mu: value(0) },
      'domain',
      'inputs.mu',
      /Gas viscosity must be greater than zero/,
    ],
    [
      'a negative number where it cannot be',
      { u: value(-1) },
      'domain',
      'inputs.u',
      /must be greater than zero/,
    ],
    [
      'a temperature under absolute zero',
      { T: value(-274, 'degC') },
      'domain',
      'inputs.T',
      /must be greater than zero/,
    ],
    [
      'a gauge reading under vacuum',
      { P: value(-1.1, 'bar(g)') },
      'domain',
      'inputs.P',
      /must be greater than zero/,
    ],
    [
      'a gauge reading of a partial pressure',
      { p_BM: value(1, 'barg') },
      'unit',
      'inputs.p_BM',
      /gauge reading has no meaning for log-mean/,
    ],
    ['what is too large for a double in SI', { d: value(1e308, 'km') }, 'domain', 'inputs.d', /too large/],
    [
      'what is too small for a double in SI',
      { d: value(1e-323, 'nm') },
      'domain',
      'inputs.d',
      /greater than zero/,
    ],
    ['NaN', { u: value(Number.NaN) }, 'malformed', 'inputs.u', /must be a finite number/],
    ['infinity', { u: value(Number.POSITIVE_INFINITY) }, 'malformed', 'inputs.u', /must be a finite number/],
    [
      '1e400, which reads as infinity',
      { u: value(Number('1e400')) },
      'malformed',
      'inputs.u',
      /must be a finite number/,
    ],
    [
      'a text',
      { u: { value: '5' } as unknown as InputValue },
      'malformed',
      'inputs.u',
      /must be a finite number/,
    ],
    [
      'null',
      { u: { value: null } as unknown as InputValue },
      'malformed',
      'inputs.u',
      /must be a finite number/,
    ],
    [
      'a negative group',
      { Re: value(-5), u: null },
      'domain',
      'inputs.Re',
      /Reynolds number cannot be negative/,
    ],
    [
      'a group with a unit',
      { Re: value(5, 'm'), u: null },
      'unit',
      'inputs.Re',
      /is measured in a plain number|"m" is m/,
    ],
    [
      'a unit that is too long',
      { u: value(1, 'm/s'.padEnd(41, ' ')) },
      'unit',
      'inputs.u',
      /at most 40 characters/,
    ],
  ])('%s', (_what, inputs, code, field, message) => {
    const problems = problemsOf(aSheet(), aRequest(inputs));
    expect(only(problems)).toEqual([[code, field]]);
    expect(problems[0]?.message).toMatch(message);
  });

  test('an own member called __proto__ is an unknown symbol', () => {
    const hostile: unknown = JSON.parse('{"__proto__": {"value": 1}}');
    const inputs = Object.defineProperty({ ...DUTY }, '__proto__', {
      value: (hostile as Record<string, InputValue>)['__proto__'],
      enumerable: true,
    });
    expect(only(problemsOf(aSheet(), { inputs }))).toEqual([['unknown-symbol', 'inputs.__proto__']]);
  });

  test('all faults come at once', () => {
    const request = aRequest(
      { u: value(-1), d: value(1, 's'), w: value(1) },
      { deviations: [{ symbol: 'Re', reason: 'no' }] },
    );
    expect(only(problemsOf(aSheet(), request))).toEqual([
      ['domain', 'inputs.u'],
      ['unit', 'inputs.d'],
      ['unknown-symbol', 'inputs.w'],
      ['malformed', 'deviations[0].reason'],
    ]);
  });
});

describe('frequency and angular speed', () => {
  const stirred = aSheet({
    quantities: [...aSheet().quantities, { symbol: 'N', is: 'impeller-speed', unit: '1/s', role: 'state' }],
    bounds: [...aSheet().bounds, { on: 'N', basis: 'none', stretches: [] }],
  });
  const rotating = aSheet({
    quantities: [...aSheet().quantities, { symbol: 'w', is: 'angular-speed', unit: 'rad/s', role: 'state' }],
    bounds: [...aSheet().bounds, { on: 'w', basis: 'none', stretches: [] }],
  });

  test('revolutions per minute are no angular speed of an impeller, and the message says what to give', () => {
    const problems = problemsOf(stirred, aRequest({ N: value(60, 'rpm') }));
    expect(problems).toEqual([
      {
        code: 'unit',
        field: 'inputs.N',
        message: '"rpm" is an angular speed and impeller speed is none: give turns per minute as 1/min.',
      },
    ]);
    const finding = numbersOf(stirred, aRequest({ N: value(60, '1/min') })).findings.find(
      ({ symbol }) => symbol === 'N',
    );
    expect(finding?.value).toBeCloseTo(1, 14);
  });

  test('an angular speed takes rpm and no frequency', () => {
    const finding = numbersOf(rotating, aRequest({ w: value(60, 'rpm') })).findings.find(
      ({ symbol }) => symbol === 'w',
    );
    expect(finding?.value).toBeCloseTo(2 * Math.PI, 14);
    expect(only(problemsOf(rotating, aRequest({ w: value(1, '1/s') })))).toEqual([['unit', 'inputs.w']]);
  });
});

describe('what is missing', () => {
  test('is told with the ways to get it', () => {
    const sheet = aSheet({
      quantities: quantitiesWith('d', { table: 'tube' }),
      tables: [
        { name: 'tube', title: 'Tube', rows: [{ key: 'one-inch', label: '1 in', values: { d: 0.0254 } }] },
      ],
    });
    const problems = problemsOf(sheet, aRequest({ u: null, d: null, rho: null }));
    expect(problems).toEqual([
      {
        code: 'missing',
        field: 'inputs.rho',
        message: 'Gas density (rho) is needed: give it, or name a property equation for it.',
      },
      {
        code: 'missing',
        field: 'inputs.u',
        message: 'Mean gas velocity relative to the wall (u) is needed: give it.',
      },
      {
        code: 'missing',
        field: 'inputs.d',
        message: 'Tube inside diameter (d) is needed: give it, or choose a row of "tube".',
      },
    ]);
  });

  test('of a group its quantities are asked for, not the group', () => {
    expect(only(problemsOf(aSheet(), { inputs: {} })).map(([, field]) => field)).toEqual([
      'inputs.rho',
      'inputs.u',
      'inputs.d',
      'inputs.mu',
      'inputs.D',
    ]);
  });

  test('states that serve nothing here are not asked for', () => {
    expect(outcomeOf(aSheet(), aRequest()).outcome).toBe('within');
  });
});

describe('units of the inputs', () => {
  test('a gauge pressure is taken over the standard atmosphere, and the answer says so', () => {
    const sheet = aSheet();
    const state = { T: value(25, '°C') };
    const gauge = numbersOf(sheet, aRequest({ ...state, P: value(1, 'barg') }));
    const absolute = numbersOf(sheet, aRequest({ ...state, P: value(2.01325, 'bar') }));
    expect(gauge.remarks).toEqual(['a gauge pressure is taken over the standard atmosphere of 101.325 kPa']);
    expect(absolute.remarks).toEqual([]);
    const k_y = (numbers: typeof gauge) =>
      numbers.conversions.find(({ basis }) => basis === 'k_y')?.value ?? 0;
    expect(k_y(gauge)).toBeCloseTo(k_y(absolute), 12);
    // c = P/(R T): k_y = k_c c.
    expect(k_y(gauge)).toBeCloseTo(((gauge.coefficient?.value ?? 0) * 201325) / (8.314462618 * 298.15), 10);
  });

  test('any input in any unit of its dimension gives the same result', () => {
    const sheet = compiled(aSheet());
    const base = numbersOf(sheet, aRequest());
    const choices = Object.entries(DUTY).flatMap(([symbol, { value: v, unit = '1' }]) =>
      unitsFor(unit).map((other) => ({ symbol, v, unit, other })),
    );
    fc.assert(
      fc.property(fc.array(fc.constantFrom(...choices), { minLength: 1, maxLength: 5 }), (changes) => {
        const inputs = Object.fromEntries(
          changes.map(({ symbol, v, unit, other }) => {
            const [from, to] = [readUnit(unit), readUnit(other)];
            if (!from.ok || !to.ok) throw new Error(`${unit} or ${other} cannot be read`);
            return [symbol, { value: fromSI(toSI(v, from.unit), to.unit), unit: other }];
          }),
        );
        const numbers = numbersOf(sheet, aRequest(inputs));
        expect(Math.abs(numbers.result.value / base.result.value - 1)).toBeLessThan(1e-12);
        expect(Math.abs((numbers.coefficient?.value ?? 0) / (base.coefficient?.value ?? 1) - 1)).toBeLessThan(
          1e-12,
        );
      }),
      { numRuns: 500, seed: 14 },
    );
  });

  test('the units of the sheet itself change no result either', () => {
    const other = aSheet({
      quantities: aSheet().quantities.map((q) => ({
        ...q,
        unit: { u: 'ft/h', d: 'mm', rho: 'lb/ft^3', mu: 'cP', D: 'cm^2/s' }[q.symbol] ?? q.unit,
      })),
      parts: [
        {
          ...GAS_PART,
          coefficient: GAS_PART.coefficient ? { ...GAS_PART.coefficient, unit: 'cm/h' } : null,
        },
      ],
    });
    const [one, two] = [numbersOf(aSheet(), aRequest()), numbersOf(other, aRequest())];
    expect(two.result.value / one.result.value).toBeCloseTo(1, 12);
    expect((two.coefficient?.value ?? 0) / (one.coefficient?.value ?? 1)).toBeCloseTo(100 * 3600, 6);
    expect(two.coefficient?.unit).toBe('cm/h');
  });

  test('Sh rises with Re, and by the power of the formula', () => {
    const sheet = compiled(aSheet());
    const sherwood = (Re: number) =>
      numbersOf(sheet, { inputs: { Re: value(Re), Sc: value(1) } }).result.value;
    fc.assert(
      fc.property(
        fc.double({ min: 2000, max: 17500, noNaN: true }),
        fc.double({ min: 1.0001, max: 2, noNaN: true }),
        (Re, factor) => {
          const ratio = sherwood(Re * factor) / sherwood(Re);
          expect(ratio).toBeGreaterThan(1);
          expect(Math.abs(ratio / factor ** 0.83 - 1)).toBeLessThan(1e-12);
        },
      ),
      { numRuns: 300, seed: 15 },
    );
  });
});
