import { describe, expect, test } from 'vitest';
import { searchQuery } from './search-query.js';

describe('searchQuery', () => {
  test('quotes every word and lets it be begun', () => {
    expect(searchQuery('wetted  wall')).toBe('"wetted"* "wall"*');
  });

  test('makes operators into words', () => {
    expect(searchQuery('sphere OR NEAR(drop) title:*')).toBe('"sphere"* "OR"* "NEAR(drop"* "title"*');
  });

  test('doubles quotes inside a word', () => {
    expect(searchQuery('a"b')).toBe('"a""b"*');
  });

  test('keeps letters of other scripts', () => {
    expect(searchQuery('Benítez ρ')).toBe('"Benítez"* "ρ"*');
  });

  test.each(['', '   ', '"', '*', '-^:()', '""""'])('finds no word in %j', (text) => {
    expect(searchQuery(text)).toBeNull();
  });

  test('takes no more than sixteen words', () => {
    expect(searchQuery('a '.repeat(40))?.split(' ')).toHaveLength(16);
  });
});
