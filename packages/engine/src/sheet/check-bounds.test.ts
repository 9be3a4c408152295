import { describe, expect, test } from 'vitest';
import { aSheet, definitionProblems, GAS_PART, partWith } from '../testing/a-sheet.js';
import type { Bound, Piece } from './common-schema.js';
import type { CorrelationDefinition } from './definition.js';

const { bounds } = aSheet();

describe('bounds', () => {
  const lo = (value: number) => ({ value, nature: 'data' as const });
  const faults = (bound: Bound) => definitionProblems({ bounds: [...bounds, bound] });

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
    expect(definitionProblems({ bounds: bounds.slice(0, 1) })).toEqual([
      {
        code: 'definition',
        field: 'bounds',
        message: 'Sc has no bound; where none is on record say so with the basis "none".',
      },
    ]);
    expect(
      definitionProblems({ bounds: [...bounds.slice(0, 1), { on: 'Sc', basis: 'none', stretches: [] }] }),
    ).toEqual([]);
  });
});

describe('a group that the result stands on', () => {
  const f = { symbol: 'f', name: 'Friction factor', unit: '1' };
  const onlySc = bounds.filter(({ on }) => on === 'Sc');

  test.each<[string, Partial<CorrelationDefinition>]>([
    [
      'through an intermediate',
      { intermediates: [{ ...f, expression: '0.079*Re^-0.25' }], parts: [partWith({ expression: 'f*Sc' })] },
    ],
    [
      'through a condition',
      {
        parts: [
          partWith({
            expression: undefined,
            pieces: [
              { when: [{ on: 'Re', hi: 5000 }], expression: 'Sc' },
              { when: [{ on: 'Re', lo: 5000 }], expression: '2*Sc' },
            ],
          }),
        ],
      },
    ],
    [
      'through the coefficient',
      {
        parts: [
          {
            ...partWith({ expression: '0.023*Sc^0.44' }),
            coefficient: GAS_PART.coefficient
              ? { ...GAS_PART.coefficient, expression: 'Sh*D/d*Re^0.8' }
              : null,
          },
        ],
      },
    ],
  ])('%s needs a bound too', (_how, changes) => {
    expect(definitionProblems({ ...changes, bounds: onlySc })).toEqual([
      {
        code: 'definition',
        field: 'bounds',
        message: 'Re has no bound; where none is on record say so with the basis "none".',
      },
    ]);
    expect(definitionProblems(changes)).toEqual([]);
  });

  test('as part of a bounded group, or of no result at all, it needs none', () => {
    const Pe = { symbol: 'Pe', name: 'Péclet number', expression: 'Re*Sc' };
    const parts = [partWith({ expression: '0.02*Pe^0.8' })];
    const groups = [...aSheet().groups, Pe];
    expect(
      definitionProblems({ groups, parts, bounds: [{ on: 'Pe', basis: 'none', stretches: [] }] }),
    ).toEqual([]);
    expect(definitionProblems({ groups })).toEqual([]);
  });
});

describe('pieces', () => {
  const pieces = (...whens: Piece['when'][]) => ({
    parts: [
      partWith({ expression: undefined, pieces: whens.map((when) => ({ when, expression: 'Re*Sc' })) }),
    ],
  });

  test('neighbours meet without overlap: closed below and open above by default', () => {
    expect(definitionProblems(pieces([{ on: 'Re', hi: 5000 }], [{ on: 'Re', lo: 5000 }]))).toEqual([]);
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
    expect(definitionProblems(changes)).toContainEqual({ code: 'definition', field, message });
  });

  test('one symbol that keeps two pieces apart is enough', () => {
    expect(
      definitionProblems(
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
