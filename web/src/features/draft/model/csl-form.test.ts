import { expect, test } from 'vitest';
import { citationFields, citationOf } from './csl-form';

// With members that the contract leaves open.
const ITEM = {
  type: 'article-journal',
  title: 'Diffusion of Vapors into Air Streams',
  author: [
    { family: 'Gilliland', given: 'E. R.' },
    { family: 'van der Berg', given: 'J.', suffix: 'Jr.' },
    { literal: 'Institute of Columns, Ltd.' },
    { family: 'Hausen' },
  ],
  issued: { 'date-parts': [['1934', 5]] },
  volume: 26,
  'container-title': 'Ind. Eng. Chem.',
  'number-of-pages': '8',
};

test('a citation comes back as it came, with members that the form does not show', () => {
  expect(citationOf(citationFields(ITEM))).toStrictEqual(ITEM);
});

test('an author that is edited is read anew, the others keep all they have', () => {
  const fields = citationFields(ITEM);
  expect(fields.authors.split('\n')).toEqual([
    'Gilliland, E. R.',
    'van der Berg, J.',
    '{Institute of Columns, Ltd.}',
    'Hausen',
  ]);
  const edited = citationOf({ ...fields, authors: `Sherwood, T. K.\n${fields.authors}\n\n` });
  expect(edited.author).toEqual([{ family: 'Sherwood', given: 'T. K.' }, ...ITEM.author]);
});

test('what is emptied goes, what is typed comes', () => {
  const { volume, ...rest } = citationOf({
    ...citationFields(ITEM),
    volume: ' ',
    issued: '1935',
    doi: '10.1021/ie50293a010',
  });
  expect(volume).toBeUndefined();
  expect(rest.issued).toEqual({ 'date-parts': [[1935]] });
  expect(rest.DOI).toBe('10.1021/ie50293a010');
  expect(rest).toHaveProperty('number-of-pages', '8');
});
