import type BetterSqlite from 'better-sqlite3';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { openSqlite } from '../src/database/connection.js';
import { OfficeService } from '../src/people/office.service.js';
import { createTestApp, type TestApp } from './support/create-test-app.js';
import { addPerson } from './support/people.js';

let office: TestApp;
/** A second connection, as of somebody with the file and an SQL prompt. */
let raw: BetterSqlite.Database;

beforeAll(async () => {
  office = await createTestApp();
  for (let count = 0; count < 4; count += 1) await addPerson(office);
  office.app.get(OfficeService).found(false);
  raw = openSqlite(office.databaseFile);
});
afterAll(async () => {
  raw.close();
  await office.close();
});

const rowsOf = (table: string): unknown[] => raw.prepare(`SELECT * FROM ${table}`).all();

function refused(sql: string, table: string, reason: RegExp): void {
  const before = rowsOf(table);
  expect(before.length).toBeGreaterThan(0);
  expect(() => raw.exec(sql)).toThrow(reason);
  expect(rowsOf(table)).toEqual(before);
}

describe('the journal', () => {
  it.each([
    [`UPDATE journal SET entry = '{}' WHERE "index" = 1`, /cannot be changed/],
    [`UPDATE journal SET "index" = 99 WHERE "index" = 1`, /cannot be changed/],
    [`UPDATE OR REPLACE journal SET "index" = 2 WHERE "index" = 1`, /cannot be changed/],
    ['DELETE FROM journal', /cannot be removed/],
    ['DELETE FROM journal WHERE "index" = 1', /cannot be removed/],
    [`INSERT OR REPLACE INTO journal ("index", entry) VALUES (1, '{}')`, /cannot be replaced/],
    [`REPLACE INTO journal ("index", entry) VALUES (1, '{}')`, /cannot be replaced/],
    [`INSERT OR REPLACE INTO journal (rowid, entry) VALUES (1, '{}')`, /cannot be replaced/],
    [
      `INSERT INTO journal ("index", entry) VALUES (1, '{}') ON CONFLICT DO UPDATE SET entry = '{}'`,
      /cannot be/,
    ],
  ])('refuses %s', (sql, reason) => {
    refused(sql, 'journal', reason);
  });

  it.each([
    [`UPDATE journal_node SET hash = x'00'`, /cannot be changed/],
    ['DELETE FROM journal_node', /cannot be removed/],
    [`INSERT OR REPLACE INTO journal_node VALUES (0, 1, x'00')`, /cannot be replaced/],
    [
      `INSERT OR REPLACE INTO journal_node (rowid, level, position, hash) VALUES (1, 40, 0, x'00')`,
      /cannot be replaced/,
    ],
  ])('keeps its hashes from %s', (sql, reason) => {
    refused(sql, 'journal_node', reason);
  });

  it.each([
    [`UPDATE journal_key SET pem = ''`, /cannot be changed/],
    ['DELETE FROM journal_key', /cannot be removed/],
    [`INSERT OR REPLACE INTO journal_key SELECT key_id, '', since FROM journal_key`, /cannot be replaced/],
    [
      `INSERT OR REPLACE INTO journal_key (rowid, key_id, pem, since) VALUES (1, 'x', '', '')`,
      /cannot be replaced/,
    ],
  ])('keeps its keys from %s', (sql, reason) => {
    refused(sql, 'journal_key', reason);
  });
});

describe('people', () => {
  it.each([
    ['DELETE FROM person', /made inactive/],
    [
      `INSERT OR REPLACE INTO person SELECT id, 'x', email, null, 1, '' FROM person LIMIT 1`,
      /exists already/,
    ],
    [
      `INSERT OR REPLACE INTO person SELECT 'x', 'x', email, null, 1, '' FROM person LIMIT 1`,
      /exists already/,
    ],
    [
      `INSERT OR REPLACE INTO person (rowid, id, name, email, created_at) VALUES (1, 'x', 'x', 'x', '')`,
      /exists already/,
    ],
    [
      `INSERT INTO person (id, name, email, created_at) VALUES ('y', 'y', 'Y@office.example', '')`,
      /person_email_lower/,
    ],
  ])('are kept from %s', (sql, reason) => {
    refused(sql, 'person', reason);
  });

  it('are never administrator and technical authority at once, in whatever order', () => {
    const { id } = raw.prepare<[], { id: string }>('SELECT id FROM person LIMIT 1').get() ?? { id: '' };
    const give = raw.prepare('INSERT INTO person_role (person_id, role) VALUES (?, ?)');
    const take = raw.prepare('DELETE FROM person_role WHERE person_id = ? AND role = ?');
    for (const [one, other] of [
      ['administrator', 'authority'],
      ['authority', 'administrator'],
    ]) {
      give.run(id, one);
      expect(() => give.run(id, other)).toThrow(/cannot be a technical authority/);
      expect(() =>
        raw
          .prepare('UPDATE person_role SET role = ? WHERE person_id = ? AND role = ?')
          .run(other, id, 'engineer'),
      ).toThrow(/given and taken/);
      take.run(id, one);
    }
  });

  it('have only roles that there are', () => {
    refused(
      `INSERT INTO person_role SELECT id, 'owner' FROM person LIMIT 1`,
      'person_role',
      /person_role_known/,
    );
  });
});

describe('the office', () => {
  it.each([
    ['UPDATE office SET demo = 1', /founded anew/],
    ['DELETE FROM office', /cannot be removed/],
    [`INSERT OR REPLACE INTO office VALUES (1, '', 1)`, /founded already/],
    [`INSERT INTO office VALUES (2, '', 1)`, /founded already/],
  ])('is kept from %s', (sql, reason) => {
    refused(sql, 'office', reason);
  });
});
