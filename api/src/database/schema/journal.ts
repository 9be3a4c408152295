import { sql } from 'drizzle-orm';
import { blob, index, integer, primaryKey, sqliteTable, text } from 'drizzle-orm/sqlite-core';

/**
 * One row an act. `entry` is the RFC 8785 text that the leaf hash covers and is the only thing stored; the other
 * columns are read out of it, so that they cannot say something else.
 */
export const journal = sqliteTable(
  'journal',
  {
    index: integer('index').primaryKey(),
    entry: text('entry').notNull(),
    at: text('at').generatedAlwaysAs(sql`(json_extract("entry", '$.at'))`, { mode: 'virtual' }),
    actorId: text('actor_id').generatedAlwaysAs(sql`(json_extract("entry", '$.actor.id'))`, {
      mode: 'virtual',
    }),
    act: text('act').generatedAlwaysAs(sql`(json_extract("entry", '$.act'))`, { mode: 'virtual' }),
    subject: text('subject').generatedAlwaysAs(sql`(json_extract("entry", '$.subject'))`, {
      mode: 'virtual',
    }),
  },
  (table) => [
    index('journal_by_actor').on(table.actorId, table.index),
    index('journal_by_subject').on(table.subject, table.index),
  ],
);

/** Hashes of the complete subtrees of the journal's Merkle tree: `position` counts those of 2^level leaves. */
export const journalNode = sqliteTable(
  'journal_node',
  {
    level: integer('level').notNull(),
    position: integer('position').notNull(),
    hash: blob('hash', { mode: 'buffer' }).notNull(),
  },
  (table) => [primaryKey({ columns: [table.level, table.position] })],
);

/** Signed heads of the journal. */
export const journalCheckpoint = sqliteTable('journal_checkpoint', {
  size: integer('size').primaryKey(),
  root: text('root').notNull(),
  at: text('at').notNull(),
  keyId: text('key_id').notNull(),
  /** The text that was signed. */
  text: text('text').notNull(),
  /** Ed25519, base64. */
  signature: text('signature').notNull(),
});

/** Public halves of every key that ever signed a checkpoint. */
export const journalKey = sqliteTable('journal_key', {
  keyId: text('key_id').primaryKey(),
  pem: text('pem').notNull(),
  since: text('since').notNull(),
});
