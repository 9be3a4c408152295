import { sql } from 'drizzle-orm';
import { check, integer, sqliteTable, text } from 'drizzle-orm/sqlite-core';
import { person } from './people.js';

/** What the office has decided on; one row, once something differs from the defaults. */
export const settings = sqliteTable(
  'settings',
  {
    id: integer('id').primaryKey(),
    officeName: text('office_name').notNull(),
    /** How many favourable reviews an approval rests on. */
    reviewsNeeded: integer('reviews_needed').notNull(),
    /** Who confirms appointments besides the technical authorities. */
    principalId: text('principal_id').references(() => person.id),
    /** Months after which an approved revision is due for review. */
    reviewDueMonths: integer('review_due_months').notNull(),
  },
  (table) => [
    check('settings_single', sql`${table.id} = 1`),
    check('settings_reviews_needed', sql`${table.reviewsNeeded} BETWEEN 1 AND 5`),
  ],
);
