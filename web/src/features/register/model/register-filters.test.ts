import { describe, expect, test } from 'vitest';
import { NO_FILTERS, isFiltered, readFilters, registerQuery, writeFilters } from './register-filters';
import { boundOfRow } from './strip-of-row';
import { titleBesideAuthors } from './title-beside-authors';

describe('filters in the address bar', () => {
  test('are read and written back the same', () => {
    const search = new URLSearchParams('q=sieder+tate&geometry=pipe&phase=liquid&standing=in+review');
    const filters = readFilters(search);
    expect(filters).toEqual({ q: 'sieder tate', geometry: 'pipe', phase: 'liquid', standing: 'in review' });
    expect(readFilters(writeFilters(filters))).toEqual(filters);
  });

  test('leave a clean address when nothing narrows', () => {
    expect(writeFilters({ ...NO_FILTERS, q: '  ' }).toString()).toBe('');
    expect(isFiltered({ ...NO_FILTERS, q: ' ' })).toBe(false);
  });

  test.each([
    ['phase=plasma', NO_FILTERS],
    ['standing=best', NO_FILTERS],
    ['geometry=..%2Fsecrets', NO_FILTERS],
    ['geometry=%3Cb%3E', NO_FILTERS],
  ])('%s counts as none', (search, filters) => {
    expect(readFilters(new URLSearchParams(search))).toEqual(filters);
  });

  test('cut a very long search', () => {
    expect(readFilters(new URLSearchParams({ q: 'x'.repeat(5000) })).q).toHaveLength(200);
  });
});

test('the server is asked only for what narrows', () => {
  expect(registerQuery({ ...NO_FILTERS, q: ' pipe ' }, null, 25)).toEqual({ q: 'pipe', limit: 25 });
  expect(registerQuery({ ...NO_FILTERS, phase: 'gas' }, 'abc', 25)).toEqual({
    phase: 'gas',
    cursor: 'abc',
    limit: 25,
  });
});

describe('what a row shows', () => {
  const bound = (symbol: string, stated = true) => ({
    symbol,
    name: symbol,
    unit: '1',
    basis: 'stated' as const,
    stretches: stated ? [{ hi: { value: 10, nature: 'data' as const } }] : [],
  });

  test.each([
    [['Sc', 'Re'], 'Re'],
    [['Re_L', 'Re_G'], 'Re_L'],
    [['Re_m'], 'Re_m'],
  ])('of bounds on %s the strip of %s', (symbols, shown) => {
    const row = boundOfRow({ bounds: symbols.map((symbol) => bound(symbol)) });
    expect(row.kind === 'strip' && row.bound.symbol).toBe(shown);
  });

  test('a stated Reynolds number before one without a bound', () => {
    const row = boundOfRow({ bounds: [bound('Re_L', false), bound('Re_G')] });
    expect(row.kind === 'strip' && row.bound.symbol).toBe('Re_G');
  });

  test('without a Reynolds number the symbols that are bounded', () => {
    expect(boundOfRow({ bounds: [bound('Ra'), bound('Sc', false), bound('Rel')] })).toEqual({
      kind: 'others',
      symbols: ['Ra', 'Rel'],
    });
  });
});

test.each([
  ['Packed bed, gases (Gupta and Thodos)', ['Gupta', 'Thodos'], 'Packed bed, gases'],
  ['Helical coil (by analogy)', ['Schmidt'], 'Helical coil (by analogy)'],
  ['(Levich)', ['Levich'], '(Levich)'],
])('beside its authors "%s" is short', (title, authors, short) => {
  expect(titleBesideAuthors({ title, authors })).toBe(short);
});
