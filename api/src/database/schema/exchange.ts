import { integer, primaryKey, sqliteTable, text } from 'drizzle-orm/sqlite-core';

/** People named by records that came from another office; they are nobody here and sign in nowhere. */
export const formerPerson = sqliteTable('former_person', {
  id: text('id').primaryKey(),
  name: text('name').notNull(),
});

/** Journals of the offices that a register came from, the earliest first, as they were when it left. */
export const formerJournal = sqliteTable('former_journal', {
  place: integer('place').primaryKey(),
  /** Signed heads and public keys, as JSON. */
  checkpoints: text('checkpoints').notNull(),
  keys: text('keys').notNull(),
});

/** The entries of such a journal: canonical texts, which its own hashes cover. */
export const formerJournalEntry = sqliteTable(
  'former_journal_entry',
  {
    place: integer('place')
      .notNull()
      .references(() => formerJournal.place),
    index: integer('index').notNull(),
    entry: text('entry').notNull(),
  },
  (table) => [primaryKey({ columns: [table.place, table.index] })],
);
