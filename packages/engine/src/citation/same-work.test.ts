import { describe, expect, it } from 'vitest';
import type { CslItem } from '../sheet/common-schema.js';
import { findDuplicates } from './same-work.js';

const AKITA: CslItem = {
  type: 'article-journal',
  title: 'Gas Holdup and Volumetric Mass Transfer Coefficient in Bubble Columns',
  author: [
    { family: 'Akita', given: 'Kiyomi' },
    { family: 'Yoshida', given: 'Fumitake' },
  ],
  issued: { 'date-parts': [[1973]] },
  'container-title': 'Industrial & Engineering Chemistry Process Design and Development',
  volume: '12',
  page: '76-80',
};

/** Whether the two are found to be one work, and by what. */
const likeness = (a: CslItem, b: CslItem) => findDuplicates([a, b])[0]?.by;

describe('findDuplicates', () => {
  it.each<[string, Partial<CslItem>, 'doi' | 'place' | undefined]>([
    ['the same', {}, 'place'],
    ['another title', { title: 'Gas holdup' }, 'place'],
    ['the journal abbreviated', { 'container-title': 'Ind. Eng. Chem. Process Des. Dev.' }, 'place'],
    ['the author in capitals, alone', { author: [{ family: 'AKITA', given: 'K.' }] }, 'place'],
    ['a name in one piece', { author: [{ literal: 'Kiyomi Akita' }] }, 'place'],
    ['a name in one piece, turned', { author: [{ literal: 'Akita, Kiyomi' }] }, 'place'],
    ['a longer date', { issued: { 'date-parts': [['1973', 1]] } }, 'place'],
    ['the first page alone', { page: '76' }, 'place'],
    ['an en dash', { page: '76–80' }, 'place'],
    ['another year', { issued: { 'date-parts': [[1974]] } }, undefined],
    ['another first page', { page: '84-91' }, undefined],
    ['another journal', { 'container-title': 'AIChE Journal' }, undefined],
    ['another first author', { author: [{ family: 'Yoshida' }] }, undefined],
    ['no author', { author: [] }, undefined],
    ['no year', { issued: undefined }, undefined],
  ])('compares: %s', (_, change, expected) => {
    expect(likeness(AKITA, { ...AKITA, ...change })).toBe(expected);
  });

  it('goes by the DOI first, in whatever form and case', () => {
    const a: CslItem = { type: 'article-journal', DOI: '10.1021/i260045a015' };
    expect(likeness(a, { type: 'book', DOI: 'https://doi.org/10.1021/I260045A015' })).toBe('doi');
    expect(likeness(a, { type: 'book', DOI: '10.1021/i260045a016' })).toBeUndefined();
    expect(likeness({ type: 'book', DOI: 'none' }, { type: 'book', DOI: 'none' })).toBeUndefined();
  });

  it('goes by the title where there are no pages', () => {
    const book: CslItem = {
      type: 'book',
      title: 'Bubble Column Reactors',
      author: [{ family: 'Deckwer' }],
      issued: { 'date-parts': [[1992]] },
    };
    expect(likeness(book, { ...book, title: 'Bubble column reactors.', publisher: 'Wiley' })).toBe('place');
    expect(likeness(book, { ...book, title: 'Bubble columns' })).toBeUndefined();
    expect(likeness(book, { ...book, title: undefined })).toBeUndefined();
  });

  it('sets accents and ligatures of letters aside', () => {
    const krischer: CslItem = { ...AKITA, author: [{ family: 'Grøßmann-Müller' }] };
    expect(likeness(krischer, { ...AKITA, author: [{ family: 'Grossmann-Muller' }] })).toBe('place');
  });

  it('names every pair', () => {
    const other: CslItem = { ...AKITA, page: '1-9' };
    expect(findDuplicates([AKITA, other, AKITA, AKITA]).map(({ first, second }) => [first, second])).toEqual([
      [0, 2],
      [0, 3],
      [2, 3],
    ]);
  });

  it('stays quick on texts without end', () => {
    const long = {
      ...AKITA,
      title: 'x '.repeat(20_000),
      'container-title': 'y '.repeat(20_000),
      page: '1'.repeat(20_000),
    };
    const started = performance.now();
    findDuplicates(Array.from({ length: 50 }, () => long));
    expect(performance.now() - started).toBeLessThan(3000);
  });
});
