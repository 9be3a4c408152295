import { cpSync, mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { migrate } from 'drizzle-orm/better-sqlite3/migrator';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { inRepository } from '../src/config/paths.js';
import { Connection, openSqlite } from '../src/database/connection.js';
import { assertSqliteVersion, migrateDatabase, setGuards } from '../src/database/migrate.js';
import { setAsideUnfinished } from '../src/database/set-aside-unfinished.js';

let folder: string;
let connection: Connection;

beforeEach(() => {
  folder = mkdtempSync(join(tmpdir(), 'merestone-migrations-'));
  connection = Connection.open(join(folder, 'office.sqlite'));
});
afterEach(() => {
  if (connection.sqlite.open) connection.close();
  rmSync(folder, { recursive: true, force: true });
});

const one = (sql: string): unknown => connection.sqlite.prepare(sql).pluck().get();

/** The real migrations with one more that rebuilds a table in the way that drizzle-kit writes it. */
function withRebuild(sql: string): string {
  const target = join(folder, 'migrations');
  cpSync(inRepository('api/migrations'), target, { recursive: true });
  const journalFile = join(target, 'meta', '_journal.json');
  const journal = JSON.parse(readFileSync(journalFile, 'utf8')) as {
    entries: { idx: number; when: number; tag: string }[];
  };
  const last = journal.entries.at(-1);
  journal.entries.push({
    ...last,
    idx: journal.entries.length,
    when: (last?.when ?? 0) + 1000,
    tag: '9999_rebuild',
  });
  writeFileSync(journalFile, JSON.stringify(journal));
  writeFileSync(join(target, '9999_rebuild.sql'), sql);
  return target;
}

const REBUILD_PERSON = `PRAGMA foreign_keys=OFF;--> statement-breakpoint
CREATE TABLE __new_person (id text PRIMARY KEY NOT NULL, name text NOT NULL, email text NOT NULL,
  password_hash text, active integer DEFAULT true NOT NULL, created_at text NOT NULL, note text);--> statement-breakpoint
INSERT INTO __new_person (id, name, email, password_hash, active, created_at)
  SELECT id, name, email, password_hash, active, created_at FROM person;--> statement-breakpoint
DROP TABLE person;--> statement-breakpoint
ALTER TABLE __new_person RENAME TO person;--> statement-breakpoint
PRAGMA foreign_keys=ON;`;

function addSomebody(): void {
  connection.sqlite.exec(`
    INSERT INTO person (id, name, email, created_at) VALUES ('p', 'Anna', 'anna@office.example', 'now');
    INSERT INTO person_role VALUES ('p', 'engineer'), ('p', 'reviewer');
    INSERT INTO session (id_hash, person_id, started_at, seen_at, idle_until, ends_at)
      VALUES ('h', 'p', 'a', 'b', 'c', 'd');`);
}

describe('a connection', () => {
  it('is durable, checked and patient', () => {
    expect(one('PRAGMA journal_mode')).toBe('wal');
    expect(one('PRAGMA synchronous')).toBe(2);
    expect(one('PRAGMA foreign_keys')).toBe(1);
    expect(one('PRAGMA busy_timeout')).toBe(5000);
    const second = openSqlite(join(folder, 'office.sqlite'), { readonly: true });
    expect(second.pragma('synchronous', { simple: true })).toBe(2);
    second.close();
  });

  it('does not take a double-quoted word for text', () => {
    expect(() => one('SELECT "no such column"')).toThrow(/no such column/);
  });
});

describe('migrating', () => {
  it('brings up a new file, again and again', () => {
    expect(migrateDatabase(connection).wasNew).toBe(true);
    const schema = connection.sqlite.prepare('SELECT name, sql FROM sqlite_schema ORDER BY name').all();
    expect(migrateDatabase(connection)).toEqual({ wasNew: false, guardsSet: [] });

    expect(connection.sqlite.prepare('SELECT name, sql FROM sqlite_schema ORDER BY name').all()).toEqual(
      schema,
    );
    expect(one('PRAGMA foreign_keys')).toBe(1);
    expect(one('PRAGMA integrity_check')).toBe('ok');
  });

  it('keeps the rows of child tables when their parent is rebuilt, and sets the guards that went with it', () => {
    migrateDatabase(connection);
    addSomebody();

    const { guardsSet } = migrateDatabase(connection, withRebuild(REBUILD_PERSON));

    expect(one('SELECT count(*) FROM person')).toBe(1);
    expect(one('SELECT count(*) FROM person_role')).toBe(2);
    expect(one('SELECT count(*) FROM session')).toBe(1);
    expect(one("SELECT count(*) FROM pragma_table_info('person') WHERE name = 'note'")).toBe(1);
    expect(guardsSet).toEqual(['person_keeps_all', 'person_keeps_places']);
    expect(() => connection.sqlite.exec('DELETE FROM person')).toThrow(/made inactive/);
  });

  it('does not go on when references lead nowhere afterwards', () => {
    migrateDatabase(connection);
    addSomebody();
    const losing = withRebuild(REBUILD_PERSON.replace('FROM person;', 'FROM person WHERE false;'));

    expect(() => migrateDatabase(connection, losing)).toThrow(/references lead nowhere: .*names no person/);
    expect(one('PRAGMA foreign_keys')).toBe(1);
  });
});

/** The migrations up to one, as an office had them before the next came. */
function upTo(count: number): string {
  const target = join(folder, 'former-migrations');
  cpSync(inRepository('api/migrations'), target, { recursive: true });
  const journalFile = join(target, 'meta', '_journal.json');
  const journal = JSON.parse(readFileSync(journalFile, 'utf8')) as { entries: unknown[] };
  writeFileSync(journalFile, JSON.stringify({ ...journal, entries: journal.entries.slice(0, count) }));
  return target;
}

describe('the migration that brings rounds of review', () => {
  /** Two iterations; the first was recommended, changed, and changed back to the same words. */
  const FORMER_ROWS = `
    INSERT INTO geometry VALUES ('pipe', 'Pipe', '', '', '', '[]');
    INSERT INTO correlation VALUES (1, 'one', 'pipe', 't0', 'p');
    INSERT INTO revision VALUES (1, 1, NULL, 1, 'p', 't0');
    INSERT INTO revision_content (id, revision_id, iteration, format, canonical_text, hash, at, by_id) VALUES
      (1, 1, 1, 'f', '{"title":"a"}', 'A', 't0', 'p'),
      (2, 1, 2, 'f', '{"title":"b"}', 'B', 't3', 'p'),
      (3, 1, 3, 'f', '{"title":"a"}', 'A', 't5', 'p');
    INSERT INTO standing_event VALUES (1, 1, 'approved', 'A', 't9', 'p', 'P', NULL, NULL);
    INSERT INTO submission VALUES (1, 1, 'A', 't1', 'p', 'P', 'e', '[]'), (2, 1, 'A', 't6', 'p', 'P', 'e', '[]');
    INSERT INTO review VALUES
      (1, 1, 'A', 'r', 'R', 'recommend', '{}', NULL, 't2'), (2, 1, 'A', 'r', 'R', 'recommend', '{}', NULL, 't7');
    INSERT INTO comment VALUES (1, 1, 'B', '', 'x', 'p', 'P', 't4');
    INSERT INTO approval VALUES (1, 1, 'A', 'a', 'A', 'm', NULL, 't9');`;

  it('keeps every row and says of each which iteration and round it belongs to', () => {
    const guards = readFileSync(inRepository('api/src/database/guards.sql'), 'utf8');
    const former = upTo(4);
    connection.sqlite.pragma('foreign_keys = OFF');
    migrate(connection.query, { migrationsFolder: former });
    // The guards of these tables were there then, too.
    for (const table of ['submission', 'review', 'comment']) {
      const trigger = new RegExp(`CREATE TRIGGER ${table}_keeps_rows[\\s\\S]*?\\nEND;`).exec(guards);
      connection.sqlite.exec(trigger?.[0] ?? '');
    }
    connection.sqlite.exec(FORMER_ROWS);

    migrateDatabase(connection);

    const rows = (sql: string): unknown[] => connection.sqlite.prepare(sql).raw().all();
    expect(rows('SELECT id, iteration, round FROM submission')).toEqual([
      [1, 1, 1],
      [2, 3, 2],
    ]);
    expect(rows('SELECT id, iteration, round FROM review')).toEqual([
      [1, 1, 1],
      [2, 3, 2],
    ]);
    expect(rows('SELECT id, iteration FROM comment')).toEqual([[1, 2]]);
    expect(rows('SELECT standing, effective_from, superseded_from FROM revision_now')).toEqual([
      ['approved', 't9', null],
    ]);
    expect(() => connection.sqlite.exec("UPDATE review SET verdict = 'decline'")).toThrow(
      /cannot be changed/,
    );
  });
});

describe('guards', () => {
  it('are set again when one is gone or was changed', () => {
    migrateDatabase(connection);
    connection.sqlite.exec(`DROP TRIGGER journal_keeps_all; DROP TRIGGER journal_keeps_rows;
      CREATE TRIGGER journal_keeps_rows BEFORE UPDATE ON journal BEGIN SELECT 1; END;`);

    expect(migrateDatabase(connection).guardsSet).toEqual(['journal_keeps_rows', 'journal_keeps_all']);
    expect(migrateDatabase(connection).guardsSet).toEqual([]);
  });

  it('stop the start when they cannot be set', () => {
    migrateDatabase(connection);
    expect(() => setGuards(connection, 'nothing of use')).toThrow(/not in place/);
    expect(() =>
      setGuards(connection, 'CREATE TRIGGER a BEFORE DELETE ON nowhere\nBEGIN\n  SELECT 1;\nEND;'),
    ).toThrow();
  });

  it('stand for every trigger that the file declares', () => {
    migrateDatabase(connection);
    const text = readFileSync(inRepository('api/src/database/guards.sql'), 'utf8');
    const declared = [...text.matchAll(/CREATE TRIGGER (\w+)/g)].map(([, name]) => name);
    const there = connection.sqlite
      .prepare("SELECT name FROM sqlite_schema WHERE type = 'trigger'")
      .pluck()
      .all();

    expect(there.toSorted()).toEqual(declared.toSorted());
  });
});

describe('the version of SQLite', () => {
  it.each(['3.51.3', '3.51.10', '3.53.2', '4.0.0'])('%s is taken', (version) => {
    expect(() => assertSqliteVersion(version)).not.toThrow();
  });

  it.each(['3.51.2', '3.50.9', '2.99.99', '', 'x'])('"%s" is refused', (version) => {
    expect(() => assertSqliteVersion(version)).toThrow(/older than 3\.51\.3/);
  });
});

describe('a set-up that was interrupted', () => {
  const at = new Date('2026-01-02T03:04:05.678Z');

  it('is moved aside, so that the start begins again', () => {
    migrateDatabase(connection);
    addSomebody();
    connection.close();
    const file = join(folder, 'office.sqlite');

    const aside = setAsideUnfinished(file, at);

    expect(aside).toBe(`${file}.unfinished-20260102T030405678Z`);
    expect(setAsideUnfinished(file, at)).toBeUndefined();
    const kept = openSqlite(aside ?? '');
    expect(kept.prepare('SELECT count(*) FROM person').pluck().get()).toBe(1);
    kept.close();
  });

  it('is told from an office that was founded', () => {
    migrateDatabase(connection);
    connection.sqlite.exec("INSERT INTO office VALUES (1, 'now', 0)");
    connection.close();

    expect(setAsideUnfinished(join(folder, 'office.sqlite'), at)).toBeUndefined();
  });
});
