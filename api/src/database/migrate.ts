import { readFileSync } from 'node:fs';
import { migrate } from 'drizzle-orm/better-sqlite3/migrator';
import { inRepository } from '../config/paths.js';
import type { Connection } from './connection.js';

const OLDEST_SQLITE = [3, 51, 3] as const;

/** Refuses an SQLite that may corrupt a WAL file used by several connections (fixed in 3.51.3). */
export function assertSqliteVersion(version: string): void {
  const parts = version.split('.').map(Number);
  for (const [place, oldest] of OLDEST_SQLITE.entries()) {
    const part = parts[place] ?? 0;
    if (part > oldest) return;
    if (part < oldest) {
      throw new Error(
        `SQLite ${version} is older than ${OLDEST_SQLITE.join('.')} and may damage the database.`,
      );
    }
  }
}

export interface MigrationReport extends GuardReport {
  /** Whether there was no schema before. */
  readonly wasNew: boolean;
}

export interface GuardReport {
  /** Guards that were not there, or not as they should be, and were put in place. */
  readonly guardsSet: readonly string[];
}

/** Brings a database to the present schema and sets its guards. Throws, naming what does not hold. */
export function migrateDatabase(
  connection: Connection,
  migrationsFolder: string = inRepository('api/migrations'),
): MigrationReport {
  const { sqlite, query } = connection;
  const row = sqlite.prepare<[], { version: string }>('SELECT sqlite_version() AS version').get();
  assertSqliteVersion(row?.version ?? '0');
  const wasNew = triggersOf(sqlite).size === 0;
  // Inside the migrator's transaction this pragma does nothing, and a rebuilt table would empty its children.
  sqlite.pragma('foreign_keys = OFF');
  try {
    migrate(query, { migrationsFolder });
    assertForeignKeys(connection);
  } finally {
    sqlite.pragma('foreign_keys = ON');
  }
  return {
    wasNew,
    ...setGuards(connection, readFileSync(inRepository('api/src/database/guards.sql'), 'utf8')),
  };
}

function assertForeignKeys({ sqlite }: Connection): void {
  const broken = sqlite.pragma('foreign_key_check') as readonly {
    table: string;
    rowid: number;
    parent: string;
  }[];
  if (broken.length === 0) return;
  const lines = broken
    .slice(0, 10)
    .map(({ table, rowid, parent }) => `${table} row ${rowid} names no ${parent}`);
  throw new Error(`After migrating, ${broken.length} references lead nowhere: ${lines.join('; ')}.`);
}

const TRIGGER = /CREATE TRIGGER (\w+)[\s\S]*?\nEND;/g;

/** Sets every trigger of the text anew and makes sure that each one stands as written. */
export function setGuards({ sqlite }: Connection, text: string): GuardReport {
  const wanted = new Map(
    [...text.matchAll(TRIGGER)].map((match) => [match[1] ?? '', match[0].replace(/;$/, '')]),
  );
  const before = triggersOf(sqlite);
  const guardsSet = [...wanted].filter(([name, sql]) => before.get(name) !== sql).map(([name]) => name);
  sqlite
    .transaction(() => {
      for (const name of guardsSet) sqlite.exec(`DROP TRIGGER IF EXISTS ${name}`);
      for (const name of guardsSet) sqlite.exec(wanted.get(name) ?? '');
    })
    .immediate();
  const after = triggersOf(sqlite);
  const absent = [...wanted].filter(([name, sql]) => after.get(name) !== sql).map(([name]) => name);
  if (wanted.size === 0 || absent.length > 0)
    throw new Error(`Guards are not in place: ${absent.join(', ')}.`);
  return { guardsSet };
}

function triggersOf(sqlite: Connection['sqlite']): Map<string, string> {
  const rows = sqlite
    .prepare<[], { name: string; sql: string }>("SELECT name, sql FROM sqlite_schema WHERE type = 'trigger'")
    .all();
  return new Map(rows.map(({ name, sql }) => [name, sql]));
}
