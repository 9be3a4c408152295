import { index, integer, sqliteTable, text } from 'drizzle-orm/sqlite-core';

/** Every letter the program writes. Without a mail server this is where it is read. */
export const mail = sqliteTable(
  'mail',
  {
    id: text('id').primaryKey(),
    to: text('to').notNull(),
    subject: text('subject').notNull(),
    body: text('body').notNull(),
    writtenAt: text('written_at').notNull(),
    state: text('state', { enum: ['local', 'waiting', 'sent', 'failed'] }).notNull(),
    tries: integer('tries').notNull().default(0),
    nextTryAt: text('next_try_at'),
    sentAt: text('sent_at'),
    lastError: text('last_error'),
    /** A link that lets somebody in. Apart from the body, so that it is gone once the letter is. */
    link: text('link'),
  },
  (table) => [index('mail_due').on(table.state, table.nextTryAt)],
);
