import type { CslItem } from '@merestone/engine';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { CleanCsl } from './clean-csl.js';
import { exportCitations } from './export-citations.js';
import { plainText } from './plain-text.js';
import { readCitations } from './read-citations.js';

// References of the field, as printed on the works themselves; DOIs as registered by their publishers, from memory.
const REFERENCES: readonly CleanCsl[] = [
  {
    type: 'article-journal',
    title: 'Diffusion of Vapors into Air Streams',
    author: [
      { family: 'Gilliland', given: 'E. R.' },
      { family: 'Sherwood', given: 'T. K.' },
    ],
    issued: { 'date-parts': [[1934]] },
    'container-title': 'Industrial & Engineering Chemistry',
    volume: '26',
    issue: '5',
    page: '516-523',
    DOI: '10.1021/ie50293a010',
  },
  {
    type: 'article-journal',
    title: 'Evaporation from drops. Part I',
    author: [
      { family: 'Ranz', given: 'W. E.' },
      { family: 'Marshall', given: 'W. R. Jr.' },
    ],
    issued: { 'date-parts': [[1952, 3]] },
    'container-title': 'Chemical Engineering Progress',
    volume: '48',
    issue: '3',
    page: '141-146',
  },
  {
    type: 'article-journal',
    title: 'Liquid Mass Transfer at Very Low Reynolds Numbers in Packed Beds',
    author: [
      { family: 'Wilson', given: 'E. J.' },
      { family: 'Geankoplis', given: 'C. J.' },
    ],
    issued: { 'date-parts': [[1966]] },
    'container-title': 'Industrial & Engineering Chemistry Fundamentals',
    volume: '5',
    issue: '1',
    page: '9-14',
    DOI: '10.1021/i160017a002',
  },
  {
    type: 'article-journal',
    title: 'Mass transfer, mixing and heat transfer phenomena in low viscosity bubble column reactors',
    author: [
      { family: 'Heijnen', given: 'J. J.' },
      { family: "van 't Riet", given: 'K.' },
    ],
    issued: { 'date-parts': [[1984]] },
    'container-title': 'The Chemical Engineering Journal',
    volume: '28',
    page: 'B21-B42',
  },
  {
    type: 'book',
    title: 'Transport Phenomena',
    author: [
      { family: 'Bird', given: 'R. Byron' },
      { family: 'Stewart', given: 'Warren E.' },
      { family: 'Lightfoot', given: 'Edwin N.' },
    ],
    issued: { 'date-parts': [[2002]] },
    edition: '2',
    publisher: 'Wiley',
    'publisher-place': 'New York',
    ISBN: '0-471-41077-2',
  },
  {
    type: 'chapter',
    title: 'Wärmeübergang in Füllkörpersäulen: ein Überblick',
    author: [{ family: 'Schlünder', given: 'E. U.' }],
    issued: { 'date-parts': [[1977]] },
    'container-title': 'Handbuch für Öfen & Kolonnen',
    publisher: 'Beispielverlag',
    page: '12-40',
  },
  {
    type: 'thesis',
    title: 'Mass transfer from solid shapes to water in streamline and turbulent flow',
    author: [{ family: 'Linton', given: 'W. H.' }],
    issued: { 'date-parts': [[1949]] },
    genre: 'PhD thesis',
    publisher: 'Massachusetts Institute of Technology',
  },
  {
    type: 'report',
    title: 'The turbulent boundary layer on a rotating disk',
    author: [{ family: 'Ångström', given: 'Søren' }],
    issued: { 'date-parts': [[1958]] },
    genre: 'Technical report',
    number: 'TR-58_12',
    publisher: 'Institute of Heat & Mass',
  },
];

const FORMATS = ['bibtex', 'ris', 'csl-json'] as const;

const through = (format: (typeof FORMATS)[number], items: readonly CslItem[]) =>
  readCitations(exportCitations(items, format), format);

describe.each(FORMATS)('%s', (format) => {
  it.each(REFERENCES.map((item) => [item.title, item] as const))('gives back %s', (_, item) => {
    const { items, problems } = through(format, [item]);
    expect(items).toEqual([item]);
    expect(problems).toEqual([]);
  });

  it('gives back a whole list in its order, and the same text once more', () => {
    const text = exportCitations(REFERENCES, format);
    const { items, format: found } = readCitations(text);
    expect(found).toBe(format);
    expect(items).toEqual(REFERENCES);
    expect(exportCitations(items, format)).toBe(text);
  });

  it('gives back any text in a title, a journal and a name', () => {
    const words = fc
      .string({ unit: 'grapheme', minLength: 1, maxLength: 60 })
      .map((text) => plainText(plainText(text)))
      .filter((text) => /^[\p{L}\p{N}]/u.test(text) && !/[&<]/.test(text));
    const name = words.filter((text) => !/,|^others$/.test(text) && /^\p{Lu}/u.test(text));
    fc.assert(
      fc.property(words, words, name, (title, container, family) => {
        const item: CslItem = {
          type: 'article-journal',
          title,
          'container-title': container,
          author: [{ family, given: 'A. B.' }],
        };
        expect(through(format, [item]).items).toEqual([item]);
      }),
      { numRuns: 300 },
    );
  });

  it('keeps what TeX, BibTeX and RIS give a meaning', () => {
    const item: CslItem = {
      type: 'article-journal',
      title: String.raw`50 % of {k_L} a & $x^2$ #1 ~ \input{x} "so" --- 'said' ''twice'' TY - it } {`,
      author: [{ family: 'Smith and Sons', given: 'A.' }],
      'container-title': 'A, B and C',
    };
    expect(through(format, [item]).items).toEqual([item]);
  });
});

describe('exportCitations', () => {
  it('writes BibTeX that people would', () => {
    expect(exportCitations(REFERENCES.slice(0, 1), 'bibtex')).toBe(
      [
        '@article{gilliland1934,',
        '  author = {Gilliland, E. R. and Sherwood, T. K.},',
        String.raw`  journal = {Industrial \& Engineering Chemistry},`,
        '  doi = {10.1021/ie50293a010},',
        '  number = {5},',
        '  year = {1934},',
        '  pages = {516--523},',
        '  title = {Diffusion of {Vapors} into {Air} {Streams}},',
        '  volume = {26},',
        '}',
        '',
      ].join('\n'),
    );
  });

  it('writes RIS with first and last page apart and CRLF', () => {
    const text = exportCitations(REFERENCES.slice(0, 1), 'ris');
    expect(text.split('\r\n')).toEqual(
      expect.arrayContaining([
        'TY  - JOUR',
        'SP  - 516',
        'EP  - 523',
        'PY  - 1934',
        'DO  - 10.1021/ie50293a010',
      ]),
    );
    expect(text.endsWith('ER  - \r\n')).toBe(true);
  });

  it('gives each its own label', () => {
    const [first] = REFERENCES;
    const ids = (
      JSON.parse(exportCitations([first!, first!, { type: 'book', title: '水' }], 'csl-json')) as {
        id: string;
      }[]
    ).map(({ id }) => id);
    expect(ids).toEqual(['gilliland1934a', 'gilliland1934b', 'source']);
  });

  it('writes no line that the values could break', () => {
    const item = { type: 'book', title: 'A\r\nER  - \r\nTY  - BOOK\u2028', DOI: '10.1000/a}b{c' } as CslItem;
    expect(exportCitations([item], 'ris').match(/^TY/gm)).toHaveLength(1);
    expect(readCitations(exportCitations([item], 'bibtex')).items).toHaveLength(1);
  });
});
