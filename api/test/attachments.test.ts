import { createHash } from 'node:crypto';
import { existsSync, readdirSync, readFileSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import supertest from 'supertest';
import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { jpegFile, pdfFile, pngFile } from './support/documents.js';
import { approved, draft, openOffice, rowCounts, type TestOffice } from './support/office.js';
import type { Agent } from './support/people.js';
import { codeOf, problemOf } from './support/problem-of.js';

interface Attached {
  readonly id: string;
  readonly source: number | null;
  readonly name: string;
  readonly sha256: string;
}

const sources = ['First', 'Second'].map((title) => ({
  csl: { type: 'book', title },
  place: 'p. 1',
  read: 'seen' as const,
}));

let office: TestOffice;
let pdfs = 0;

beforeAll(async () => {
  office = await openOffice();
  draft(office, 'mine', { sources });
  await approved(office, draft(office, 'public', { sources }));
});
afterAll(() => office.close());

const pathOf = (slug: string) => `/api/correlations/${slug}/revisions/1/attachments`;
/** A PDF that is no other. */
const anotherPdf = () => pdfFile({ catalogue: `/Number ${(pdfs += 1)}` });
const sha256 = (bytes: Buffer) => createHash('sha256').update(bytes).digest('hex');

interface Upload {
  readonly bytes?: Buffer;
  readonly name?: string;
  readonly type?: string;
  readonly source?: string;
  readonly licence?: string;
}

function upload(agent: Agent, slug: string, given: Upload = {}) {
  const {
    bytes = anotherPdf(),
    name = 'paper.pdf',
    type = 'application/pdf',
    source = '0',
    licence = 'office-only',
  } = given;
  return agent
    .post(pathOf(slug))
    .field('source', source)
    .field('licence', licence)
    .attach('file', bytes, { filename: name, contentType: type });
}

const filesOf = ({ test }: TestOffice): string[] => {
  const folder = join(test.config.dataFolder, 'attachments');
  if (!existsSync(folder)) return [];
  return readdirSync(folder, { recursive: true, withFileTypes: true })
    .filter((entry) => entry.isFile())
    .map(({ name }) => name);
};

const lastEntry = () =>
  JSON.parse(
    String(
      office.test.connection.sqlite.prepare('SELECT entry FROM journal ORDER BY "index" DESC').pluck().get(),
    ),
  ) as { act: string; subject: string; actor: { id: string }; detail: Record<string, unknown> };

describe('attaching', () => {
  it('keeps bytes, row and journal entry', async () => {
    const bytes = pdfFile({ catalogue: '/OpenAction << /S /JavaScript /JS (x) >>' });
    const { body } = await upload(office.engineer.agent, 'mine', {
      bytes,
      name: 'Paper 物.pdf',
      source: '1',
    }).expect(201);
    const item = body as Attached;
    expect(item).toEqual({
      id: item.id,
      source: 1,
      citation: 'Second.',
      name: 'Paper 物.pdf',
      mediaType: 'application/pdf',
      size: bytes.length,
      sha256: sha256(bytes),
      licence: 'office-only',
      activeContent: ['script', 'open-action'],
      at: (body as { at: string }).at,
      by: { id: office.engineer.actor.id, name: office.engineer.actor.name },
    });
    const kept = join(office.test.config.dataFolder, 'attachments', item.sha256.slice(0, 2), item.sha256);
    expect(readFileSync(kept).equals(bytes)).toBe(true);
    expect(filesOf(office).filter((name) => name.endsWith('.part'))).toEqual([]);
    expect(lastEntry()).toMatchObject({
      act: 'attachment.added',
      subject: `correlations/mine/revisions/1/attachments/${item.id}`,
      actor: { id: office.engineer.actor.id },
      detail: { sha256: item.sha256, name: 'Paper 物.pdf', licence: 'office-only', source: 'Second.' },
    });
    const { body: list } = await office.engineer.agent.get(pathOf('mine')).expect(200);
    expect(list).toEqual({ items: [item], abilities: { add: true } });
  });

  it('takes images, and files whose type the sender does not know', async () => {
    const { agent } = office.engineer;
    await upload(agent, 'mine', { bytes: pngFile(), name: 'a.png', type: 'image/png' }).expect(201);
    await upload(agent, 'mine', { bytes: jpegFile(), name: 'a.jpeg', type: 'image/jpg' }).expect(201);
    await upload(agent, 'mine', { name: 'b', type: 'application/octet-stream' }).expect(201);
  });

  it('finds the source again when sources change places, and says when it is gone', async () => {
    const made = draft(office, 'moving', { sources });
    const { body } = await upload(office.engineer.agent, 'moving', { source: '0' }).expect(201);
    const id = (body as Attached).id;
    const put = async (titles: string[], hash: string) => {
      const { body: sheet } = await office.engineer.agent.get('/api/correlations/moving').expect(200);
      const { definition } = sheet as { definition: { sources: object[] } };
      const changed = titles.map((title) => ({ ...sources[0], csl: { type: 'book', title } }));
      const answer = await office.engineer.agent
        .put('/api/correlations/moving/revisions/1')
        .set('If-Match', `"${hash}"`)
        .send({ definition: { ...definition, sources: changed } })
        .expect(200);
      const { body: list } = await office.engineer.agent.get(pathOf('moving')).expect(200);
      const [found] = (list as { items: Attached[] }).items.filter((item) => item.id === id);
      return { hash: (answer.body as { hash: string }).hash, source: found?.source };
    };
    const moved = await put(['Second', 'First'], made.hash);
    expect(moved.source).toBe(1);
    expect((await put(['Third'], moved.hash)).source).toBeNull();
  });

  it('has one and the same document once', async () => {
    const bytes = anotherPdf();
    await upload(office.engineer.agent, 'mine', { bytes }).expect(201);
    const refused = await upload(office.reviewer.agent, 'mine', { bytes, name: 'b.pdf', source: '1' }).expect(
      409,
    );
    expect(codeOf(refused)).toBe('duplicate');
    expect(problemOf(refused).detail).toContain('as "paper.pdf"');
    await upload(office.reviewer.agent, 'public', { bytes }).expect(201);
  });

  it('gives a field by the name of a prototype no hold', async () => {
    const { body, status } = await upload(office.engineer.agent, 'mine')
      .field('__proto__[licence]', 'may-leave')
      .field('__proto__', 'x');
    expect([201, 400]).toContain(status);
    expect(body).not.toHaveProperty('x');
    expect(({} as Record<string, unknown>).licence).toBeUndefined();
  });

  it('takes no more than 40 at a revision', async () => {
    draft(office, 'full', { sources });
    for (let i = 0; i < 40; i += 1) await upload(office.engineer.agent, 'full').expect(201);
    expect(codeOf(await upload(office.engineer.agent, 'full').expect(409))).toBe('conflict');
  });
});

describe('what is refused', () => {
  let rows: Record<string, number>;
  let files: string[];
  beforeEach(() => {
    rows = rowCounts(office);
    files = filesOf(office);
  });
  const nothingChanged = () => {
    expect(rowCounts(office)).toEqual(rows);
    expect(filesOf(office)).toEqual(files);
  };

  it.each<[string, Upload, number, string, string | undefined]>([
    ['a program', { bytes: Buffer.from('MZ program') }, 415, 'file-type', 'file'],
    ['SVG', { bytes: Buffer.from('<svg/>'), name: 'a.svg', type: 'image/svg+xml' }, 415, 'file-type', 'file'],
    ['a page called PDF', { bytes: Buffer.from('<html></html>') }, 415, 'file-type', 'file'],
    ['a PNG called PDF', { bytes: pngFile() }, 415, 'file-type', 'file'],
    ['a PNG with the name of a PDF', { bytes: pngFile(), type: 'image/png' }, 415, 'file-type', 'file'],
    ['a PDF with the type of a page', { type: 'text/html' }, 415, 'file-type', 'file'],
    ['a PDF with the name of a program', { name: 'paper.pdf.exe' }, 415, 'file-type', 'file'],
    [
      'an image with a PDF in it',
      { bytes: pngFile({ behind: '%PDF-1.4' }), name: 'a.png', type: 'image/png' },
      415,
      'file-type',
      'file',
    ],
    ['an empty file', { bytes: Buffer.alloc(0) }, 415, 'file-type', 'file'],
    ['more than 15 MB', { bytes: pdfFile({ size: 15 * 1024 * 1024 + 10 }) }, 413, 'too-large', undefined],
    ['no source of the sheet', { source: '2' }, 400, 'malformed', 'source'],
    ['a source that is no number', { source: '__proto__' }, 400, 'malformed', 'source'],
    ['a source below zero', { source: '-1' }, 400, 'malformed', 'source'],
    ['another licence', { licence: 'free' }, 400, 'malformed', 'licence'],
    ['a licence without end', { licence: 'x'.repeat(1000) }, 400, 'malformed', undefined],
  ])('%s', async (_, given, status, code, field) => {
    const response = await upload(office.engineer.agent, 'mine', given).expect(status);
    expect(codeOf(response)).toBe(code);
    expect(problemOf(response).fields?.[0]?.field).toBe(field);
    nothingChanged();
  });

  it('bodies that are no upload', async () => {
    const { agent } = office.engineer;
    const post = () => agent.post(pathOf('mine'));
    const noFile = await post().field('source', '0').field('licence', 'may-leave').expect(400);
    expect(problemOf(noFile).fields?.[0]).toMatchObject({ field: 'file', code: 'missing' });
    await post().send({ source: '0', licence: 'may-leave' }).expect(400);
    const wrongField = post().field('source', '0').field('licence', 'may-leave');
    await wrongField.attach('document', anotherPdf(), 'paper.pdf').expect(400);
    const two = upload(agent, 'mine').attach('file', anotherPdf(), 'paper.pdf');
    await two.expect(400);
    await upload(agent, 'mine').field('ownerId', '1').expect(400);
    await upload(agent, 'mine').field('licence', 'may-leave').expect(400);
    const many = Array.from({ length: 20 }, (_, i) => `f${i}`).reduce(
      (sent, name) => sent.field(name, 'x'),
      upload(agent, 'mine'),
    );
    await many.expect(400);
    nothingChanged();
  });

  it.each([
    ['a boundary that never comes', 'multipart/form-data; boundary=x', 'nothing'],
    ['no boundary', 'multipart/form-data', '--x\r\n'],
    [
      'a part cut off',
      'multipart/form-data; boundary=x',
      '--x\r\nContent-Disposition: form-data; name="file"; filename="a.pdf"\r\n\r\n%PDF',
    ],
    ['headers without end', 'multipart/form-data; boundary=x', `--x\r\n${'A: b\r\n'.repeat(5000)}`],
  ])('multipart with %s', async (_, type, body) => {
    const response = await office.engineer.agent.post(pathOf('mine')).set('Content-Type', type).send(body);
    expect(response.status).toBe(400);
    expect(codeOf(response)).toBe('malformed');
    nothingChanged();
  });

  it('a page of another site', async () => {
    const response = await upload(office.engineer.agent, 'mine')
      .set('Origin', 'https://elsewhere.example')
      .expect(403);
    expect(codeOf(response)).toBe('foreign-origin');
    nothingChanged();
  });
});

describe('names', () => {
  it.each([
    ['../../../../tmp/escaped.pdf', 'escaped.pdf'],
    ['..\\..\\escaped.pdf', 'escaped.pdf'],
    ['/etc/passwd', 'passwd.pdf'],
    ['a\u202efdp.exe.pdf', 'afdp.exe.pdf'],
  ])('of %j only %s is kept', async (name, kept) => {
    const { body } = await upload(office.engineer.agent, 'mine', { name }).expect(201);
    expect((body as Attached).name).toBe(kept);
    expect(filesOf(office).every((file) => /^[0-9a-f]{64}$/.test(file))).toBe(true);
  });
});

describe('who may', () => {
  it('attach to a draft: its originator, reviewers, authorities', async () => {
    await upload(supertest(office.test.server), 'mine').expect(401);
    for (const who of ['auditor', 'administrator'] as const)
      await upload(office[who].agent, 'mine').expect(403);
    await upload(office.otherEngineer.agent, 'mine').expect(404);
    for (const who of ['engineer', 'reviewer', 'authority'] as const)
      await upload(office[who].agent, 'mine').expect(201);
  });

  it('attach to what is approved: reviewers and authorities', async () => {
    const refused = await upload(office.engineer.agent, 'public').expect(409);
    expect(codeOf(refused)).toBe('conflict');
    expect(codeOf(await upload(office.otherEngineer.agent, 'public').expect(403))).toBe('forbidden');
    for (const who of ['reviewer', 'authority'] as const)
      await upload(office[who].agent, 'public').expect(201);
    const { body } = await office.engineer.agent.get(pathOf('public')).expect(200);
    expect(body).toMatchObject({ abilities: { add: false } });
  });

  it('read: whoever sees the revision', async () => {
    const { body } = await upload(office.engineer.agent, 'mine').expect(201);
    const file = `${pathOf('mine')}/${(body as Attached).id}/file`;
    for (const who of ['engineer', 'reviewer', 'authority', 'auditor'] as const) {
      await office[who].agent.get(pathOf('mine')).expect(200);
      await office[who].agent.get(file).expect(200);
    }
    for (const who of ['otherEngineer', 'administrator'] as const) {
      await office[who].agent.get(pathOf('mine')).expect(404);
      await office[who].agent.get(file).expect(404);
    }
    await supertest(office.test.server).get(file).expect(401);
    // Nor under a revision that they do see.
    await office.otherEngineer.agent.get(file.replace('/mine/', '/public/')).expect(404);
  });
});

describe('downloading', () => {
  it('hands out the bytes as a file to save', async () => {
    const bytes = anotherPdf();
    const { body } = await upload(office.engineer.agent, 'mine', { bytes, name: 'Wärme "1".pdf' }).expect(
      201,
    );
    const response = await office.auditor.agent
      .get(`${pathOf('mine')}/${(body as Attached).id}/file`)
      .expect(200);
    expect(response.headers).toMatchObject({
      'content-type': 'application/pdf',
      'content-length': String(bytes.length),
      'content-disposition': `attachment; filename="Warme -1-.pdf"; filename*=UTF-8''W%C3%A4rme%20-1-.pdf`,
      'x-content-type-options': 'nosniff',
      'content-security-policy': "sandbox; default-src 'none'",
      'cache-control': 'no-store',
    });
    expect(sha256(response.body as Buffer)).toBe(sha256(bytes));
  });

  it('finds nothing by a name that is none', async () => {
    const { agent } = office.engineer;
    await agent.get(`${pathOf('mine')}/00000000-0000-4000-8000-000000000000/file`).expect(404);
    await agent.get(`${pathOf('mine')}/..%2f..%2fmerestone.sqlite/file`).expect(400);
    await agent.get(`${pathOf('mine')}/${'a'.repeat(64)}/file`).expect(400);
  });

  it('hands out nothing that was altered on disk', async () => {
    const bytes = anotherPdf();
    const { body } = await upload(office.engineer.agent, 'mine', { bytes }).expect(201);
    const { id, sha256: hash } = body as Attached;
    writeFileSync(join(office.test.config.dataFolder, 'attachments', hash.slice(0, 2), hash), 'altered');
    const response = await office.engineer.agent.get(`${pathOf('mine')}/${id}/file`).expect(500);
    expect(response.text).not.toContain(hash);
    // The same bytes, brought again, mend it.
    await upload(office.reviewer.agent, 'public', { bytes }).expect(201);
    await office.engineer.agent.get(`${pathOf('mine')}/${id}/file`).expect(200);
  });
});

describe('the licence', () => {
  it('can be set anew, on record', async () => {
    const { body } = await upload(office.engineer.agent, 'mine', { licence: 'may-leave' }).expect(201);
    const path = `${pathOf('mine')}/${(body as Attached).id}/licence`;
    await office.otherEngineer.agent.post(path).send({ licence: 'office-only' }).expect(404);
    await office.auditor.agent.post(path).send({ licence: 'office-only' }).expect(403);
    await office.engineer.agent.post(path).send({ licence: 'anything' }).expect(400);
    const answer = await office.reviewer.agent.post(path).send({ licence: 'office-only' }).expect(200);
    expect(answer.body).toEqual({ ...(body as Attached), licence: 'office-only' });
    expect(lastEntry()).toMatchObject({
      act: 'attachment.relicensed',
      detail: { from: 'may-leave', to: 'office-only' },
    });
  });
});

describe('the rows', () => {
  it.each([
    ['UPDATE', `UPDATE attachment SET sha256 = 'x'`],
    ['UPDATE of a name', `UPDATE attachment SET name = 'x'`],
    ['UPDATE OR REPLACE', `UPDATE OR REPLACE attachment SET id = 'x'`],
    ['UPDATE of the rowid', `UPDATE attachment SET rowid = rowid + 1000`],
    ['DELETE', `DELETE FROM attachment`],
    [
      'INSERT OR REPLACE by id',
      `INSERT OR REPLACE INTO attachment SELECT id, owner_kind, owner_id, source, 'x', media_type, size, 'y', licence, active_content, at, by_id, by_name FROM attachment LIMIT 1`,
    ],
    [
      'INSERT OR REPLACE by content',
      `INSERT OR REPLACE INTO attachment SELECT 'new', owner_kind, owner_id, source, 'x', media_type, size, sha256, licence, active_content, at, by_id, by_name FROM attachment LIMIT 1`,
    ],
    [
      'INSERT OR REPLACE by rowid',
      `INSERT OR REPLACE INTO attachment (rowid, id, owner_kind, owner_id, name, media_type, size, sha256, licence, active_content, at, by_id, by_name) SELECT rowid, 'new', owner_kind, owner_id, 'x', media_type, size, 'y', licence, active_content, at, by_id, by_name FROM attachment LIMIT 1`,
    ],
  ])('stand against %s', (_, statement) => {
    const { sqlite } = office.test.connection;
    const before = sqlite.prepare('SELECT rowid, * FROM attachment').all();
    expect(before.length).toBeGreaterThan(0);
    expect(() => sqlite.exec(statement)).toThrow(/attached documents cannot be/);
    expect(sqlite.prepare('SELECT rowid, * FROM attachment').all()).toEqual(before);
  });
});
