import { describe, expect, test } from 'vitest';
import type { Problem } from '../evaluation/outcome.js';
import {
  aSheet,
  compiled,
  compiledEquation,
  GAS_PART,
  idealDensity,
  straightViscosity,
} from '../testing/a-sheet.js';
import type { Bound, Piece, Quantity } from './common-schema.js';
import { compileCorrelation, compilePropertyEquation } from './compile-sheet.js';
import type { CorrelationDefinition, Part, PropertyEquationDefinition } from './definition.js';

function problemsOf(changes: Partial<CorrelationDefinition>): Problem[] {
  const result = compileCorrelation(aSheet(changes));
  return result.ok ? [] : result.problems;
}

function equationProblems(changes: Partial<PropertyEquationDefinition>): Problem[] {
  const result = compilePropertyEquation('test', idealDensity(changes));
  return result.ok ? [] : result.problems;
}

const { quantities, groups, bounds } = aSheet();
const without = (symbol: string): Quantity[] => quantities.filter((q) => q.symbol !== symbol);
const replaced = (symbol: string, change: Partial<Quantity>): Quantity[] =>
  quantities.map((q) => (q.symbol === symbol ? { ...q, ...change } : q));
const part = (result: Partial<Part['result']>): Part => ({
  ...GAS_PART,
  result: { ...GAS_PART.result, ...result },
});
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
      parts: [part({ expression: 'f/2*Pe/Sc^(2/3)' })],
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
      { parts: [part({ symbol: 'Re' })] },
      'parts[0].result.symbol',
      'Re is defined before, at groups[0].symbol.',
    ],
    [
      'g',
      { quantities: replaced('u', { symbol: 'g' }) },
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
      { quantities: replaced('u', { symbol: 'pi' }) },
      'quantities[0].symbol',
      'pi is reserved for a constant.',
    ],
    [
      'a function',
      { quantities: replaced('u', { symbol: 'exp' }) },
      'quantities[0].symbol',
      'exp is the name of a function.',
    ],
    [
      'a name that the dictionary lacks',
      { quantities: replaced('u', { is: 'velocity-of-dreams' }) },
      'quantities[0].is',
      '"velocity-of-dreams" is not in the quantity dictionary.',
    ],
    [
      'an inherited name for one of the dictionary',
      { quantities: replaced('u', { is: 'constructor' }) },
      'quantities[0].is',
      '"constructor" is not in the quantity dictionary.',
    ],
    [
      'a unit of another dimension',
      { quantities: replaced('d', { unit: 'm^2' }) },
      'quantities[1].unit',
      'd in m^2 is m^2; tube-inside-diameter is m.',
    ],
    [
      'a unit that nobody knows',
      { quantities: replaced('d', { unit: 'smoot' }) },
      'quantities[1].unit',
      '"smoot" is not a unit we know.',
    ],
    [
      'a unit that nobody knows, of a result',
      { parts: [part({ unit: 'smoot' })] },
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
    expect(problemsOf(changes)).toContainEqual(expect.objectContaining({ field, message }));
  });
});

describe('expressions', () => {
  test('an unknown symbol is told with its place', () => {
    expect(
      problemsOf({ groups: [{ symbol: 'Re', name: 'Re', expression: 'rho*w*d/mu' }, ...groups.slice(1)] }),
    ).toEqual([
      { code: 'expression', field: 'groups[0].expression', message: 'There is no symbol w at character 5.' },
    ]);
  });

  test('a text that is no expression is told with place and reason', () => {
    expect(problemsOf({ parts: [part({ expression: '0.023*Re^0.83*Sc.x' })] })).toEqual([
      {
        code: 'expression',
        field: 'parts[0].result.expression',
        message: 'Not accepted at character 17: member access with a dot is refused.',
      },
    ]);
  });

  test('definitions that go in a circle are named with all members, once', () => {
    expect(
      problemsOf({
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
    expect(problemsOf({ parts: [part({ expression: 'Sh + Re*Sc' })] })).toEqual([
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
    expect(problemsOf({ parts: [part({ expression: undefined, pieces })] })).toEqual([
      expect.objectContaining({ message: 'The definitions go in a circle: Sh → Sh.' }),
    ]);
  });

  test('a line has an expression or pieces of one', () => {
    const pieces: Piece[] = [
      { when: [{ on: 'Re', hi: 10 }], expression: '2*Re*Sc' },
      { when: [{ on: 'Re', lo: 10 }], expression: 'Re*Sc' },
    ];
    const message = 'There is one expression, or pieces of one.';
    expect(problemsOf({ parts: [part({ pieces })] })).toEqual([
      { code: 'definition', field: 'parts[0].result', message },
    ]);
    expect(problemsOf({ parts: [part({ expression: undefined })] })).toEqual([
      { code: 'definition', field: 'parts[0].result', message },
    ]);
  });
});

describe('dimensions', () => {
  test('a group that is not dimensionless is told with what is left over', () => {
    expect(
      problemsOf({ groups: [{ symbol: 'Re', name: 'Re', expression: 'rho*u/mu' }, ...groups.slice(1)] }),
    ).toEqual([
      {
        code: 'dimension',
        field: 'groups[0].expression',
        message: 'Re is not dimensionless: 1/m is left over.',
      },
    ]);
  });

  test('a coefficient with another unit than it claims', () => {
    expect(problemsOf({ parts: [coefficient({ expression: 'Sh*D' })] })).toEqual([
      {
        code: 'dimension',
        field: 'parts[0].coefficient.expression',
        message: 'k_g should be in m/s but comes out in m^2/s: m is left over.',
      },
    ]);
    expect(problemsOf({ parts: [coefficient({ unit: 'mol/(m^2 s)' })] })).toEqual([
      expect.objectContaining({ code: 'dimension', field: 'parts[0].coefficient.expression' }),
    ]);
  });

  test('another unit of the same dimension is no fault', () => {
    expect(problemsOf({ parts: [coefficient({ unit: 'cm/h' })] })).toEqual([]);
  });

  test('an exponent with a dimension', () => {
    expect(problemsOf({ parts: [part({ expression: 'Re^d*Sc' })] })).toEqual([
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
    expect(problemsOf({ parts: [part({ expression: undefined, pieces })] })).toEqual([
      {
        code: 'dimension',
        field: 'parts[0].result.pieces[1].expression',
        message: 'Sh is not dimensionless: m/s is left over.',
      },
    ]);
  });

  test('a dimensional formula is taken at its word, its neighbours are not', () => {
    const dimensional = part({ expression: '3*u^0.8/d', dimensional: true });
    expect(problemsOf({ parts: [dimensional] })).toEqual([]);
    expect(
      problemsOf({
        parts: [{ ...dimensional, coefficient: coefficient({ expression: 'Sh*D' }).coefficient }],
      }),
    ).toEqual([expect.objectContaining({ code: 'dimension', field: 'parts[0].coefficient.expression' })]);
  });
});

describe('bounds', () => {
  const lo = (value: number) => ({ value, nature: 'data' as const });
  const faults = (bound: Bound) => problemsOf({ bounds: [...bounds, bound] });

  test.each<[string, Bound, string, string]>([
    [
      'on a symbol that is not there',
      { on: 'We', basis: 'none', stretches: [] },
      'bounds[2].on',
      'There is no symbol We.',
    ],
    [
      'a second one on a symbol',
      { on: 'Re', basis: 'none', stretches: [] },
      'bounds[2].on',
      'Re has two bounds; use stretches.',
    ],
    [
      'basis none with stretches',
      { on: 'd', basis: 'none', stretches: [{ lo: lo(1) }] },
      'bounds[2].basis',
      'A bound of basis "none" has no stretches.',
    ],
    [
      'a basis without stretches',
      { on: 'd', basis: 'stated', stretches: [] },
      'bounds[2].stretches',
      'A bound has a stretch at least, or the basis "none".',
    ],
    [
      'an empty stretch',
      { on: 'd', basis: 'stated', stretches: [{}] },
      'bounds[2].stretches[0]',
      'A stretch has one limit at least.',
    ],
    [
      'limits the wrong way round',
      { on: 'd', basis: 'stated', stretches: [{ lo: lo(2), hi: lo(1) }] },
      'bounds[2].stretches[0]',
      'The lower limit 2 is not below the upper limit 1.',
    ],
    [
      'a reach on a limit of regime',
      { on: 'd', basis: 'stated', stretches: [{ lo: { value: 1, nature: 'regime', reach: 2 } }] },
      'bounds[2].stretches[0].lo.reach',
      'Only a bound of data has a reach.',
    ],
    [
      'overlapping stretches',
      {
        on: 'd',
        basis: 'stated',
        stretches: [
          { lo: lo(1), hi: lo(3) },
          { lo: lo(2), hi: lo(4) },
        ],
      },
      'bounds[2].stretches[0]',
      'Stretches ascend and share no value.',
    ],
    [
      'stretches in falling order',
      {
        on: 'd',
        basis: 'stated',
        stretches: [
          { lo: lo(3), hi: lo(4) },
          { lo: lo(1), hi: lo(2) },
        ],
      },
      'bounds[2].stretches[0]',
      'Stretches ascend and share no value.',
    ],
    [
      'stretches that meet in a closed limit',
      {
        on: 'd',
        basis: 'stated',
        stretches: [
          { lo: lo(1), hi: lo(2) },
          { lo: lo(2), hi: lo(4) },
        ],
      },
      'bounds[2].stretches[0]',
      'Stretches ascend and share no value.',
    ],
    [
      'a stretch behind one without an end',
      { on: 'd', basis: 'stated', stretches: [{ lo: lo(1) }, { lo: lo(2), hi: lo(4) }] },
      'bounds[2].stretches[0]',
      'Stretches ascend and share no value.',
    ],
  ])('%s is refused', (_what, bound, field, message) => {
    expect(faults(bound)).toEqual([{ code: 'definition', field, message }]);
  });

  test('stretches that meet in an open limit are two', () => {
    const open = { value: 2, nature: 'data' as const, closed: false };
    expect(
      faults({
        on: 'd',
        basis: 'stated',
        stretches: [
          { lo: lo(1), hi: open },
          { lo: lo(2), hi: lo(4) },
        ],
      }),
    ).toEqual([]);
  });

  test('a group that the result stands on has a bound, if only to say that there is none', () => {
    expect(problemsOf({ bounds: bounds.slice(0, 1) })).toEqual([
      {
        code: 'definition',
        field: 'bounds',
        message: 'Sc has no bound; where none is on record say so with the basis "none".',
      },
    ]);
    expect(
      problemsOf({ bounds: [...bounds.slice(0, 1), { on: 'Sc', basis: 'none', stretches: [] }] }),
    ).toEqual([]);
  });
});

describe('pieces', () => {
  const pieces = (...whens: Piece['when'][]) => ({
    parts: [part({ expression: undefined, pieces: whens.map((when) => ({ when, expression: 'Re*Sc' })) })],
  });

  test('neighbours meet without overlap: closed below and open above by default', () => {
    expect(problemsOf(pieces([{ on: 'Re', hi: 5000 }], [{ on: 'Re', lo: 5000 }]))).toEqual([]);
  });

  test.each<[string, Partial<CorrelationDefinition>, string, string]>([
    [
      'a shared limit',
      pieces([{ on: 'Re', hi: 5000, hiClosed: true }], [{ on: 'Re', lo: 5000 }]),
      'parts[0].result.pieces[1].when',
      'Pieces 1 and 2 overlap.',
    ],
    [
      'an overlap',
      pieces([{ on: 'Re', hi: 5000 }], [{ on: 'Re', lo: 4000 }]),
      'parts[0].result.pieces[1].when',
      'Pieces 1 and 2 overlap.',
    ],
    [
      'conditions on different symbols',
      pieces([{ on: 'Re', hi: 5000 }], [{ on: 'Sc', lo: 1 }]),
      'parts[0].result.pieces[1].when',
      'Pieces 1 and 2 overlap.',
    ],
    [
      'an overlap of the first with the third',
      pieces([{ on: 'Re', hi: 5000 }], [{ on: 'Re', lo: 5000 }], [{ on: 'Re', lo: 0, hi: 10 }]),
      'parts[0].result.pieces[2].when',
      'Pieces 1 and 3 overlap.',
    ],
    [
      'an unknown symbol',
      pieces([{ on: 'We', hi: 5000 }], [{ on: 'We', lo: 5000 }]),
      'parts[0].result.pieces[0].when[0].on',
      'There is no symbol We.',
    ],
    [
      'a condition without limits',
      pieces([{ on: 'Re' }], [{ on: 'Re', lo: 5000 }]),
      'parts[0].result.pieces[0].when[0]',
      'A condition has one limit at least.',
    ],
    [
      'limits the wrong way round',
      pieces([{ on: 'Re', lo: 2, hi: 1 }], [{ on: 'Re', lo: 5000 }]),
      'parts[0].result.pieces[0].when[0]',
      'The lower limit 2 is above the upper limit 1.',
    ],
  ])('%s is refused', (_what, changes, field, message) => {
    expect(problemsOf(changes)).toContainEqual({ code: 'definition', field, message });
  });

  test('one symbol that keeps two pieces apart is enough', () => {
    expect(
      problemsOf(
        pieces(
          [{ on: 'Re', hi: 5000 }],
          [
            { on: 'Re', lo: 5000 },
            { on: 'Sc', hi: 1 },
          ],
          [
            { on: 'Re', lo: 5000 },
            { on: 'Sc', lo: 1 },
          ],
        ),
      ),
    ).toEqual([]);
  });
});

describe('tables', () => {
  const table = {
    name: 'packing',
    title: 'Packing',
    rows: [{ key: 'ring', label: 'Ring', values: { d: 0.025 } }],
  };
  const filled = replaced('d', { table: 'packing' });

  test('a row that fills a quantity is sound', () => {
    expect(problemsOf({ quantities: filled, tables: [table] })).toEqual([]);
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
            rows: [{ key: 'ring', label: 'Ring', values: { constructor: 3 } as Record<string, number> }],
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
    expect(problemsOf(changes)).toContainEqual({ code: 'definition', field, message });
  });
});

describe('parts and checks', () => {
  test('two parts of a key', () => {
    const other: Part = { ...part({ symbol: 'Sh_2' }), coefficient: null };
    expect(problemsOf({ parts: [GAS_PART, other] })).toEqual([
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
    expect(problemsOf({ checks: [{ ...check, ...change }] })).toEqual([
      expect.objectContaining({ field, message }),
    ]);
  });
});

describe('property equations', () => {
  test('compile, and take their fields at the top of the definition', () => {
    expect(compiledEquation('ideal-density', idealDensity()).sheet.answers).toEqual(['value']);
    expect(compiledEquation('straight-viscosity', straightViscosity()).sheet.answers).toEqual(['value']);
  });

  test.each<[string, Partial<PropertyEquationDefinition>, string, string]>([
    ['an unknown unit', { unit: 'smoot' }, 'unit', '"smoot" is not a unit we know.'],
    [
      'a unit that does not come out',
      { expression: 'P/(R*T)' },
      'expression',
      'value should be in kg/m^3 but comes out in mol/m^3: mol/kg is left over.',
    ],
    [
      'a unit that the quantity cannot have',
      { gives: 'gas-viscosity' },
      'unit',
      'gas-viscosity is in Pa s; "kg/m^3" does not fit.',
    ],
    [
      'a quantity that is not in the dictionary',
      { gives: 'toString' },
      'gives',
      '"toString" is not in the quantity dictionary.',
    ],
    ['an unknown symbol', { expression: 'P*M/(R*x)' }, 'expression', 'There is no symbol x at character 8.'],
    [
      'an answer defined by itself',
      { expression: 'value' },
      'expression',
      'The definitions go in a circle: value → value.',
    ],
    [
      'pieces that overlap',
      {
        expression: undefined,
        pieces: [
          { when: [{ on: 'T', hi: 300 }], expression: 'P*M/(R*T)' },
          { when: [{ on: 'T', lo: 200 }], expression: 'P*M/(R*T)' },
        ],
      },
      'pieces[1].when',
      'Pieces 1 and 2 overlap.',
    ],
    [
      'a quantity with the name of the answer',
      { quantities: [...idealDensity().quantities, { symbol: 'value', is: 'gas-density', unit: 'kg/m^3' }] },
      'symbol',
      'value is defined before, at quantities[3].symbol.',
    ],
  ])('%s is refused', (_what, changes, field, message) => {
    expect(equationProblems(changes)).toContainEqual(expect.objectContaining({ field, message }));
  });
});

test('a symbol nobody may use twice does not hide other faults', () => {
  const found = problemsOf({ quantities: without('rho'), bounds: [] }).map(({ field }) => field);
  expect(found).toEqual(expect.arrayContaining(['groups[0].expression', 'groups[1].expression']));
});
