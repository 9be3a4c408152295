import { createHash } from 'node:crypto';
import BetterSqlite from 'better-sqlite3';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { approved, draft, openOffice, type TestOffice } from './support/office.js';
import { TUBE_INPUTS } from './support/sheets.js';

/** Tables whose rows stay as written, with a column to try to change. */
const FROZEN = [
  ['correlation', 'slug'],
  ['property_equation', 'slug'],
  ['revision', 'number'],
  ['revision_content', 'hash'],
  ['standing_event', 'standing'],
  ['submission', 'report'],
  ['review_assignment', 'reviewer_id'],
  ['review', 'verdict'],
  ['comment', 'text'],
  ['approval', 'meaning'],
  ['evaluation', 'response'],
] as const;

let office: TestOffice;
let sqlite: BetterSqlite.Database;

beforeAll(async () => {
  office = await openOffice();
  await approved(office, draft(office, 'frozen'));
  await office.engineer.agent
    .post('/api/correlations/frozen/evaluations')
    .send({ inputs: TUBE_INPUTS })
    .expect(200);
  await office.reviewer.agent
    .post('/api/correlations/frozen/revisions/1/comments')
    .send({ field: '', text: 'Fine.' })
    .expect(201);
  draft(office, 'asked');
  await office.engineer.agent
    .post('/api/correlations/asked/revisions/1/submission')
    .send({ reviewers: [office.reviewer.actor.id] })
    .expect(201);
  // Somebody with the file in hand, past the server and its rules.
  sqlite = new BetterSqlite(office.test.databaseFile);
});

afterAll(async () => {
  sqlite.close();
  await office.close();
});

function all(table: string): unknown[] {
  return sqlite.prepare(`SELECT rowid AS place, * FROM "${table}"`).all();
}

describe.each(FROZEN)('%s', (table, column) => {
  test('has rows to protect', () => expect(all(table).length).toBeGreaterThan(0));

  test.each([
    ['UPDATE', `UPDATE "${table}" SET "${column}" = 'x'`],
    ['UPDATE OR REPLACE', `UPDATE OR REPLACE "${table}" SET "${column}" = 'x'`],
    ['DELETE', `DELETE FROM "${table}"`],
  ])('refuses %s', (_name, statement) => {
    const before = all(table);
    expect(() => sqlite.exec(statement)).toThrow(/cannot be (changed|removed)/);
    expect(all(table)).toEqual(before);
  });

  test('refuses INSERT OR REPLACE on every key', () => {
    const before = all(table);
    const columns = sqlite
      .prepare<[], { name: string; hidden: number }>(
        `SELECT name, hidden FROM pragma_table_xinfo('${table}')`,
      )
      .all()
      .filter(({ hidden }) => hidden === 0)
      .map(({ name }) => `"${name}"`);
    const list = columns.join(', ');
    // With its own id, and with another one, so that only the other unique keys are in the way.
    expect(() =>
      sqlite.exec(`INSERT OR REPLACE INTO "${table}" (${list}) SELECT ${list} FROM "${table}" LIMIT 1`),
    ).toThrow(/cannot be replaced|frozen/);
    expect(all(table)).toEqual(before);
  });
});

describe('unique keys besides the id', () => {
  test.each([
    [
      'the iteration of a revision',
      `INSERT OR REPLACE INTO revision_content (revision_id, iteration, format, canonical_text, hash, at, by_id)
       SELECT revision_id, iteration, format, '{"title":"x"}', 'x', at, by_id FROM revision_content LIMIT 1`,
    ],
    [
      'the number of a revision',
      `INSERT OR REPLACE INTO revision (correlation_id, number, originator_id, created_at)
       SELECT correlation_id, number, 'x', created_at FROM revision WHERE correlation_id IS NOT NULL LIMIT 1`,
    ],
    [
      'the approval of a revision',
      `INSERT OR REPLACE INTO approval (revision_id, hash, by_id, by_name, meaning, at)
       SELECT revision_id, hash, 'x', 'x', 'x', at FROM approval LIMIT 1`,
    ],
    [
      'the slug of a correlation',
      `INSERT OR REPLACE INTO correlation (slug, geometry, created_at, created_by)
       SELECT slug, geometry, created_at, 'x' FROM correlation LIMIT 1`,
    ],
  ])('%s is not replaced', (_name, statement) => {
    expect(() => sqlite.exec(statement)).toThrow(/cannot be replaced|frozen/);
  });
});

describe('approved content', () => {
  test('takes no further iteration, not even from raw SQL', () => {
    const add = `
      INSERT INTO revision_content (revision_id, iteration, format, canonical_text, hash, at, by_id)
      SELECT revision_id, iteration + 1, format, canonical_text, hash, at, by_id FROM revision_content
      WHERE revision_id = (SELECT id FROM revision_now WHERE slug = 'frozen')`;
    expect(() => sqlite.exec(add)).toThrow(/frozen/);
  });

  test('has a hash that anybody can recompute from the stored text', () => {
    const rows = sqlite
      .prepare<[], { canonical_text: string; hash: string }>(
        'SELECT canonical_text, hash FROM revision_content',
      )
      .all();
    for (const { canonical_text: text, hash } of rows) {
      expect(createHash('sha256').update(text, 'utf8').digest('hex')).toBe(hash);
    }
    expect(rows.length).toBeGreaterThan(2);
  });

  test('is the draft of nobody else: an originator once there stays', () => {
    const take = `UPDATE revision SET originator_id = 'somebody-else'`;
    expect(() => sqlite.exec(take)).toThrow(/cannot be changed/);
  });
});
