import { expect, test } from 'vitest';
import { actWords } from './act-words';
import { subjectOf } from './subject-of';

test.each([
  [
    'revision.approved',
    'correlations/onda/revisions/2',
    { words: 'onda, rev 2', to: '/register/onda/revisions/2' },
  ],
  ['property-equation.drafted', 'property-equations/kell', { words: 'kell', to: '/property-equations/kell' }],
  ['person.added', 'people/25e4', { words: 'people/25e4', to: null }],
  ['session.started', 'people/25e4', null],
  ['office.founded', 'office', null],
  ['x', '', null],
])('%s on %s', (act, subject, shown) => {
  expect(subjectOf({ act: act as 'session.started', subject })).toEqual(shown);
});

test('an act without words is shown by its code', () => {
  expect(actWords('revision.approved')).toBe('approved a revision');
  expect(actWords('batch.run-out')).toBe('batch: run out');
});
