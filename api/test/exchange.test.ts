import { createHash } from 'node:crypto';
import supertest from 'supertest';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import type { Sheet } from '../src/correlations/dto/sheet.dto.js';
import type { ExchangedRegister } from '../src/exchange/register-format.js';
import type { ExchangedSheet } from '../src/exchange/sheet-format.js';
import { CommentsService } from '../src/reviews/comments.service.js';
import { ProblemReportsService } from '../src/problem-reports/problem-reports.service.js';
import { StandingService } from '../src/reviews/standing.service.js';
import { createTestApp, type TestApp } from './support/create-test-app.js';
import { inState, lifeRows, REASON, STATES } from './support/life.js';
import { openOffice, type TestOffice } from './support/office.js';
import { signedInWith, type Agent, type SignedIn } from './support/people.js';
import { codeOf, problemOf } from './support/problem-of.js';
import { tubeSheet } from './support/sheets.js';

let office: TestOffice;

beforeAll(async () => {
  office = await openOffice();
  const { app } = office.test;
  for (const state of STATES) await inState(office, state);
  // Comments with answers and resolutions, reports with answers, and a suspension for one of them.
  const commented = await inState(office, 'recommended');
  const id = app.get(CommentsService).comment(office.reviewer.actor, commented, 'bounds[0]', 'Which page?');
  app.get(CommentsService).answer(office.engineer.actor, commented, id, 'Page 3.');
  app.get(CommentsService).resolve(office.reviewer.actor, commented, id);
  app.get(CommentsService).comment(office.authority.actor, commented, '', 'Open still.');
  const reported = await inState(office, 'approved');
  const reports = app.get(ProblemReportsService);
  const body = { revision: 1, severity: 'error', text: REASON } as const;
  const first = reports.file(office.engineer.actor, reported.slug, body);
  reports.answer(office.authority.actor, first.id, { outcome: 'no-fault', text: REASON });
  const second = reports.file(office.auditor.actor, reported.slug, body);
  app.get(StandingService).suspend(office.authority.actor, reported, {
    reason: REASON,
    problemReport: second.id,
  });
  const successor = await inState(office, 'approved');
  const withdrawn = await inState(office, 'approved');
  app.get(StandingService).withdraw(office.authority.actor, withdrawn, {
    reason: REASON,
    class: 'error-in-source',
    successor: successor.slug,
  });
});
afterAll(() => office.close());

const exported = async (who: SignedIn): Promise<ExchangedRegister> =>
  (await who.agent.get('/api/exchange/register.json').expect(200)).body as ExchangedRegister;

describe('a sheet as a file', () => {
  test('has a published schema, and says what was signed', async () => {
    const { body } = await supertest(office.test.server).get('/api/schemas/sheet.json').expect(200);
    expect(body).toMatchObject({
      $id: 'urn:merestone:schema:exchange:1',
      type: 'object',
      required: ['format', 'slug', 'definition'],
    });
    const { slug } = await inState(office, 'approved');
    const response = await office.auditor.agent
      .get(`/api/correlations/${slug}/revisions/1/sheet.json`)
      .expect(200);
    const file = response.body as ExchangedSheet;
    expect(response.headers['content-disposition']).toContain('attachment');
    expect(file).toMatchObject({
      format: 'merestone-exchange/1',
      slug,
      revision: 1,
      standing: 'approved',
      definition: tubeSheet(),
      signatures: [{ by: office.authority.actor.name, meaning: 'Approved for tests', hash: file.hash }],
    });
  });

  test('comes in as a draft, as a body or as a file, and counts for nothing more', async () => {
    const { slug } = await inState(office, 'approved');
    const { body: file } = await office.engineer.agent.get(
      `/api/correlations/${slug}/revisions/1/sheet.json`,
    );
    const renamed = { ...(file as ExchangedSheet), slug: `${slug}-copy` };
    const made = await office.otherEngineer.agent.post('/api/exchange/sheets').send(renamed).expect(201);
    expect(made.body).toMatchObject({
      slug: `${slug}-copy`,
      revision: 1,
      standing: 'draft',
      hash: renamed.hash,
      approval: null,
      originator: { id: office.otherEngineer.actor.id },
    });
    const next = await office.engineer.agent
      .post('/api/exchange/sheets')
      .attach('file', Buffer.from(JSON.stringify(file)), 'sheet.json')
      .expect(201);
    expect(next.body).toMatchObject({ slug, revision: 2, standing: 'draft' });
    const again = await office.engineer.agent.post('/api/exchange/sheets').send(file as object);
    expect([again.status, codeOf(again)]).toEqual([409, 'conflict']);
  });

  const good = (): Record<string, unknown> => ({
    format: 'merestone-exchange/1',
    slug: 'hostile',
    definition: tubeSheet(),
  });

  test.each<[string, Record<string, unknown>, string]>([
    ['another format', { ...good(), format: 'merestone-exchange/9' }, 'format'],
    ['a field that there is not', { ...good(), approval: {} }, 'approval'],
    ['a slug that leads elsewhere', { ...good(), slug: '../../etc' }, 'slug'],
    ['another hash', { ...good(), hash: '0'.repeat(64) }, 'hash'],
    [
      'an expression that calls into the program',
      {
        ...good(),
        definition: tubeSheet({
          groups: [{ symbol: 'Re', name: 'Reynolds', expression: 'constructor.constructor("return 1")()' }],
        }),
      },
      'definition.groups[0].expression',
    ],
    ['no definition', { format: 'merestone-exchange/1', slug: 'hostile' }, 'definition'],
    [
      'a geometry that is not here',
      { ...good(), definition: tubeSheet({ geometry: 'moon' }) },
      'definition.geometry',
    ],
  ])('is refused with %s, and nothing is written', async (_name, file, field) => {
    const before = lifeRows(office);
    const response = await office.engineer.agent.post('/api/exchange/sheets').send(file);
    expect(response.status).toBe(400);
    expect(problemOf(response).fields?.map((one) => one.field)).toContain(field);
    expect(lifeRows(office)).toBe(before);
  });

  test.each<[string, Buffer, number]>([
    ['no JSON', Buffer.from('%PDF-1.7'), 400],
    ['no text', Buffer.from([0xff, 0xfe, 0x00]), 400],
    ['a list', Buffer.from('[]'), 400],
    ['a prototype', Buffer.from('{"__proto__": {"isAdmin": true}}'), 400],
    ['a name twice', Buffer.from('{"slug": "a", "slug": "b"}'), 400],
    ['nesting without end', Buffer.from(`{"a": ${'['.repeat(2000)}${']'.repeat(2000)}}`), 400],
    ['too much', Buffer.alloc(1_200_000, 0x20), 413],
    ['nothing', Buffer.alloc(0), 400],
  ])('is refused as a file that holds %s', async (_name, bytes, status) => {
    const before = lifeRows(office);
    const response = await office.engineer.agent
      .post('/api/exchange/sheets')
      .attach('file', bytes, 'sheet.json');
    expect(response.status).toBe(status);
    expect(problemOf(response).status).toBe(status);
    expect(lifeRows(office)).toBe(before);
  });

  test('needs a file, and somebody who may draft', async () => {
    const none = await office.engineer.agent.post('/api/exchange/sheets').field('other', 'x');
    expect(none.status).toBe(400);
    for (const who of [office.authority, office.auditor, office.administrator]) {
      expect((await who.agent.post('/api/exchange/sheets').send(good())).status).toBe(403);
    }
  });
});

describe('a whole register', () => {
  let target: TestApp;
  let administrator: SignedIn;
  let auditor: SignedIn;
  let file: ExchangedRegister;

  const bring = (agent: Agent, value: unknown) =>
    agent.post('/api/exchange/register').attach('file', Buffer.from(JSON.stringify(value)), 'register.json');

  beforeAll(async () => {
    target = await createTestApp();
    administrator = await signedInWith(target, 'administrator');
    auditor = await signedInWith(target, 'auditor');
    // Signs the head of the journal, so that a checkpoint goes along.
    await office.auditor.agent.post('/api/journal/verification').expect(200);
    file = await exported(office.auditor);
  });
  afterAll(() => target.close());

  test('goes out with every record', () => {
    const { sqlite } = office.test.connection;
    const count = (table: string) => sqlite.prepare(`SELECT count(*) FROM ${table}`).pluck().get();
    const revisions = [...file.correlations, ...file.propertyEquations].flatMap((one) => one.revisions);
    const sum = (of: (one: (typeof revisions)[number]) => number) =>
      revisions.reduce((all, one) => all + of(one), 0);
    expect({
      revision: revisions.length,
      revision_content: sum(({ contents }) => contents.length),
      standing_event: sum(({ standings }) => standings.length),
      submission: sum(({ submissions }) => submissions.length),
      review_assignment: sum(({ assignments }) => assignments.length),
      review: sum(({ reviews }) => reviews.length),
      comment: sum(({ comments }) => comments.length),
      comment_answer: sum(({ comments }) => comments.flatMap(({ answers }) => answers).length),
      comment_resolution: sum(({ comments }) => comments.filter(({ resolution }) => resolution).length),
      approval: sum(({ approval }) => (approval ? 1 : 0)),
      problem_report: sum(({ problemReports }) => problemReports.length),
      problem_report_answer: sum(
        ({ problemReports }) => problemReports.filter(({ answer }) => answer).length,
      ),
    }).toEqual(
      Object.fromEntries(
        [
          'revision',
          'revision_content',
          'standing_event',
          'submission',
          'review_assignment',
          'review',
          'comment',
          'comment_answer',
          'comment_resolution',
          'approval',
          'problem_report',
          'problem_report_answer',
        ].map((table) => [table, count(table)]),
      ),
    );
    expect(file.journals).toHaveLength(1);
    expect(file.journals[0]?.entries).toHaveLength(count('journal') as number);
  });

  test('is refused where it does not hold, and nothing is written', async () => {
    const tampered = (change: (copy: ExchangedRegister) => void): ExchangedRegister => {
      const copy = structuredClone(file);
      change(copy);
      return copy;
    };
    const correlation = (copy: ExchangedRegister, standing: string) =>
      copy.correlations.find(({ revisions }) => revisions[0]?.standings.at(-1)?.standing === standing)!;
    const cases: [string, ExchangedRegister, RegExp][] = [
      [
        'another text under the same hash',
        tampered((copy) => {
          const content = correlation(copy, 'approved').revisions[0]!.contents[0]!;
          content.text = content.text.replace('2*Re^0.5', '3*Re^0.5');
        }),
        /contents\.0\.hash$/,
      ],
      [
        'another text with its own hash',
        tampered((copy) => {
          const content = correlation(copy, 'approved').revisions[0]!.contents[0]!;
          content.text = content.text.replace('2*Re^0.5', '3*Re^0.5');
          content.hash = createHash('sha256').update(content.text).digest('hex');
        }),
        /approval\.hash|standings/,
      ],
      [
        'a text that is not canonical',
        tampered((copy) => {
          const content = correlation(copy, 'approved').revisions[0]!.contents[0]!;
          content.text = ` ${content.text}`;
        }),
        /contents\.0\.text$/,
      ],
      [
        'an approval by the originator',
        tampered((copy) => {
          const revision = correlation(copy, 'approved').revisions[0]!;
          revision.approval!.by = revision.originator;
        }),
        /approval\.by$/,
      ],
      [
        'an approval out of nothing',
        tampered((copy) => {
          correlation(copy, 'approved').revisions[0]!.approval = null;
        }),
        /approval$/,
      ],
      [
        'a draft that became approved',
        tampered((copy) => {
          correlation(copy, 'approved').revisions[0]!.standings.splice(1, 1);
        }),
        /standings\.1\.standing$/,
      ],
      [
        'a revision withdrawn and then approved',
        tampered((copy) => {
          const { standings } = correlation(copy, 'withdrawn').revisions[0]!;
          standings.push({ ...standings.at(-1)!, standing: 'approved' });
        }),
        /standings\.\d+\.standing$/,
      ],
      [
        'an altered entry of the journal',
        tampered((copy) => {
          const { entries } = copy.journals[0]!;
          entries[3] = entries[3]!.replace(/"name":"[^"]*"/, '"name":"Nobody"');
        }),
        /journals\.0\.entries/,
      ],
      [
        'a checkpoint with another signature',
        tampered((copy) => {
          copy.journals[0]!.checkpoints[0]!.signature = Buffer.alloc(64).toString('base64');
        }),
        /journals\.0/,
      ],
      [
        'a key that is none',
        tampered((copy) => {
          copy.journals[0]!.keys[0]!.pem = 'no key';
        }),
        /journals\.0/,
      ],
      [
        'somebody without a name',
        tampered((copy) => {
          copy.people.pop();
        }),
        /people/,
      ],
      [
        'a geometry that is not in the file',
        tampered((copy) => {
          copy.geometries.pop();
          copy.geometries.pop();
        }),
        /geometry$/,
      ],
      [
        'a report that is not there',
        tampered((copy) => {
          const named = copy.correlations
            .flatMap(({ revisions }) => revisions.flatMap(({ standings }) => standings))
            .find(({ problemReport }) => problemReport !== null)!;
          named.problemReport = { revision: 1, place: 7 };
        }),
        /problemReport$/,
      ],
      [
        'a correlation twice',
        tampered((copy) => {
          copy.correlations.push(copy.correlations[0]!);
        }),
        /correlations\.\d+$/,
      ],
    ];
    const rows = () =>
      target.connection.sqlite
        .prepare(
          'SELECT (SELECT count(*) FROM revision) || (SELECT count(*) FROM geometry) || (SELECT count(*) FROM journal)',
        )
        .pluck()
        .get();
    for (const [name, value, field] of cases) {
      const before = rows();
      const response = await bring(administrator.agent, value);
      expect(response.status, name).toBe(400);
      expect(
        problemOf(response).fields?.map((one) => one.field),
        name,
      ).toContainEqual(expect.stringMatching(field));
      expect(rows(), name).toBe(before);
    }
  });

  test('comes in losing nothing: its export is the file again', async () => {
    for (const who of [auditor, await signedInWith(target, 'engineer')]) {
      expect((await bring(who.agent, file)).status).toBe(403);
    }
    const response = await bring(administrator.agent, file).expect(201);
    expect(response.body).toMatchObject({
      correlations: file.correlations.length,
      journalEntries: file.journals[0]?.entries.length,
    });
    const again = (await auditor.agent.get('/api/exchange/register.json').expect(200)).body as object;
    expect(again).toEqual(file);
  });

  test('is one act in the journal of the office that brings it in, which holds', async () => {
    const { body } = await auditor.agent.get('/api/journal?limit=200').expect(200);
    const acts = (body as { items: { act: string; actor: { id: string } }[] }).items;
    expect(acts.filter(({ act }) => act === 'register.imported')).toMatchObject([
      { actor: { id: administrator.actor.id } },
    ]);
    expect(acts.some(({ act }) => act.startsWith('revision.'))).toBe(false);
    expect((await auditor.agent.post('/api/journal/verification').expect(200)).body).toMatchObject({
      ok: true,
    });
  });

  test('shows its sheets with the names of those who signed them, found by search', async () => {
    const approvedOne = file.correlations.find(
      ({ revisions }) => revisions[0]?.standings.at(-1)?.standing === 'approved',
    )!;
    const sheet = (await auditor.agent.get(`/api/correlations/${approvedOne.slug}`).expect(200))
      .body as Sheet;
    expect(sheet).toMatchObject({
      standing: 'approved',
      hash: approvedOne.revisions[0]?.contents.at(-1)?.hash,
      originator: { name: office.engineer.actor.name },
      approval: { by: { name: office.authority.actor.name }, meaning: 'Approved for tests' },
    });
    const { body } = await auditor.agent.get('/api/correlations?q=square-root&limit=100').expect(200);
    expect((body as { total: number }).total).toBe(file.correlations.length);
  });

  test('comes into an empty register only', async () => {
    const response = await bring(administrator.agent, file);
    expect([response.status, codeOf(response)]).toEqual([409, 'conflict']);
  });

  test('goes on from there: the journal of the office that acted goes along as the second', async () => {
    const engineer = await signedInWith(target, 'engineer');
    await engineer.agent
      .post('/api/correlations')
      .send({ slug: 'made-here', definition: tubeSheet() })
      .expect(201);
    const again = (await auditor.agent.get('/api/exchange/register.json').expect(200))
      .body as ExchangedRegister;
    expect(again.journals).toHaveLength(2);
    expect(again.journals[0]).toEqual(file.journals[0]);
    expect(again.people.map(({ id }) => id)).toContain(engineer.actor.id);
  });

  test('is for authorities and auditors to take out', async () => {
    await office.authority.agent.get('/api/exchange/register.json').expect(200);
    for (const who of [office.engineer, office.reviewer, office.administrator]) {
      await who.agent.get('/api/exchange/register.json').expect(403);
    }
  });
});
