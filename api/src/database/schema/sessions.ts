import { index, sqliteTable, text } from 'drizzle-orm/sqlite-core';
import { person } from './people.js';

/** Sessions under the SHA-256 of their id: who reads the table cannot step into one. */
export const session = sqliteTable(
  'session',
  {
    idHash: text('id_hash').primaryKey(),
    personId: text('person_id')
      .notNull()
      .references(() => person.id),
    startedAt: text('started_at').notNull(),
    seenAt: text('seen_at').notNull(),
    /** Ends when not used until then; moves with use. */
    idleUntil: text('idle_until').notNull(),
    /** Ends then in any case. */
    endsAt: text('ends_at').notNull(),
    /** What the browser said of itself, so that people recognise their sessions. */
    agent: text('agent'),
  },
  (table) => [index('session_by_person').on(table.personId), index('session_by_end').on(table.endsAt)],
);
