import { describe, expect, it } from 'vitest';
import type { CslItem } from '../sheet/common-schema.js';
import { formatCitation } from './format-citation.js';

const GILLILAND: CslItem = {
  type: 'article-journal',
  title: 'Diffusion of Vapors into Air Streams',
  author: [
    { family: 'Gilliland', given: 'E. R.' },
    { family: 'Sherwood', given: 'T. K.' },
  ],
  issued: { 'date-parts': [[1934, 5]] },
  'container-title': 'Industrial & Engineering Chemistry',
  volume: 26,
  issue: '5',
  page: '516-523',
  DOI: '10.1021/ie50293a010',
};

describe('formatCitation', () => {
  it('writes an article', () => {
    expect(formatCitation(GILLILAND).text).toBe(
      'Gilliland, E. R. and Sherwood, T. K. (1934). Diffusion of Vapors into Air Streams. ' +
        'Industrial & Engineering Chemistry 26 (5), 516–523. doi:10.1021/ie50293a010',
    );
  });

  it('hands out the parts', () => {
    const { parts, doi } = formatCitation(GILLILAND);
    expect(parts).toEqual({
      authors: 'Gilliland, E. R. and Sherwood, T. K.',
      year: '1934',
      title: 'Diffusion of Vapors into Air Streams',
      container: 'Industrial & Engineering Chemistry',
      volume: '26 (5)',
      pages: '516–523',
      edition: '',
      kind: '',
      publisher: '',
    });
    expect(doi).toEqual({ name: '10.1021/ie50293a010', href: 'https://doi.org/10.1021/ie50293a010' });
  });

  it('sets the work apart from what stands before and after it', () => {
    expect(formatCitation(GILLILAND)).toMatchObject({
      before: 'Gilliland, E. R. and Sherwood, T. K. (1934). Diffusion of Vapors into Air Streams.',
      work: 'Industrial & Engineering Chemistry',
      after: ' 26 (5), 516–523',
    });
    const treybal = formatCitation({
      type: 'book',
      title: 'Mass-Transfer Operations',
      author: [{ family: 'Treybal', given: 'R. E.' }],
      edition: 3,
      publisher: 'McGraw-Hill',
    });
    expect(treybal).toMatchObject({
      before: 'Treybal, R. E.',
      work: 'Mass-Transfer Operations',
      after: ', ed. 3, McGraw-Hill',
    });
    const tables = formatCitation({ type: 'report', title: 'Tables', author: [{ literal: 'The Office' }] });
    expect(tables).toMatchObject({ before: 'The Office.', work: 'Tables', after: '', doi: null });
  });

  it('writes a book with its edition, the title being the work', () => {
    const { work, text } = formatCitation({
      type: 'book',
      title: 'Transport Phenomena',
      author: [
        { family: 'Bird', given: 'R. B.' },
        { family: 'Stewart', given: 'W. E.' },
        { family: 'Lightfoot' },
      ],
      issued: { 'date-parts': [['2002']] },
      edition: 2,
      publisher: 'Wiley',
    });
    expect(work).toBe('Transport Phenomena');
    expect(text).toBe('Bird, R. B.; Stewart, W. E. and Lightfoot (2002). Transport Phenomena, ed. 2, Wiley.');
  });

  it('writes a thesis with its kind and school', () => {
    // A member beyond those we rely on, as CSL-JSON allows.
    const thesis = {
      type: 'thesis',
      title: 'Mass transfer from solid shapes to water in streamline and turbulent flow',
      author: [{ family: 'Linton', given: 'W. H.' }],
      issued: { 'date-parts': [[1949]] },
      genre: 'Sc.D. thesis',
      publisher: 'Massachusetts Institute of Technology',
    };
    const { text } = formatCitation(thesis);
    expect(text).toBe(
      'Linton, W. H. (1949). Mass transfer from solid shapes to water in streamline and turbulent flow, ' +
        'Sc.D. thesis, Massachusetts Institute of Technology.',
    );
  });

  it('names three of more than six authors', () => {
    const author = ['A', 'B', 'C', 'D', 'E', 'F', 'G'].map((family) => ({ family }));
    expect(formatCitation({ type: 'book', title: 'T', author }).parts.authors).toBe('A; B; C et al.');
    expect(formatCitation({ type: 'book', title: 'T', author: author.slice(1) }).parts.authors).toBe(
      'B; C; D; E; F and G',
    );
  });

  it('makes no link of what is no DOI', () => {
    expect(formatCitation({ ...GILLILAND, DOI: 'javascript:alert(1)' }).doi).toBeNull();
  });

  it('writes what little there is', () => {
    expect(formatCitation({ type: 'document' }).text).toBe('');
    expect(formatCitation({ type: 'document', title: 'A leaflet' }).text).toBe('A leaflet.');
    expect(
      formatCitation({ type: 'report', title: 'Why?', author: [{}, { literal: 'An office' }] }).text,
    ).toBe('An office. Why?');
  });
});
