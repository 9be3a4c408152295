import type BetterSqlite from 'better-sqlite3';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { openSqlite } from '../src/database/connection.js';
import { createTestApp, type TestApp } from './support/create-test-app.js';
import { addPerson } from './support/people.js';

let office: TestApp;
let raw: BetterSqlite.Database;

// Two rows each in every frozen table of the register, straight into the file.
const ROWS = `
  INSERT INTO geometry VALUES ('pipe', 'Pipe', '', '', '', '[]');
  INSERT INTO correlation VALUES (1, 'one', 'pipe', '', 'p'), (2, 'two', 'pipe', '', 'p');
  INSERT INTO property_equation VALUES (1, 'one', '', 'p'), (2, 'two', '', 'p');
  INSERT INTO revision VALUES (1, 1, NULL, 1, 'p', ''), (2, NULL, 1, 1, 'p', '');
  INSERT INTO revision_content (id, revision_id, iteration, format, canonical_text, hash, at, by_id)
    VALUES (1, 1, 1, 'f', '{"title":"a"}', 'h', '', 'p'), (2, 2, 1, 'f', '{"title":"b"}', 'h', '', 'p');
  INSERT INTO standing_event (id, revision_id, standing, hash, at, by_id, by_name)
    VALUES (1, 1, 'draft', 'h', '', 'p', 'P'), (2, 2, 'draft', 'h', '', 'p', 'P');
  INSERT INTO submission (id, revision_id, hash, at, by_id, by_name, engine, report)
    VALUES (1, 1, 'h', '', 'p', 'P', 'e', '[]'), (2, 2, 'h', '', 'p', 'P', 'e', '[]');
  INSERT INTO review_assignment VALUES (1, 1, 'r', '', 'p'), (2, 2, 'r', '', 'p');
  INSERT INTO review (id, revision_id, hash, reviewer_id, reviewer_name, verdict, checklist, at)
    VALUES (1, 1, 'h', 'r', 'R', 'recommend', '{}', ''), (2, 2, 'h', 'r', 'R', 'recommend', '{}', '');
  INSERT INTO comment (id, revision_id, hash, field, text, by_id, by_name, at)
    VALUES (1, 1, 'h', '', 't', 'p', 'P', ''), (2, 2, 'h', '', 't', 'p', 'P', '');
  INSERT INTO comment_answer VALUES (1, 1, 't', 'p', 'P', ''), (2, 1, 't', 'p', 'P', '');
  INSERT INTO comment_resolution VALUES (1, 1, 'p', 'P', ''), (2, 2, 'p', 'P', '');
  INSERT INTO approval (id, revision_id, hash, by_id, by_name, meaning, at)
    VALUES (1, 1, 'h', 'a', 'A', 'm', ''), (2, 2, 'h', 'a', 'A', 'm', '');
  INSERT INTO problem_report VALUES (1, 1, 'h', 'error', 't', 'p', 'P', ''), (2, 1, 'h', 'error', 't', 'p', 'P', '');
  INSERT INTO problem_report_answer VALUES (1, 1, 'no-fault', 't', 'p', 'P', ''), (2, 2, 'no-fault', 't', 'p', 'P', '');
  INSERT INTO former_person VALUES ('x', 'X'), ('y', 'Y');
  INSERT INTO former_journal VALUES (1, '[]', '[]'), (2, '[]', '[]');
  INSERT INTO former_journal_entry VALUES (1, 0, '{}'), (2, 0, '{}');
  INSERT INTO evaluation VALUES ('x', 1, 'draft', 'p', 'P', '', 'within', '{}', '{}', '{}'),
    ('y', 1, 'draft', 'p', 'P', '', 'within', '{}', '{}', '{}');`;

const FROZEN = [
  'journal',
  'journal_node',
  'journal_key',
  'correlation',
  'property_equation',
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
  'former_person',
  'former_journal',
  'former_journal_entry',
  'evaluation',
];

interface Column {
  readonly name: string;
  readonly pk: number;
}

beforeAll(async () => {
  office = await createTestApp();
  await addPerson(office);
  await addPerson(office);
  raw = openSqlite(office.databaseFile);
  raw.exec(ROWS);
});
afterAll(async () => {
  raw.close();
  await office.close();
});

const rows = (table: string): unknown[] => raw.prepare(`SELECT rowid, * FROM ${table}`).all();
const columnsOf = (table: string): Column[] =>
  raw.prepare<[string], Column>('SELECT name, pk FROM pragma_table_info(?)').all(table);
const quoted = (names: readonly string[]): string => names.map((name) => `"${name}"`).join(', ');

/** Every set of columns that holds a value once only: a row with the same ones would push the former row out. */
function uniqueKeysOf(table: string): string[][] {
  const primary = columnsOf(table)
    .filter(({ pk }) => pk > 0)
    .map(({ name }) => name);
  const indexes = raw
    .prepare<[string], { name: string }>('SELECT name FROM pragma_index_list(?) WHERE "unique" = 1')
    .all(table)
    .map(({ name }) =>
      raw.prepare<[string], string>('SELECT name FROM pragma_index_info(?)').pluck().all(name),
    );
  return [primary, ...indexes];
}

/** A row like the first, in which only the key is the same and every other unique value is a new one. */
function replacing(table: string, key: readonly string[]): string {
  const names = columnsOf(table).map(({ name }) => name);
  const others = new Set(
    uniqueKeysOf(table)
      .flat()
      .filter((name) => !key.includes(name)),
  );
  const foreign = raw
    .prepare<[string], string>('SELECT "from" FROM pragma_foreign_key_list(?)')
    .pluck()
    .all(table);
  const values = names.map((name) => {
    if (!others.has(name) || foreign.includes(name)) return `"${name}"`;
    return `CASE typeof("${name}") WHEN 'integer' THEN "${name}" + 1000 WHEN 'null' THEN NULL ELSE "${name}" || '-other' END`;
  });
  return `INSERT OR REPLACE INTO ${table} (${quoted(names)}) SELECT ${values.join(', ')} FROM ${table} LIMIT 1`;
}

describe.each(FROZEN)('the table %s', (table) => {
  const refuse = (sql: string): void => {
    const before = rows(table);
    expect(before.length).toBeGreaterThan(0);
    expect(() => raw.exec(sql), sql).toThrow(/cannot be|frozen/);
    expect(rows(table)).toEqual(before);
  };

  it('refuses to change any column', () => {
    for (const { name } of columnsOf(table)) refuse(`UPDATE ${table} SET "${name}" = "${name}" || ''`);
  });

  it('refuses to remove a row', () => {
    refuse(`DELETE FROM ${table}`);
    refuse(`DELETE FROM ${table} WHERE rowid = (SELECT min(rowid) FROM ${table})`);
  });

  it('refuses to replace a row by any of its unique keys', () => {
    for (const key of uniqueKeysOf(table)) refuse(replacing(table, key));
  });

  it('refuses to replace a row by its hidden number', () => {
    const names = columnsOf(table).map(({ name }) => name);
    const rowid = names.includes('rowid') ? [] : ['rowid'];
    refuse(`INSERT OR REPLACE INTO ${table} (${quoted([...rowid, ...names])})
      SELECT ${quoted([...rowid, ...names])} FROM ${table} LIMIT 1`);
  });
});
