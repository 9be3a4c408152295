import { Injectable } from '@nestjs/common';
import { and, asc, desc, eq, gte, lt } from 'drizzle-orm';
import { Connection, type Reader, type Tx } from '../database/connection.js';
import { journal, journalCheckpoint, journalKey, journalNode } from '../database/schema/journal.js';

export interface JournalRow {
  readonly index: number;
  readonly entry: string;
}

export type CheckpointRow = typeof journalCheckpoint.$inferSelect;
export type KeyRow = typeof journalKey.$inferSelect;

/** Reads the journal; entries are written by `Writer` alone. */
@Injectable()
export class JournalRepository {
  constructor(private readonly connection: Connection) {}

  /** Entries below an index, the latest first. */
  latestBelow(index: number, limit: number, subject: string | undefined): JournalRow[] {
    const below = lt(journal.index, index);
    return this.connection.reader
      .select({ index: journal.index, entry: journal.entry })
      .from(journal)
      .where(subject === undefined ? below : and(below, eq(journal.subject, subject)))
      .orderBy(desc(journal.index))
      .limit(limit)
      .all();
  }

  /** Entries from an index on, in order. */
  from(index: number, limit: number): JournalRow[] {
    return this.connection.reader
      .select({ index: journal.index, entry: journal.entry })
      .from(journal)
      .where(gte(journal.index, index))
      .orderBy(asc(journal.index))
      .limit(limit)
      .all();
  }

  /** Stored hashes of one level, in order from a position on. */
  nodes(level: number, position: number, limit: number): { position: number; hash: Buffer }[] {
    return this.connection.reader
      .select({ position: journalNode.position, hash: journalNode.hash })
      .from(journalNode)
      .where(and(eq(journalNode.level, level), gte(journalNode.position, position)))
      .orderBy(asc(journalNode.position))
      .limit(limit)
      .all();
  }

  checkpoints(): CheckpointRow[] {
    return this.connection.reader.select().from(journalCheckpoint).orderBy(asc(journalCheckpoint.size)).all();
  }

  lastCheckpointSize(reader: Reader = this.connection.reader): number {
    const row = reader
      .select({ size: journalCheckpoint.size })
      .from(journalCheckpoint)
      .orderBy(desc(journalCheckpoint.size))
      .limit(1)
      .get();
    return row?.size ?? 0;
  }

  keys(): KeyRow[] {
    return this.connection.reader.select().from(journalKey).orderBy(asc(journalKey.since)).all();
  }

  insertCheckpoint(tx: Tx, row: CheckpointRow): void {
    tx.insert(journalCheckpoint).values(row).run();
  }

  insertKey(tx: Tx, row: KeyRow): void {
    tx.insert(journalKey).values(row).run();
  }
}
