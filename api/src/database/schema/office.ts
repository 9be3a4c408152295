import { sql } from 'drizzle-orm';
import { check, integer, sqliteTable, text } from 'drizzle-orm/sqlite-core';

/** The office itself: one row, written when the database is new. */
export const office = sqliteTable(
  'office',
  {
    id: integer('id').primaryKey(),
    foundedAt: text('founded_at').notNull(),
    /** Whether the office and its people are invented, for showing the program. */
    demo: integer('demo', { mode: 'boolean' }).notNull(),
  },
  (table) => [check('office_single', sql`${table.id} = 1`)],
);
