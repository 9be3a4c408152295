import { index, sqliteTable, text } from 'drizzle-orm/sqlite-core';
import { person } from './people.js';

/** Links that let somebody in once, under the SHA-256 of their token: who reads the table cannot follow one. */
export const oneTimeLink = sqliteTable(
  'one_time_link',
  {
    tokenHash: text('token_hash').primaryKey(),
    purpose: text('purpose', { enum: ['first-administrator', 'invitation', 'password-reset'] }).notNull(),
    /** Whom it lets in; null for the first administrator, who is nobody yet, and where nobody was found to let in. */
    personId: text('person_id').references(() => person.id),
    madeAt: text('made_at').notNull(),
    expiresAt: text('expires_at').notNull(),
    /** When it was used, or another took its place. */
    endedAt: text('ended_at'),
    ending: text('ending', { enum: ['used', 'replaced'] }),
  },
  (table) => [index('one_time_link_by_person').on(table.personId, table.purpose)],
);
