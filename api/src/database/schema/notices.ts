import { index, integer, primaryKey, sqliteTable, text, uniqueIndex } from 'drizzle-orm/sqlite-core';
import { NOTICE_KINDS } from '../../common/notice-kinds.js';
import { person } from './people.js';

/** What somebody was told, and when it was read. */
export const notice = sqliteTable(
  'notice',
  {
    id: integer('id').primaryKey({ autoIncrement: true }),
    personId: text('person_id')
      .notNull()
      .references(() => person.id),
    kind: text('kind', { enum: NOTICE_KINDS }).notNull(),
    text: text('text').notNull(),
    /** Where to go in the screens: a path. */
    href: text('href').notNull(),
    at: text('at').notNull(),
    readAt: text('read_at'),
    /** Of a reminder: what it must not be repeated for. */
    onceKey: text('once_key'),
  },
  (table) => [
    index('notice_by_person').on(table.personId, table.id),
    uniqueIndex('notice_once').on(table.personId, table.onceKey),
  ],
);

/** What somebody chose on a kind of notice; without a row it comes by mail. */
export const noticePreference = sqliteTable(
  'notice_preference',
  {
    personId: text('person_id')
      .notNull()
      .references(() => person.id),
    kind: text('kind', { enum: NOTICE_KINDS }).notNull(),
    mail: integer('mail', { mode: 'boolean' }).notNull(),
  },
  (table) => [primaryKey({ columns: [table.personId, table.kind] })],
);
