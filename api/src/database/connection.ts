import BetterSqlite from 'better-sqlite3';
import { drizzle, type BetterSQLite3Database } from 'drizzle-orm/better-sqlite3';

export type Query = BetterSQLite3Database;

/** What a repository gets inside `Writer.write`. */
export type Tx = Parameters<Parameters<Query['transaction']>[0]>[0];

/** What reading needs; a transaction serves as one too. Writing goes through `Writer` alone. */
export type Reader = Pick<Query, 'select' | 'selectDistinct' | '$count' | 'all' | 'get'>;

const BUSY_TIMEOUT_MS = 5000;

/** Opens an SQLite file with the settings that hold for every connection of this program. */
export function openSqlite(
  file: string,
  options: { readonly: boolean } = { readonly: false },
): BetterSqlite.Database {
  const sqlite = new BetterSqlite(file, { readonly: options.readonly, timeout: BUSY_TIMEOUT_MS });
  if (!options.readonly) sqlite.pragma('journal_mode = WAL');
  // The build's default for WAL is NORMAL, which may lose an acknowledged commit when the power fails.
  sqlite.pragma('synchronous = FULL');
  sqlite.pragma('foreign_keys = ON');
  sqlite.pragma(`busy_timeout = ${BUSY_TIMEOUT_MS}`);
  sqlite.pragma('trusted_schema = OFF');
  return sqlite;
}

/** The server's one writing connection. Inject it for reading, `Writer` for writing. */
export class Connection {
  readonly reader: Reader;
  /** For `Writer` and the repositories' prepared full-text statements. */
  readonly query: Query;

  constructor(readonly sqlite: BetterSqlite.Database) {
    this.query = drizzle({ client: sqlite });
    this.reader = this.query;
  }

  static open(file: string): Connection {
    return new Connection(openSqlite(file));
  }

  close(): void {
    this.sqlite.close();
  }
}
