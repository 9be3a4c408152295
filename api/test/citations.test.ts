import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { approved, draft, openOffice, rowCounts, type TestOffice } from './support/office.js';
import { codeOf, problemOf } from './support/problem-of.js';

const csl = {
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
};
const source = { csl, place: 'Eq. 5', read: 'seen' as const };
const book = { csl: { type: 'book', title: 'Ours alone' }, place: 'p. 1', read: 'seen' as const };

let office: TestOffice;

beforeAll(async () => {
  office = await openOffice();
  await approved(office, draft(office, 'vapours', { title: 'Vapours in a tube', sources: [source] }));
  draft(office, 'kept-back', { title: 'A draft', sources: [source, book] });
});
afterAll(() => office.close());

const read = (body: object, by = office.engineer) => by.agent.post('/api/citations/reading').send(body);

describe('POST /api/citations/reading', () => {
  it('reads references and keeps nothing', async () => {
    const before = rowCounts(office);
    const text = '@book{x, title={Bubble Columns}, author={Deckwer, W.-D.}, year=1992, doi={wrong}}';
    const { body } = await read({ text }).expect(200);
    expect(body).toEqual({
      format: 'bibtex',
      items: [
        {
          type: 'book',
          title: 'Bubble Columns',
          author: [{ family: 'Deckwer', given: 'W.-D.' }],
          issued: { 'date-parts': [[1992]] },
        },
      ],
      problems: [{ field: 'items.0.DOI', message: '"wrong" is not a DOI and was left out.' }],
      duplicates: [],
      alreadyCitedBy: [],
    });
    expect(rowCounts(office)).toEqual(before);
  });

  it('says which sheets cite a reference already, and which references are one work', async () => {
    const text = [
      'TY  - JOUR',
      'AU  - Gilliland, E.R.',
      'TI  - Diffusion of vapours',
      'JO  - Ind. Eng. Chem.',
      'PY  - 1934',
      'SP  - 516',
      'ER  - ',
      'TY  - JOUR',
      'TI  - The same',
      'DO  - https://doi.org/10.1021/IE50293A010',
      'ER  - ',
      'TY  - BOOK',
      'TI  - Another',
      'ER  - ',
      'TY  - BOOK',
      'TI  - The same again',
      'DO  - 10.1021/ie50293a010',
      'ER  - ',
    ].join('\n');
    const { body } = await read({ text, format: 'ris' }, office.otherEngineer).expect(200);
    expect(body).toMatchObject({
      duplicates: [{ first: 1, second: 3, by: 'doi' }],
      alreadyCitedBy: [
        { item: 0, kind: 'correlation', slug: 'vapours', title: 'Vapours in a tube', by: 'place' },
        { item: 1, kind: 'correlation', slug: 'vapours', title: 'Vapours in a tube', by: 'doi' },
        { item: 3, kind: 'correlation', slug: 'vapours', title: 'Vapours in a tube', by: 'doi' },
      ],
    });
  });

  it('tells of drafts only to whoever sees them', async () => {
    const slugs = async (by: TestOffice['engineer']) => {
      const { body } = await read({ text: JSON.stringify(csl) }, by).expect(200);
      return (body as { alreadyCitedBy: { slug: string }[] }).alreadyCitedBy.map(({ slug }) => slug);
    };
    expect(await slugs(office.engineer)).toEqual(['kept-back', 'vapours']);
    expect(await slugs(office.otherEngineer)).toEqual(['vapours']);
  });

  it.each([
    ['nobody', 401],
    ['authority', 403],
    ['auditor', 403],
    ['administrator', 403],
    ['engineer', 200],
    ['reviewer', 200],
  ] as const)('answers the %s with %i', async (who, status) => {
    const body = { text: '@book{x, title={T}}' };
    const { default: supertest } = await import('supertest');
    const agent = who === 'nobody' ? supertest(office.test.server) : office[who].agent;
    expect((await agent.post('/api/citations/reading').send(body)).status).toBe(status);
  });

  it.each<[string, object, string, string]>([
    ['no text', {}, 'text', 'missing'],
    ['a text that is none', { text: 7 }, 'text', 'malformed'],
    ['a list', { text: ['@book{x, title={T}}'] }, 'text', 'malformed'],
    ['another format', { text: 'x', format: 'docx' }, 'format', 'malformed'],
    ['more than there is', { text: '@book{x, title={T}}', path: '/etc' }, 'path', 'malformed'],
    ['too much', { text: 'x'.repeat(200_001) }, 'text', 'malformed'],
    ['no format that can be told', { text: 'Gilliland 1934' }, 'format', 'malformed'],
    ['\\input', { text: String.raw`@book{x, title={\input{/etc/passwd}}}` }, 'text', 'malformed'],
    ['braces without end', { text: `@book{x, title=${'{'.repeat(190_000)}` }, 'text', 'malformed'],
    ['binary', { text: '@book{x, title={\u0001}}' }, 'text', 'malformed'],
    ['half a character', { text: '@book{x, title={\ud800}}' }, 'text', 'malformed'],
  ])('refuses %s at its field', async (_, body, field, code) => {
    const response = await read(body).expect(400);
    expect(codeOf(response)).toBe(code);
    expect(problemOf(response).fields?.map((entry) => entry.field)).toEqual([field]);
  });
});

describe('GET …/citations', () => {
  const path = '/api/correlations/vapours/revisions/1/citations';

  it.each([
    ['', 'application/x-bibtex', 'bib', '@article{gilliland1934,'],
    ['?format=bibtex', 'application/x-bibtex', 'bib', '@article{gilliland1934,'],
    ['?format=ris', 'application/x-research-info-systems', 'ris', 'TY  - JOUR\r\n'],
    [
      '?format=csl-json',
      'application/vnd.citationstyles.csl+json',
      'json',
      '[\n  {\n    "id": "gilliland1934"',
    ],
  ])('exports %s', async (query, type, ending, begin) => {
    const response = await office.auditor.agent
      .get(path + query)
      .responseType('blob')
      .expect(200);
    expect(response.type).toBe(type);
    expect(response.headers['content-disposition']).toBe(`attachment; filename="vapours-rev-1.${ending}"`);
    expect(response.headers['x-content-type-options']).toBe('nosniff');
    expect(String(response.body).startsWith(begin)).toBe(true);
  });

  it('gives back what was cited', async () => {
    for (const format of ['bibtex', 'ris', 'csl-json']) {
      const file = await office.engineer.agent.get(`${path}?format=${format}`).responseType('blob');
      const { body } = await read({ text: String(file.body) }).expect(200);
      expect((body as { items: unknown }).items).toEqual([csl]);
    }
  });

  it('refuses what is not there, not seen, or no format', async () => {
    const { agent } = office.otherEngineer;
    expect(codeOf(await agent.get('/api/correlations/kept-back/revisions/1/citations').expect(404))).toBe(
      'not-found',
    );
    await office.engineer.agent.get('/api/correlations/kept-back/revisions/1/citations').expect(200);
    await agent.get('/api/correlations/vapours/revisions/2/citations').expect(404);
    await agent.get('/api/correlations/vapours/revisions/x/citations').expect(400);
    const refused = await agent.get(`${path}?format=constructor`).expect(400);
    expect(problemOf(refused).fields?.[0]?.field).toBe('format');
    await agent.get(`${path}?format=ris&format=bibtex`).expect(400);
  });
});
