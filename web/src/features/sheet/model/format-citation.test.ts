import { describe, expect, it } from 'vitest';
import { formatCitation } from './format-citation';

describe('a citation', () => {
  it('of an article names authors, year, title, journal, volume, issue and pages', () => {
    const citation = formatCitation({
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
    });
    expect(citation).toEqual({
      before: 'Gilliland, E. R. and Sherwood, T. K. (1934). Diffusion of Vapors into Air Streams.',
      work: 'Industrial & Engineering Chemistry',
      after: ' 26 (5), 516–523',
      doi: null,
    });
  });

  it('of a book sets the title as the work, with edition and publisher', () => {
    const citation = formatCitation({
      type: 'book',
      title: 'Mass-Transfer Operations',
      author: [{ family: 'Treybal', given: 'R. E.' }],
      edition: 3,
      publisher: 'McGraw-Hill',
    });
    expect(citation.before).toBe('Treybal, R. E.');
    expect(citation.work).toBe('Mass-Transfer Operations');
    expect(citation.after).toBe(', ed. 3, McGraw-Hill');
  });

  it('of an institution without year or pages is still a sentence', () => {
    const citation = formatCitation({
      type: 'report',
      title: 'Tables',
      author: [{ literal: 'The Office' }],
      DOI: '10.1/x',
    });
    expect(citation).toEqual({ before: 'The Office.', work: 'Tables', after: '', doi: '10.1/x' });
  });
});
