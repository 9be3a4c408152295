import { existsSync, renameSync } from 'node:fs';
import BetterSqlite from 'better-sqlite3';

/**
 * Moves a database out of the way whose setting up was interrupted. Until the office is founded nobody was let in, so
 * nothing of anybody's is in it, and the start begins again from nothing. Returns where it was moved to.
 */
export function setAsideUnfinished(file: string, at: Date): string | undefined {
  if (!existsSync(file) || isFounded(file)) return undefined;
  const aside = `${file}.unfinished-${at.toISOString().replaceAll(/[^0-9TZ]/g, '')}`;
  for (const ending of ['-wal', '-shm', '']) {
    if (existsSync(file + ending)) renameSync(file + ending, aside + ending);
  }
  return aside;
}

function isFounded(file: string): boolean {
  const sqlite = new BetterSqlite(file);
  try {
    const table = sqlite
      .prepare("SELECT 1 FROM sqlite_schema WHERE type = 'table' AND name = 'office'")
      .get();
    return table !== undefined && sqlite.prepare('SELECT 1 FROM office').get() !== undefined;
  } finally {
    sqlite.close();
  }
}
