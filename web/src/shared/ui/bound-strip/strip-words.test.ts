import type { Stretch } from '@merestone/engine';
import { expect, test } from 'vitest';
import { rangeWords, stateWords, stripText, type Reading } from './strip-words';

const plain = (text: string) => text.replaceAll('\u00a0', ' ');
const stretch = (lo?: number, hi?: number, closed = true): Stretch => ({
  ...(lo === undefined ? {} : { lo: { value: lo, nature: 'data', closed } }),
  ...(hi === undefined ? {} : { hi: { value: hi, nature: 'data', closed } }),
});
const reading = (kind: Reading['kind'], value: number | null, ratio: number | null = null): Reading => ({
  kind,
  value,
  lo: 2000,
  hi: 35000,
  ratio,
});

test.each([
  [reading('within', 9000), 'in bounds'],
  [reading('near', 34500), 'near bound'],
  [reading('outside', 52300, 52300 / 35000), '1.49 × the upper bound'],
  [reading('outside', 1000, 2), '0.500 × the lower bound'],
  [reading('outside', 35100, 35100 / 35000), '1.003 × the upper bound'],
  [reading('past-reach', 105000, 3), '3.00 × the upper bound, past reach'],
  [reading('outside', 35000, 1), 'on the upper bound, which is left out'],
  [{ ...reading('outside', -3), lo: 0, hi: 60 }, 'below the lower bound'],
  [{ ...reading('outside', 70), lo: -20, hi: 60 }, 'above the upper bound'],
  [reading('between', 20000), 'between its stretches'],
  [reading('unchecked', 0.7), 'no bound to hold it'],
  [reading('unchecked', null), 'not held: no value'],
] as const)('says how a value stands: %o', (given, words) => {
  expect(plain(stateWords(given))).toBe(words);
});

test.each([
  [[stretch(2000, 35000)], '1', '2 000 to 35 000'],
  [[stretch(10, 300)], 'kPa', '10 kPa to 300 kPa'],
  [[stretch(0.6, 2.5), stretch(1000, 3000)], '1', '0.6 to 2.5, and 1 000 to 3 000'],
  [[stretch(undefined, 2100)], '1', 'up to 2 100, no lower bound stated'],
  [[stretch(4000)], '1', 'from 4 000, no upper bound stated'],
  [[stretch(10, 2500, false)], '1', 'above 10 to below 2 500'],
  [[], '1', 'no bound stated'],
])('says a range in words: %o', (stretches, unit, words) => {
  expect(plain(rangeWords(stretches, unit))).toBe(words);
});

test('the text alternative tells range, value and state', () => {
  const text = stripText(
    'Reynolds number, Re',
    [stretch(2000, 35000)],
    '1',
    reading('outside', 52300, 1.494),
  );
  expect(plain(text)).toBe('Reynolds number, Re: 2 000 to 35 000. Now 52 300, 1.49 × the upper bound.');
});
