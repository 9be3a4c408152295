import { describe, expect, test } from 'vitest';
import {
  aSheet,
  compiled,
  definitionProblems,
  GAS_PART,
  partWith,
  quantitiesWith,
} from '../testing/a-sheet.js';
import type { Piece, Quantity } from './common-schema.js';
import type { CorrelationDefinition, Part } from './definition.js';

const { quantities, groups, bounds } = aSheet();
const without = (symbol: string): Quantity[] => quantities.filter((q) => q.symbol !== symbol);
const coefficient = (change: Partial<NonNullable<Part['coefficient']>>): Part =>
  GAS_PART.coefficient ? { ...GAS_PART, coefficient: { ...GAS_PART.coefficient, ...change } } : GAS_PART;

test('a sound sheet compiles: symbols in slots, lines after what they need', () => {
  const { sheet } = compiled(aSheet({ groups: groups.toReversed() }));
  expect(sheet.order.indexOf('Sh')).toBeGreaterThan(sheet.order.indexOf('Re'));
  expect(sheet.order.indexOf('k_g')).toBeGreaterThan(sheet.order.indexOf('Sh'));
  expect(sheet.slots).toBe(quantities.length + 4);
  const slots = [...sheet.quantities.values(), ...sheet.lines.values()].map(({ slot }) => slot);
  expect(new Set(slots).size).toBe(sheet.slots);
});

test('definitions may stand in any order, and groups may use groups', () => {
  const { sheet } = compiled(
    aSheet({
      groups: [{ symbol: 'Pe', name: 'Péclet number', expression: 'Re*Sc' }, ...groups],
      intermediates: [{ symbol: 'f', name: 'Friction factor', unit: '1', expression: '0.079*Re^-0.25' }],
      parts: [partWith({ expression: 'f/2*Pe/Sc^(2/3)' })],
      bounds: [...bounds, { on: 'Pe', basis: 'none', stretches: [] }],
    }),
  );
  expect(sheet.order.indexOf('Pe')).toBeGreaterThan(sheet.order.indexOf('Sc'));
});

describe('symbols', () => {
  test.each<[string, Partial<CorrelationDefinition>, string, string]>([
    [
      'one symbol for two quantities',
      { quantities: [...quantities, { symbol: 'u', is: 'free-stream-velocity', unit: 'm/s' }] },
      'quantities[8].symbol',
      'u is defined before, at quantities[0].symbol.',
    ],
    [
      'one symbol for a quantity and a group',
      { groups: [...groups, { symbol: 'd', name: 'Twice', expression: 'Re' }] },
      'groups[2].symbol',
      'd is defined before, at quantities[1].symbol.',
    ],
    [
      'one symbol for a group and a result',
      { parts: [partWith({ symbol: 'Re' })] },
      'parts[0].result.symbol',
      'Re is defined before, at groups[0].symbol.',
    ],
    [
      'g',
      { quantities: quantitiesWith('u', { symbol: 'g' }) },
      'quantities[0].symbol',
      'g is reserved for a constant.',
    ],
    [
      'R',
      { groups: [...groups, { symbol: 'R', name: 'R', expression: 'Re' }] },
      'groups[2].symbol',
      'R is reserved for a constant.',
    ],
    [
      'pi',
      { quantities: quantitiesWith('u', { symbol: 'pi' }) },
      'quantities[0].symbol',
      'pi is reserved for a constant.',
    ],
    [
      'a function',
      { quantities: quantitiesWith('u', { symbol: 'exp' }) },
      'quantities[0].symbol',
      'exp is the name of a function.',
    ],
    [
      'a name that the dictionary lacks',
      { quantities: quantitiesWith('u', { is: 'velocity-of-dreams' }) },
      'quantities[0].is',
      '"velocity-of-dreams" is not in the quantity dictionary.',
    ],
    [
      'an inherited name for one of the dictionary',
      { quantities: quantitiesWith('u', { is: 'constructor' }) },
      'quantities[0].is',
      '"constructor" is not in the quantity dictionary.',
    ],
    [
      'a unit of another dimension',
      { quantities: quantitiesWith('d', { unit: 'm^2' }) },
      'quantities[1].unit',
      'd in m^2 is m^2; tube-inside-diameter is m.',
    ],
    [
      'a unit that nobody knows',
      { quantities: quantitiesWith('d', { unit: 'smoot' }) },
      'quantities[1].unit',
      '"smoot" is not a unit we know.',
    ],
    [
      'a unit that nobody knows, of a result',
      { parts: [partWith({ unit: 'smoot' })] },
      'parts[0].result.unit',
      '"smoot" is not a unit we know.',
    ],
    [
      'revolutions in radians',
      { quantities: [...quantities, { symbol: 'N', is: 'impeller-speed', unit: 'rpm' }] },
      'quantities[8].unit',
      'N in rpm and impeller-speed in 1/s differ: one is an angular speed, the other is none.',
    ],
  ])('%s is refused', (_what, changes, field, message) => {
    expect(definitionProblems(changes)).toContainEqual(expect.objectContaining({ field, message }));
  });
});

describe('expressions', () => {
  test('an unknown symbol is told with its place', () => {
    expect(
      definitionProblems({
        groups: [{ symbol: 'Re', name: 'Re', expression: 'rho*w*d/mu' }, ...groups.slice(1)],
      }),
    ).toEqual([
      { code: 'expression', field: 'groups[0].expression', message: 'There is no symbol w at character 5.' },
    ]);
  });

  test('a text that is no expression is told with place and reason', () => {
    expect(definitionProblems({ parts: [partWith({ expression: '0.023*Re^0.83*Sc.x' })] })).toEqual([
      {
        code: 'expression',
        field: 'parts[0].result.expression',
        message: 'Not accepted at character 17: member access with a dot is refused.',
      },
    ]);
  });

  test('definitions that go in a circle are named with all members, once', () => {
    expect(
      definitionProblems({
        groups: [
          { symbol: 'Re', name: 'Re', expression: 'Pe/Sc' },
          { symbol: 'Sc', name: 'Sc', expression: 'mu/(rho*D)' },
          { symbol: 'Pe', name: 'Pe', expression: 'Re*Sc' },
        ],
      }),
    ).toEqual([
      expect.objectContaining({
        code: 'definition',
        message: 'The definitions go in a circle: Re → Pe → Re.',
      }),
    ]);
  });

  test('a symbol defined by itself is a circle', () => {
    expect(definitionProblems({ parts: [partWith({ expression: 'Sh + Re*Sc' })] })).toEqual([
      {
        code: 'definition',
        field: 'parts[0].result.expression',
        message: 'The definitions go in a circle: Sh → Sh.',
      },
    ]);
  });

  test('a condition is part of the circle', () => {
    const pieces: Piece[] = [
      { when: [{ on: 'Sh', hi: 10 }], expression: 'Re' },
      { when: [{ on: 'Sh', lo: 10 }], expression: 'Re*Sc' },
    ];
    expect(definitionProblems({ parts: [partWith({ expression: undefined, pieces })] })).toEqual([
      expect.objectContaining({ message: 'The definitions go in a circle: Sh → Sh.' }),
    ]);
  });

  test('a line has an expression or pieces of one', () => {
    const pieces: Piece[] = [
      { when: [{ on: 'Re', hi: 10 }], expression: '2*Re*Sc' },
      { when: [{ on: 'Re', lo: 10 }], expression: 'Re*Sc' },
    ];
    const message = 'There is one expression, or pieces of one.';
    expect(definitionProblems({ parts: [partWith({ pieces })] })).toEqual([
      { code: 'definition', field: 'parts[0].result', message },
    ]);
    expect(definitionProblems({ parts: [partWith({ expression: undefined })] })).toEqual([
      { code: 'definition', field: 'parts[0].result', message },
    ]);
  });
});

describe('dimensions', () => {
  test('a group that is not dimensionless is told with what is left over', () => {
    expect(
      definitionProblems({
        groups: [{ symbol: 'Re', name: 'Re', expression: 'rho*u/mu' }, ...groups.slice(1)],
      }),
    ).toEqual([
      {
        code: 'dimension',
        field: 'groups[0].expression',
        message: 'Re is not dimensionless: 1/m is left over.',
      },
    ]);
  });

  test('a coefficient with another unit than it claims', () => {
    expect(definitionProblems({ parts: [coefficient({ expression: 'Sh*D' })] })).toEqual([
      {
        code: 'dimension',
        field: 'parts[0].coefficient.expression',
        message: 'k_g should be in m/s but comes out in m^2/s: m is left over.',
      },
    ]);
    expect(definitionProblems({ parts: [coefficient({ unit: 'mol/(m^2 s)' })] })).toEqual([
      expect.objectContaining({ code: 'dimension', field: 'parts[0].coefficient.expression' }),
    ]);
  });

  test('another unit of the same dimension is no fault', () => {
    expect(definitionProblems({ parts: [coefficient({ unit: 'cm/h' })] })).toEqual([]);
  });

  test('an exponent with a dimension', () => {
    expect(definitionProblems({ parts: [partWith({ expression: 'Re^d*Sc' })] })).toEqual([
      {
        code: 'dimension',
        field: 'parts[0].result.expression',
        message: 'Sh does not close: an exponent has the dimension m.',
      },
    ]);
  });

  test('every piece is proved', () => {
    const pieces: Piece[] = [
      { when: [{ on: 'Re', hi: 5000 }], expression: '2*Re*Sc' },
      { when: [{ on: 'Re', lo: 5000 }], expression: 'Re*Sc*u' },
    ];
    expect(definitionProblems({ parts: [partWith({ expression: undefined, pieces })] })).toEqual([
      {
        code: 'dimension',
        field: 'parts[0].result.pieces[1].expression',
        message: 'Sh is not dimensionless: m/s is left over.',
      },
    ]);
  });

  test('a dimensional formula is taken at its word, its neighbours are not', () => {
    const dimensional = partWith({ expression: '3*u^0.8/d', dimensional: true });
    expect(definitionProblems({ parts: [dimensional] })).toEqual([]);
    expect(
      definitionProblems({
        parts: [{ ...dimensional, coefficient: coefficient({ expression: 'Sh*D' }).coefficient }],
      }),
    ).toEqual([expect.objectContaining({ code: 'dimension', field: 'parts[0].coefficient.expression' })]);
  });
});

describe('tables', () => {
  const table = {
    name: 'packing',
    title: 'Packing',
    rows: [{ key: 'ring', label: 'Ring', values: { d: 0.025 } }],
  };
  const filled = quantitiesWith('d', { table: 'packing' });

  test('a row that fills a quantity is sound', () => {
    expect(definitionProblems({ quantities: filled, tables: [table] })).toEqual([]);
  });

  test.each<[string, Partial<CorrelationDefinition>, string, string]>([
    [
      'two tables of a name',
      { quantities: filled, tables: [table, table] },
      'tables[1].name',
      'There are two tables "packing".',
    ],
    [
      'two rows of a key',
      { quantities: filled, tables: [{ ...table, rows: [...table.rows, ...table.rows] }] },
      'tables[0].rows[1].key',
      'There are two rows "ring".',
    ],
    [
      'a value for what the table does not fill',
      {
        quantities: filled,
        tables: [{ ...table, rows: [{ key: 'ring', label: 'Ring', values: { u: 3 } }] }],
      },
      'tables[0].rows[0].values.u',
      'No quantity u is filled by table packing.',
    ],
    [
      'a value for an inherited name',
      {
        quantities: filled,
        tables: [
          {
            ...table,
            rows: [{ key: 'ring', label: 'Ring', values: { constructor: 3 } }],
          },
        ],
      },
      'tables[0].rows[0].values.constructor',
      'No quantity constructor is filled by table packing.',
    ],
    [
      'a table that is not there',
      { quantities: filled },
      'quantities[1].table',
      'There is no table "packing".',
    ],
  ])('%s is refused', (_what, changes, field, message) => {
    expect(definitionProblems(changes)).toContainEqual({ code: 'definition', field, message });
  });
});

describe('parts and checks', () => {
  test('two parts of a key', () => {
    const other: Part = { ...partWith({ symbol: 'Sh_2' }), coefficient: null };
    expect(definitionProblems({ parts: [GAS_PART, other] })).toEqual([
      { code: 'definition', field: 'parts[1].key', message: 'There are two parts "gas-side".' },
    ]);
  });

  const [check] = aSheet().checks;
  test.each([
    [
      'a published one without a source',
      { kind: 'published' as const },
      'checks[0].source',
      'A published check names its source.',
    ],
    [
      'an input that is not there',
      { inputs: { w: { value: 1 } } },
      'checks[0].inputs.w',
      'There is no quantity or group w.',
    ],
    [
      'a result as input',
      { inputs: { Sh: { value: 1 } } },
      'checks[0].inputs.Sh',
      'There is no quantity or group Sh.',
    ],
    [
      'an expected symbol that is not there',
      { expected: { w: { value: 1 } } },
      'checks[0].expected.w',
      'There is no symbol w.',
    ],
    ['nothing expected', { expected: {} }, 'checks[0].expected', 'A check expects something.'],
    [
      'an expected value in another dimension',
      { expected: { k_g: { value: 1, unit: 'mm' } } },
      'checks[0].expected.k_g',
      'k_g is in m/s; "mm" does not fit.',
    ],
    [
      'an expected value in no unit',
      { expected: { k_g: { value: 1, unit: 'smoot' } } },
      'checks[0].expected.k_g',
      '"smoot" is not a unit we know.',
    ],
  ])('%s is refused', (_what, change, field, message) => {
    if (!check) throw new Error('the sheet for tests has no check');
    expect(definitionProblems({ checks: [{ ...check, ...change }] })).toEqual([
      expect.objectContaining({ field, message }),
    ]);
  });
});

test('a symbol nobody may use twice does not hide other faults', () => {
  const found = definitionProblems({ quantities: without('rho'), bounds: [] }).map(({ field }) => field);
  expect(found).toEqual(expect.arrayContaining(['groups[0].expression', 'groups[1].expression']));
});
