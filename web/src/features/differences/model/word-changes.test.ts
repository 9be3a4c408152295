import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { shareKept, wordChanges, type WordChange } from './word-changes';

const textOf = (changes: readonly WordChange[], kinds: readonly WordChange['kind'][]) =>
  changes
    .filter(({ kind }) => kinds.includes(kind))
    .map(({ text }) => text)
    .join('');

describe('the changed words of a text', () => {
  it('are the fewest', () => {
    expect(wordChanges('the mean over the wetted height', 'the mean over the whole wetted height')).toEqual([
      { kind: 'same', text: 'the mean over the ' },
      { kind: 'in', text: 'whole ' },
      { kind: 'same', text: 'wetted height' },
    ]);
    expect(wordChanges('in a smooth tube', 'in a rough tube')).toEqual([
      { kind: 'same', text: 'in a ' },
      { kind: 'out', text: 'smooth ' },
      { kind: 'in', text: 'rough ' },
      { kind: 'same', text: 'tube' },
    ]);
  });

  it('of an empty text are all of the other', () => {
    expect(wordChanges('', 'new')).toEqual([{ kind: 'in', text: 'new' }]);
    expect(wordChanges('old', '')).toEqual([{ kind: 'out', text: 'old' }]);
    expect(wordChanges('', '')).toEqual([]);
  });

  it('give both texts back to the letter, whatever they are', () => {
    const text = fc
      .array(fc.constantFrom('Re', 'the', ' ', '  ', '\n', 'film.', 'ß', '🪨'), { maxLength: 40 })
      .map((parts) => parts.join(''));
    fc.assert(
      fc.property(text, text, (before, after) => {
        const changes = wordChanges(before, after);
        expect(textOf(changes, ['same', 'out'])).toBe(before);
        expect(textOf(changes, ['same', 'in'])).toBe(after);
        expect(shareKept(changes)).toBeGreaterThanOrEqual(0);
        expect(shareKept(changes)).toBeLessThanOrEqual(1);
      }),
    );
  });

  it('of two long texts take no time to speak of', () => {
    const long = (seed: number) => Array.from({ length: 3000 }, (_, i) => `w${(i * seed) % 97}`).join(' ');
    const started = performance.now();
    wordChanges(long(3), long(7));
    expect(performance.now() - started).toBeLessThan(2000);
  });
});
