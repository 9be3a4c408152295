import { describe, expect, test } from 'vitest';
import {
  aRequest,
  aSheet,
  compiled,
  GAS_PART,
  numbersOf,
  outcomeOf,
  problemsOf,
} from '../testing/a-sheet.js';
import { PROVISIONAL } from './outcome.js';

const REASON = 'Pilot data of the same tube show no change here.';
const at = (u: number) => aRequest({ u: { value: u } });
/** Velocity at which the duty has this Reynolds number. */
const velocityFor = (Re: number) => (Re * 1.92e-5) / (1.147 * 0.0254);

describe('a duty in bounds', () => {
  const numbers = numbersOf(aSheet(), aRequest());

  test('gives groups, result and coefficient by the formulas of the sheet', () => {
    const Re = (1.147 * 8.72 * 0.0254) / 1.92e-5;
    const Sc = 1.92e-5 / (1.147 * 2.42e-5);
    const Sh = 0.023 * Re ** 0.83 * Sc ** 0.44;
    expect(numbers.outcome).toBe('within');
    expect(numbers.groups['Re']).toBeCloseTo(Re, 8);
    expect(numbers.groups['Sc']).toBeCloseTo(Sc, 12);
    expect(numbers.result).toEqual({ symbol: 'Sh', value: expect.closeTo(Sh, 10) as number, unit: '1' });
    expect(numbers.coefficient).toEqual({
      symbol: 'k_g',
      value: expect.closeTo((Sh * 2.42e-5) / 0.0254, 12) as number,
      unit: 'm/s',
      basis: 'concentration',
      per: 'area',
      rateForm: 'dilute-or-equimolar',
    });
    expect(numbers.findings.map(({ symbol, kind }) => [symbol, kind])).toEqual([
      ['Re', 'within'],
      ['Sc', 'within'],
    ]);
    expect(numbers).not.toHaveProperty('mark');
  });

  test('is written out in numbered steps, each after what it needs', () => {
    expect(numbers.steps.map(({ symbol }) => symbol)).toEqual(['Re', 'Sc', 'Sh', 'k_g', 'k_c']);
    expect(numbers.steps[0]?.tex).toBe('\\mathrm{Re} = \\frac{\\rho \\, u \\, d}{\\mu}');
    expect(numbers.steps[0]?.texWithNumbers).toMatch(
      /^\\mathrm\{Re\} = \\frac\{1\.147 \\times 8\.72 .* = 13\\,230$/,
    );
    expect(numbers.steps[3]?.texWithNumbers).toMatch(/\\mathrm\{m\/s\}$/);
  });

  test('the same request gives the same outcome, whatever was evaluated before', () => {
    const sheet = compiled(aSheet());
    const before = outcomeOf(sheet, aRequest());
    outcomeOf(sheet, at(1));
    expect(outcomeOf(sheet, aRequest())).toEqual(before);
  });
});

describe('groups in the place of quantities', () => {
  test('give the result, and the coefficient as soon as D and d are there', () => {
    const groups = { Re: { value: 13000 }, Sc: { value: 0.7 } };
    const bare = numbersOf(aSheet(), { inputs: groups });
    expect(bare.result.value).toBeCloseTo(0.023 * 13000 ** 0.83 * 0.7 ** 0.44, 10);
    expect(bare.coefficient).toBeNull();
    expect(bare.conversions).toEqual([]);
    expect(bare.groups).toEqual({ Re: 13000, Sc: 0.7 });
    const whole = numbersOf(aSheet(), {
      inputs: { ...groups, D: { value: 0.242, unit: 'cm^2/s' }, d: { value: 1, unit: 'in' } },
    });
    expect(whole.coefficient?.value).toBeCloseTo((bare.result.value * 2.42e-5) / 0.0254, 12);
  });

  test('mix with quantities as long as nothing is said twice', () => {
    const numbers = numbersOf(aSheet(), aRequest({ D: null, Sc: { value: 0.7 } }));
    expect(numbers.groups['Sc']).toBe(0.7);
    expect(numbers.coefficient).toBeNull();
  });

  test.each([
    ['a group and all its quantities', aRequest({ Re: { value: 13000 } }), ['inputs.Re']],
    ['both groups', aRequest({ Re: { value: 1 }, Sc: { value: 1 } }), ['inputs.Re', 'inputs.Sc']],
    [
      'a group whose density an equation fills',
      aRequest({ rho: null, Re: { value: 1 } }, { equations: { rho: 'ideal-density' } }),
      ['inputs.Re'],
    ],
  ])('%s are over-determined', (_what, request, fields) => {
    const problems = problemsOf(aSheet(), request);
    expect(problems.filter(({ code }) => code === 'over-determined').map(({ field }) => field)).toEqual(
      fields,
    );
  });

  test('a group made of groups is over-determined through them', () => {
    const sheet = aSheet({
      groups: [...aSheet().groups, { symbol: 'Pe', name: 'Péclet number', expression: 'Re*Sc' }],
      bounds: [...aSheet().bounds, { on: 'Pe', basis: 'none', stretches: [] }],
      parts: [{ ...GAS_PART, result: { ...GAS_PART.result, expression: '0.02*Pe^0.8' } }],
    });
    const all = { Re: { value: 10000 }, Sc: { value: 1 }, Pe: { value: 10000 } };
    expect(problemsOf(sheet, { inputs: all }).map(({ field }) => field)).toEqual(['inputs.Pe']);
    expect(problemsOf(sheet, aRequest({ Pe: { value: 10000 } })).map(({ field }) => field)).toEqual([
      'inputs.Pe',
    ]);
    const direct = outcomeOf(sheet, { inputs: { Pe: { value: 10000 } } });
    expect(direct).toMatchObject({
      outcome: 'unchecked',
      result: { value: expect.closeTo(0.02 * 10000 ** 0.8, 8) as number },
    });
  });

  test('a bound on a quantity that was not given is said to be unchecked', () => {
    const sheet = aSheet({
      bounds: [
        ...aSheet().bounds,
        { on: 'd', basis: 'handbook', stretches: [{ hi: { value: 0.05, nature: 'data' } }] },
      ],
    });
    const numbers = numbersOf(sheet, { inputs: { Re: { value: 13000 }, Sc: { value: 0.7 } } });
    expect(numbers.outcome).toBe('unchecked');
    expect(numbers.findings).toContainEqual(
      expect.objectContaining({ symbol: 'd', kind: 'unchecked', value: null, hi: 0.05 }),
    );
    expect(numbersOf(sheet, aRequest()).outcome).toBe('within');
  });
});

describe('outside', () => {
  test('of data there is a refusal with the findings and without a number', () => {
    const outcome = outcomeOf(aSheet(), at(velocityFor(40000)));
    expect(outcome).toMatchObject({
      outcome: 'refused',
      code: 'out-of-bounds',
      findings: [
        { symbol: 'Re', kind: 'outside', nature: 'data', lo: 2000, hi: 35000, deviable: true },
        { symbol: 'Sc', kind: 'within' },
      ],
    });
    expect(Object.keys(outcome).sort()).toEqual(['code', 'findings', 'message', 'outcome']);
    expect(JSON.stringify(outcome)).not.toContain('"Sh"');
  });

  test('the limits themselves belong to the range, in any unit of the inputs', () => {
    expect(outcomeOf(aSheet(), { inputs: { Re: { value: 35000 }, Sc: { value: 0.6 } } }).outcome).toBe(
      'within',
    );
    expect(outcomeOf(aSheet(), at(velocityFor(35000))).outcome).toBe('within');
    expect(outcomeOf(aSheet(), at(velocityFor(2000))).outcome).toBe('within');
    expect(outcomeOf(aSheet(), { inputs: { Re: { value: 35000.001 }, Sc: { value: 1 } } }).outcome).toBe(
      'refused',
    );
  });

  test('a reasoned deviation gives a marked number', () => {
    const deviations = [{ symbol: 'Re', reason: `  ${REASON} ` }];
    const outcome = outcomeOf(aSheet(), { ...at(velocityFor(40000)), deviations });
    expect(outcome).toMatchObject({
      outcome: 'deviating',
      mark: PROVISIONAL,
      deviations: [{ symbol: 'Re', reason: REASON }],
    });
    if (outcome.outcome === 'refused') throw new Error('refused');
    expect(outcome.result.value).toBeCloseTo(0.023 * 40000 ** 0.83 * (outcome.groups['Sc'] ?? 0) ** 0.44, 8);
  });

  test('each symbol outside needs its own deviation', () => {
    const inputs = { Re: { value: 40000 }, Sc: { value: 3 } };
    const one = [{ symbol: 'Re', reason: REASON }];
    const both = [...one, { symbol: 'Sc', reason: REASON }];
    expect(outcomeOf(aSheet(), { inputs, deviations: one })).toMatchObject({
      outcome: 'refused',
      code: 'out-of-bounds',
    });
    expect(outcomeOf(aSheet(), { inputs, deviations: both })).toMatchObject({
      outcome: 'deviating',
      deviations: both,
    });
  });

  test.each([
    ['past the reach of data', 71000, 'past-reach'],
    ['of a regime', 1990, 'out-of-bounds'],
  ])('%s no deviation helps', (_where, Re, code) => {
    const outcome = outcomeOf(aSheet(), {
      inputs: { Re: { value: Re }, Sc: { value: 1 } },
      deviations: [{ symbol: 'Re', reason: REASON }],
    });
    expect(outcome).toMatchObject({ outcome: 'refused', code });
  });

  test('between stretches there is a refusal of its own kind', () => {
    const sheet = aSheet({
      bounds: [
        ...aSheet().bounds.slice(0, 1),
        {
          on: 'Sc',
          basis: 'stated',
          stretches: [
            { lo: { value: 0.6, nature: 'data' }, hi: { value: 2.5, nature: 'data' } },
            { lo: { value: 1000, nature: 'data' }, hi: { value: 2260, nature: 'data' } },
          ],
        },
      ],
    });
    const request = { inputs: { Re: { value: 13000 }, Sc: { value: 30 } } };
    expect(outcomeOf(sheet, request)).toMatchObject({ outcome: 'refused', code: 'between-pieces' });
    expect(outcomeOf(sheet, { ...request, deviations: [{ symbol: 'Sc', reason: REASON }] }).outcome).toBe(
      'refused',
    );
    expect(outcomeOf(sheet, { inputs: { Re: { value: 13000 }, Sc: { value: 1500 } } }).outcome).toBe(
      'within',
    );
  });

  test('a physical bound is an input error at its field', () => {
    const sheet = aSheet({
      bounds: [
        ...aSheet().bounds,
        { on: 'd', basis: 'common-practice', stretches: [{ hi: { value: 10, nature: 'physical' } }] },
      ],
    });
    const inputs = { Re: { value: 13000 }, Sc: { value: 1 }, d: { value: 11 } };
    expect(problemsOf(sheet, { inputs })).toEqual([
      expect.objectContaining({ code: 'domain', field: 'inputs.d' }),
    ]);
  });

  test('no bound on record: the number comes, and says that it is unchecked', () => {
    const sheet = aSheet({
      bounds: [...aSheet().bounds.slice(0, 1), { on: 'Sc', basis: 'none', stretches: [] }],
    });
    expect(outcomeOf(sheet, aRequest())).toMatchObject({ outcome: 'unchecked', result: { symbol: 'Sh' } });
  });
});

describe('the form of a deviation', () => {
  const outside = { inputs: { Re: { value: 40000 }, Sc: { value: 1 } } };

  test.each([
    ['19 characters', 'x'.repeat(19), false],
    ['20 characters', 'x'.repeat(20), true],
    ['20 characters with blanks around them', `  ${'x'.repeat(20)}  `, true],
    ['19 characters and blanks', `${'x'.repeat(19)}     `, false],
    ['2 000 characters', 'x'.repeat(2000), true],
    ['2 001 characters', 'x'.repeat(2001), false],
    ['nothing', '', false],
  ])('%s', (_length, reason, accepted) => {
    const problems = problemsOf(aSheet(), { ...outside, deviations: [{ symbol: 'Re', reason }] });
    expect(problems.map(({ code, field }) => [code, field])).toEqual(
      accepted ? [] : [['malformed', 'deviations[0].reason']],
    );
  });

  test.each([
    [
      'two for a symbol',
      [
        { symbol: 'Re', reason: REASON },
        { symbol: 'Re', reason: REASON },
      ],
      'deviations[1].symbol',
      'Re has two deviations.',
    ],
    [
      'one that is not needed',
      [
        { symbol: 'Re', reason: REASON },
        { symbol: 'Sc', reason: REASON },
      ],
      'deviations[1].symbol',
      'Sc needs no deviation: it is not outside its bound.',
    ],
    [
      'one where no bound is',
      [
        { symbol: 'Re', reason: REASON },
        { symbol: 'mu', reason: REASON },
      ],
      'deviations[1].symbol',
      'There is no bound on mu.',
    ],
    [
      'one on an inherited name',
      [{ symbol: '__proto__', reason: REASON }],
      'deviations[0].symbol',
      'There is no bound on __proto__.',
    ],
  ])('%s is refused at its field', (_what, deviations, field, message) => {
    expect(problemsOf(aSheet(), { ...outside, deviations })).toEqual([{ code: 'malformed', field, message }]);
  });

  test('a deviation where nothing is outside is a mistake worth telling', () => {
    expect(problemsOf(aSheet(), aRequest({}, { deviations: [{ symbol: 'Re', reason: REASON }] }))).toEqual([
      expect.objectContaining({ field: 'deviations[0].symbol' }),
    ]);
  });
});

test('a formula without a finite value is told at its symbol, with the values', () => {
  const sheet = aSheet({
    parts: [{ ...GAS_PART, result: { ...GAS_PART.result, expression: 'Sc*(1 - Re/5000)^0.5' } }],
  });
  expect(problemsOf(sheet, { inputs: { Re: { value: 10000 }, Sc: { value: 1 } } })).toEqual([
    {
      code: 'domain',
      field: 'Sh',
      message: 'Gas side (Sh) has no finite value at Sc = 1.000, Re = 1.000e+4.',
    },
  ]);
});

test('an unknown basis is refused at its field', () => {
  const bases = ['k_c', 'k_z'] as unknown as ['k_c'];
  expect(problemsOf(aSheet(), aRequest({}, { bases }))).toEqual([
    {
      code: 'malformed',
      field: 'bases[1]',
      message: '"k_z" is not a basis; there are k_c, k_G, k_y, F, k_L, k_x.',
    },
  ]);
});
