import { describe, expect, test } from 'vitest';
import { gillilandSherwood } from '../../../shared/samples/gilliland-sherwood';
import { boundsOfDraft } from './bounds-of-draft';
import { emptyBound } from './empty-rows';
import { draftFieldId, idsFor } from './field-id';
import { formOfDefinition } from './form-of-definition';
import { matching } from './matching';
import { placeWords } from './place-words';
import { saveStateOf, saveWords, type SaveFacts } from './save-words';
import { sectionOf } from './sections';
import { slugProblem, suggestSlug } from './suggest-slug';

describe('where the draft is kept, in words', () => {
  const facts: SaveFacts = {
    entered: true,
    toOpen: 3,
    unsaved: true,
    kept: true,
    conflict: false,
    saving: false,
    savedAt: null,
    held: false,
    whole: true,
    empty: [],
    wrong: [],
    failure: null,
  };
  const problem = { field: 'title', code: 'x', message: '' };
  const words = (changes: Partial<SaveFacts>) => saveWords(saveStateOf({ ...facts, ...changes }));

  test.each<[Partial<SaveFacts>, string]>([
    [{}, 'Kept in this browser; saved to the register in a moment'],
    [{ unsaved: false }, 'As it is in the register'],
    [{ saving: true }, 'Saving …'],
    [{ entered: false, toOpen: null }, 'Kept in this browser only: it is not entered in the register yet'],
    [{ entered: false }, 'Kept in this browser only: revision 3 is not opened yet'],
    [{ empty: [problem], whole: false }, 'Kept in this browser only: 1 place still to be filled in'],
    [
      { wrong: [problem, problem], whole: false },
      'Kept in this browser only: 2 places to be put right before the register can take it',
    ],
    [{ held: true }, 'Kept in this browser only: the revision is in review'],
    [
      { failure: { status: 0, title: 'The server cannot be reached', detail: 'Check the connection.' } },
      'Kept in this browser only: the server cannot be reached; it is asked again',
    ],
    [
      { failure: { status: 409, title: 'Conflict', detail: 'Only a draft can be edited.' } },
      'Kept in this browser only: only a draft can be edited',
    ],
    [{ conflict: true }, 'Kept in this browser only: somebody else has changed the draft'],
    [
      { kept: false },
      'Not kept: this browser has no room for it. Copy what matters before you leave the page',
    ],
  ])('%o', (changes, expected) => expect(words(changes)).toBe(expected));

  test('a save says when', () => {
    const at = new Date(2026, 2, 4, 12, 3).toISOString();
    expect(words({ unsaved: false, savedAt: at })).toBe('Saved 12:03');
  });
});

describe('places', () => {
  const form = formOfDefinition(gillilandSherwood, 'sample');

  test.each([
    ['title', 'Title'],
    ['groups[1].expression', 'Group Sc, expression'],
    ['quantities[2].unit', 'Symbol p_BM, unit'],
    ['bounds[0].stretches[0].hi.value', 'Bound Re, stretch 1, upper limit, value'],
    ['parts[0].result.pieces[1].when[0].on', 'Part 1, result, piece 2, condition 1, symbol'],
    ['sources[0].csl.DOI', 'Source 1, citation, DOI'],
    ['checks', 'Checks'],
    ['verification.note', 'Verification, note'],
  ])('%s is called %s', (path, words) => expect(placeWords(path, form)).toBe(words));

  test('a path leads to its control, else to its row', () => {
    expect(draftFieldId('groups[0].expression')).toBe('draft-groups-0-expression');
    expect(idsFor('parts[0].result.pieces[1]')).toEqual([
      'draft-parts-0-result-pieces-1',
      'draft-parts-0-result-pieces',
      'draft-parts-0-result',
      'draft-parts-0',
      'draft-parts',
    ]);
    expect(sectionOf('intermediates[0].symbol')).toBe('steps');
    expect(sectionOf('summary')).toBe('head');
  });
});

describe('names in the register', () => {
  test.each([
    ['Gilliland & Sherwood: wetted wall', 'gilliland-sherwood-wetted-wall'],
    ['Zylinder über Öl', 'zylinder-uber-ol'],
    ['—', ''],
  ])('%s', (title, slug) => expect(suggestSlug({ title })).toBe(slug));

  test('what cannot be one is told', () => {
    expect(slugProblem('pipe-laminar')).toBeNull();
    expect(slugProblem('')).toMatch(/^Give/);
    expect(slugProblem('Pipe_laminar')).toMatch(/small letters/);
    expect(slugProblem('a'.repeat(81))).toMatch(/80/);
  });
});

describe('searching a list', () => {
  const choices = [
    { value: 'a', label: 'Gas density', detail: 'ρ' },
    { value: 'b', label: 'Density difference' },
    { value: 'c', label: 'Eötvös number' },
  ];

  test('all words count, in any order and without accents; what begins so comes first', () => {
    expect(matching(choices, 'dens').map(({ value }) => value)).toEqual(['b', 'a']);
    expect(matching(choices, 'density gas').map(({ value }) => value)).toEqual(['a']);
    expect(matching(choices, 'eotvos').map(({ value }) => value)).toEqual(['c']);
    expect(matching(choices, 'tube')).toEqual([]);
    expect(matching(choices, '')).toHaveLength(3);
  });
});

describe('bounds to be drawn', () => {
  test('limits that can be read; half-typed and crossed ones are none yet', () => {
    const bound = { ...emptyBound(), on: 'Re' };
    const [stretch] = bound.stretches;
    const drawn = (lo: string, hi: string) =>
      boundsOfDraft({
        bounds: [
          {
            ...bound,
            stretches: [
              { ...stretch!, lo: { ...stretch!.lo, value: lo }, hi: { ...stretch!.hi, value: hi } },
            ],
          },
        ],
      })[0]?.stretches;
    expect(drawn('2 000', '35000')).toMatchObject([{ lo: { value: 2000 }, hi: { value: 35000 } }]);
    expect(drawn('2000', '1e')).toMatchObject([{ lo: { value: 2000 } }]);
    expect(drawn('5', '3')).toEqual([]);
    expect(drawn('', '')).toEqual([]);
    expect(
      boundsOfDraft({
        bounds: [
          { ...bound, basis: 'none' },
          { ...bound, on: ' ' },
        ],
      }),
    ).toEqual([{ on: 'Re', stretches: [] }]);
  });
});
