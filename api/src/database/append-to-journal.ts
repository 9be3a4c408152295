import { and, eq, max } from 'drizzle-orm';
import type { Actor } from '../common/actor.js';
import type { Reader, Tx } from './connection.js';
import { journal, journalNode } from './schema/journal.js';
import type { Act } from '../journal/acts.js';
import { canonicalText, journalEntry, type JournalEntry, type JsonObject } from '../journal/entry.js';
import { leafHash, nodesOnAppend, type NodeLookup } from '../journal/merkle-tree.js';

/** A stored hash of the journal's tree is gone. */
export class MissingNodeError extends Error {
  override readonly name = 'MissingNodeError';

  constructor(level: number, position: number) {
    super(`The journal's subtree ${level}/${position} is missing.`);
  }
}

/** Reads a stored subtree hash; a missing one means the journal was tampered with, so nothing may be built on it. */
export function storedNodes(reader: Reader): NodeLookup {
  return (level, position) => {
    const row = reader
      .select({ hash: journalNode.hash })
      .from(journalNode)
      .where(and(eq(journalNode.level, level), eq(journalNode.position, position)))
      .get();
    if (row === undefined) throw new MissingNodeError(level, position);
    return row.hash;
  };
}

/** Number of leaves of the journal's tree. Counted there, so that a row cut off at the end leaves a visible gap. */
export function journalSize(reader: Reader): number {
  const row = reader
    .select({ last: max(journalNode.position) })
    .from(journalNode)
    .where(eq(journalNode.level, 0))
    .get();
  return (row?.last ?? -1) + 1;
}

/** Puts one entry at the journal's end, inside the caller's transaction. */
export function appendToJournal(
  tx: Tx,
  at: string,
  actor: Actor,
  act: Act,
  subject: string,
  detail: JsonObject,
): JournalEntry {
  const entry = journalEntry(journalSize(tx), at, actor, act, subject, detail);
  const text = canonicalText(entry);
  tx.insert(journal).values({ index: entry.index, entry: text }).run();
  tx.insert(journalNode)
    .values(nodesOnAppend(entry.index, leafHash(text), storedNodes(tx)))
    .run();
  return entry;
}
