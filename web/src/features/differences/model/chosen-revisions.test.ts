import { expect, test } from 'vitest';
import { chosenRevisions } from './chosen-revisions';

test.each([
  ['', [1, 2, 3], { from: 2, to: 3 }],
  ['from=1&to=3', [1, 2, 3], { from: 1, to: 3 }],
  ['from=3&to=1', [1, 2, 3], { from: 3, to: 1 }],
  ['to=1', [1, 2], { from: 1, to: 1 }],
  ['from=9&to=abc', [1, 2], { from: 1, to: 2 }],
  ['from=1&to=2', [1], null],
  ['', [], null],
])('of the address %j and revisions %j', (query, numbers, chosen) => {
  expect(chosenRevisions(new URLSearchParams(query), numbers)).toEqual(chosen);
});
