import { describe, expect, test } from 'vitest';
import type { Piece } from '../sheet/common-schema.js';
import type { CorrelationDefinition, Part } from '../sheet/definition.js';
import {
  aRequest,
  aSheet,
  compiled,
  DUTY,
  GAS_PART,
  numbersOf,
  outcomeOf,
  partWith,
  problemsOf,
  quantitiesWith,
} from '../testing/a-sheet.js';

const AREA: Part = {
  key: 'area',
  title: 'Wetted area',
  result: { symbol: 'a', kind: 'interfacial-area', unit: '1/m', expression: '4/d' },
  coefficient: null,
};
const LIQUID: Part = {
  key: 'liquid-side',
  title: 'Liquid side',
  phase: 'liquid',
  result: { symbol: 'k_L', kind: 'coefficient', unit: 'm/s', expression: '2*(D_L*u_L/(pi*Z))^0.5' },
  coefficient: null,
};
const VOLUMETRIC: Part = {
  key: 'together',
  title: 'Liquid side times area',
  phase: 'liquid',
  result: { symbol: 'k_La', kind: 'volumetric-coefficient', unit: '1/s', expression: 'k_L*a' },
  coefficient: null,
};

function method(parts: Part[], changes: Partial<CorrelationDefinition> = {}): CorrelationDefinition {
  return aSheet({
    phase: 'gas-and-liquid',
    quantities: [
      ...aSheet().quantities,
      { symbol: 'D_L', is: 'liquid-diffusivity', unit: 'm^2/s' },
      { symbol: 'u_L', is: 'superficial-liquid-velocity', unit: 'm/s' },
      { symbol: 'Z', is: 'packed-height', unit: 'm' },
      { symbol: 'rho_L', is: 'liquid-density', unit: 'kg/m^3', role: 'state' },
      { symbol: 'M_S', is: 'solvent-molar-mass', unit: 'kg/mol', role: 'state' },
    ],
    parts,
    ...changes,
  });
}

const LIQUID_DUTY = { D_L: { value: 1.96e-9 }, u_L: { value: 0.2 }, Z: { value: 1 } };

describe('a method of several parts', () => {
  const gasPart: Part = { ...GAS_PART, phase: 'gas' };

  test('the last part is the principal one, the parts stand in their order', () => {
    const numbers = numbersOf(method([gasPart, AREA, LIQUID, VOLUMETRIC]), aRequest(LIQUID_DUTY));
    const k_L = 2 * Math.sqrt((1.96e-9 * 0.2) / Math.PI);
    expect(numbers.parts.map(({ key }) => key)).toEqual(['gas-side', 'area', 'liquid-side', 'together']);
    expect(numbers.result).toEqual({
      symbol: 'k_La',
      value: expect.closeTo((k_L * 4) / 0.0254, 10) as number,
      unit: '1/s',
    });
    expect(numbers.coefficient).toBeNull();
    expect(numbers.parts[0]?.coefficient?.symbol).toBe('k_g');
    expect(numbers.parts[1]?.conversions).toEqual([]);
    expect(numbers.remarks).toEqual([]);
  });

  test('of a volumetric coefficient each basis is meant times the area', () => {
    const numbers = numbersOf(
      method([gasPart, AREA, LIQUID, VOLUMETRIC]),
      aRequest({ ...LIQUID_DUTY, rho_L: { value: 997 }, M_S: { value: 18.015, unit: 'g/mol' } }),
    );
    const k_x = numbers.conversions.find(({ basis }) => basis === 'k_x');
    expect(k_x).toMatchObject({ symbol: 'k_xa', unit: 'mol/(m^3 s)', missing: [] });
    expect(k_x?.value).toBeCloseTo((numbers.result.value * 997) / 0.018015, 6);
  });

  test('a part that lacks inputs is left out, and the answer says so', () => {
    const numbers = numbersOf(method([LIQUID, gasPart]), aRequest({ D_L: { value: 2e-9 } }));
    expect(numbers.parts.map(({ key }) => key)).toEqual(['gas-side']);
    expect(numbers.result.symbol).toBe('Sh');
    expect(numbers.remarks).toEqual(['Liquid side is left out: u_L, Z not given.']);
  });

  test('the principal part must be possible', () => {
    expect(problemsOf(method([gasPart, LIQUID]), aRequest()).map(({ field }) => field)).toEqual([
      'inputs.D_L',
      'inputs.u_L',
      'inputs.Z',
    ]);
  });

  test('the bound of a part that is left out does not stand in the way', () => {
    const bounded = method([LIQUID, gasPart], {
      bounds: [
        ...aSheet().bounds,
        { on: 'D_L', basis: 'stated', stretches: [{ hi: { value: 1e-9, nature: 'data' } }] },
      ],
    });
    const request = aRequest({ D_L: { value: 9e-9 } });
    expect(outcomeOf(bounded, request)).toMatchObject({ outcome: 'within' });
    expect(outcomeOf(bounded, aRequest({ ...LIQUID_DUTY, D_L: { value: 9e-9 } })).outcome).toBe('refused');
  });
});

describe('sheets made to take long', () => {
  // Each line stands on the two before it: tried again at every need, this would take more than 2^40 steps.
  const names = Array.from({ length: 56 }, (_, i) => `q_${i}`);
  const line = (i: number): string =>
    i < 2 ? (i === 0 ? 'Re' : 'Sc') : `${names[i - 1] ?? ''}*${names[i - 2] ?? ''}/${names[i - 2] ?? ''}`;
  const [groups, intermediates] = [names.slice(0, 28), names.slice(28)];
  const sheet = compiled(
    aSheet({
      groups: [
        ...aSheet().groups,
        ...groups.map((symbol, i) => ({ symbol, name: symbol, expression: line(i) })),
      ],
      intermediates: intermediates.map((symbol, i) => ({
        symbol,
        name: symbol,
        unit: '1',
        expression: line(i + 28),
      })),
      bounds: [
        ...aSheet().bounds,
        ...['q_26', 'q_27'].map((on) => ({ on, basis: 'none' as const, stretches: [] })),
      ],
      parts: [{ ...GAS_PART, result: { ...GAS_PART.result, expression: 'q_55*Re' } }],
    }),
  );

  test('are answered at once, with a value, with what is missing, or over-determined', () => {
    const before = performance.now();
    expect(numbersOf(sheet, { inputs: { Re: { value: 10000 }, Sc: { value: 1 } } }).result.symbol).toBe('Sh');
    expect(problemsOf(sheet, aRequest({ mu: null })).map(({ field }) => field)).toEqual(['inputs.mu']);
    expect(problemsOf(sheet, aRequest({ q_27: { value: 1 } })).map(({ code }) => code)).toEqual([
      'over-determined',
    ]);
    expect(performance.now() - before).toBeLessThan(2000);
  });
});

describe('pieces', () => {
  const pieces: Piece[] = [
    { title: 'smooth', when: [{ on: 'Re', lo: 2000, hi: 10000 }], expression: '0.02*Re^0.8*Sc' },
    {
      title: 'rough',
      when: [{ on: 'Re', lo: 20000, hi: 30000, hiClosed: true }],
      expression: '0.04*Re^0.8*Sc',
    },
  ];
  const sheet = compiled(aSheet({ parts: [partWith({ expression: undefined, pieces })] }));
  const at = (Re: number, Sc = 1) => ({ inputs: { Re: { value: Re }, Sc: { value: Sc } } });

  test.each([
    [2000, 0.02, 'smooth'],
    [9999.999, 0.02, 'smooth'],
    [20000, 0.04, 'rough'],
    [30000, 0.04, 'rough'],
  ])('at Re = %d the piece that holds is used and named', (Re, factor, title) => {
    const numbers = numbersOf(sheet, at(Re));
    expect(numbers.result.value).toBeCloseTo(factor * Re ** 0.8, 8);
    expect(numbers.steps.find(({ symbol }) => symbol === 'Sh')?.note).toBe(`Gas side; ${title}`);
  });

  test.each([
    [10000, 10000, 20000, 'one ends at 10\u2009000, the next begins at 20\u2009000'],
    [15000, 10000, 20000, 'one ends at 10\u2009000, the next begins at 20\u2009000'],
    [32000, 30000, null, 'the last one ends at 30\u2009000'],
  ])('at Re = %d none holds: refused with the neighbours named', (Re, lo, hi, words) => {
    const outcome = outcomeOf(sheet, at(Re));
    expect(outcome).toMatchObject({ outcome: 'refused', code: 'between-pieces' });
    expect(outcome.findings).toContainEqual(
      expect.objectContaining({ symbol: 'Re', kind: 'between', lo, hi, deviable: false }),
    );
    expect(outcome.outcome === 'refused' && outcome.message).toContain(words);
  });

  test('no deviation helps between pieces', () => {
    const request = {
      ...at(15000),
      deviations: [{ symbol: 'Re', reason: 'The two pieces nearly meet there.' }],
    };
    expect(outcomeOf(sheet, request).outcome).toBe('refused');
  });

  test('with two symbols the one that lies in no piece is named, the other is not', () => {
    const two = compiled(
      aSheet({
        parts: [
          partWith({
            expression: undefined,
            pieces: [
              { when: [{ on: 'Re', hi: 5000 }], expression: 'Re*Sc' },
              {
                when: [
                  { on: 'Re', lo: 5000 },
                  { on: 'Sc', hi: 1 },
                ],
                expression: '2*Re*Sc',
              },
              {
                when: [
                  { on: 'Re', lo: 5000 },
                  { on: 'Sc', lo: 2 },
                ],
                expression: '3*Re*Sc',
              },
            ],
          }),
        ],
      }),
    );
    const outcome = outcomeOf(two, at(9000, 1.5));
    expect(outcome.outcome === 'refused' && outcome.message).toBe(
      'No piece of the equation for Sh covers Sc = 1.5: one ends at 1, the next begins at 2.',
    );
    expect(numbersOf(two, at(4000, 1.5)).result.value).toBeCloseTo(6000, 8);
  });

  test('where only the combination is covered by none, that is said', () => {
    const corner = compiled(
      aSheet({
        parts: [
          partWith({
            expression: undefined,
            pieces: [
              {
                when: [
                  { on: 'Re', hi: 5000 },
                  { on: 'Sc', hi: 1 },
                ],
                expression: 'Re*Sc',
              },
              {
                when: [
                  { on: 'Re', lo: 5000 },
                  { on: 'Sc', lo: 1 },
                ],
                expression: '2*Re*Sc',
              },
            ],
          }),
        ],
      }),
    );
    const outcome = outcomeOf(corner, at(4000, 2));
    expect(outcome.outcome === 'refused' && outcome.message).toBe(
      'No piece of the equation for Sh covers Re = 4000 together with the other conditions. No piece of the equation for Sh covers Sc = 2 together with the other conditions.',
    );
  });
});

describe('rows of a table', () => {
  const tube = aSheet({
    quantities: quantitiesWith('d', { table: 'tube', unit: 'mm' }),
    tables: [
      {
        name: 'tube',
        title: 'Tube',
        rows: [
          { key: 'one-inch', label: '1 in', values: { d: 25.4 } },
          { key: 'unknown-size', label: 'Unknown', values: {} },
        ],
      },
    ],
  });

  test('fill a quantity in its unit on the sheet, and are named', () => {
    const numbers = numbersOf(tube, aRequest({ d: null }, { rows: { tube: 'one-inch' } }));
    expect(numbers.result.value).toBeCloseTo(numbersOf(aSheet(), aRequest()).result.value, 10);
    expect(numbers.rows).toEqual({ tube: 'one-inch' });
  });

  test('what is given goes before the row', () => {
    const numbers = numbersOf(tube, aRequest({ d: { value: 20 } }, { rows: { tube: 'one-inch' } }));
    expect(numbers.groups['Re']).toBeCloseTo((1.147 * 8.72 * 0.02) / 1.92e-5, 8);
    expect(numbers.rows).toEqual({});
  });

  test('a row without the value leaves it missing', () => {
    expect(problemsOf(tube, aRequest({ d: null }, { rows: { tube: 'unknown-size' } }))).toEqual([
      expect.objectContaining({ code: 'missing', field: 'inputs.d' }),
    ]);
  });

  test('a row without the value of a symbol with an inherited name leaves that missing too', () => {
    const odd = aSheet({
      quantities: quantitiesWith('d', { table: 'tube', symbol: 'valueOf' }),
      groups: aSheet().groups.map((g) => ({ ...g, expression: g.expression.replace('*d/', '*valueOf/') })),
      tables: [{ name: 'tube', title: 'Tube', rows: [{ key: 'none', label: 'None', values: {} }] }],
      parts: [{ ...GAS_PART, coefficient: null }],
    });
    expect(problemsOf(odd, aRequest({ d: null }, { rows: { tube: 'none' } }))).toEqual([
      expect.objectContaining({ code: 'missing', field: 'inputs.valueOf' }),
    ]);
  });
});

describe('dimensional formulas', () => {
  // k in cm/h from d in mm and u in ft/s: made up, to see that the numbers go in and out in the sheet's units.
  const sheet = compiled(
    aSheet({
      quantities: quantitiesWith('d', { unit: 'mm' }).map((q) =>
        q.symbol === 'u' ? { ...q, unit: 'ft/s' } : q,
      ),
      groups: [],
      bounds: [],
      parts: [
        {
          key: 'only',
          title: 'Only',
          result: {
            symbol: 'k',
            kind: 'coefficient',
            unit: 'cm/h',
            expression: '3*u^0.8/d^0.2',
            dimensional: true,
          },
          coefficient: null,
        },
      ],
      checks: [
        {
          title: 'One',
          kind: 'computed',
          inputs: { u: { value: 1 }, d: { value: 1 } },
          expected: { k: { value: 3 } },
          tolerancePercent: 0.1,
        },
      ],
    }),
  );

  test.each([
    ['in the units of the formula', { u: { value: 10 }, d: { value: 25.4 } }],
    ['in others', { u: { value: 3.048, unit: 'm/s' }, d: { value: 1, unit: 'in' } }],
  ])('give the same result %s', (_how, inputs) => {
    const numbers = numbersOf(sheet, { inputs });
    expect(numbers.result).toEqual({
      symbol: 'k',
      value: expect.closeTo((3 * 10 ** 0.8) / 25.4 ** 0.2, 10) as number,
      unit: 'cm/h',
    });
    expect(numbers.steps[0]?.texWithNumbers).toContain('{10}^{0.8}');
    expect(numbers.conversions[0]).toMatchObject({ basis: 'k_c', unit: 'm/s' });
    expect(numbers.conversions[0]?.value).toBeCloseTo(numbers.result.value / 360000, 14);
  });
});

test('intermediates are shown with their units', () => {
  const sheet = aSheet({
    intermediates: [{ symbol: 'G', name: 'Mass velocity', unit: 'kg/(m^2 h)', expression: 'rho*u' }],
    groups: [{ symbol: 'Re', name: 'Re', expression: 'G*d/mu' }, ...aSheet().groups.slice(1)],
  });
  const numbers = numbersOf(sheet, aRequest());
  expect(numbers.intermediates['G']?.unit).toBe('kg/(m^2 h)');
  expect(numbers.intermediates['G']?.value).toBeCloseTo(1.147 * 8.72 * 3600, 6);
  expect(numbers.groups['Re']).toBeCloseTo(numbersOf(aSheet(), { inputs: DUTY }).groups['Re'] ?? 0, 8);
});
