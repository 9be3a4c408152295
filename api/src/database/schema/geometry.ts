import { sqliteTable, text } from 'drizzle-orm/sqlite-core';

/** What correlations were measured on. */
export const geometry = sqliteTable('geometry', {
  slug: text('slug').primaryKey(),
  name: text('name').notNull(),
  summary: text('summary').notNull(),
  characteristicLength: text('characteristic_length').notNull(),
  velocity: text('velocity').notNull(),
  cautions: text('cautions', { mode: 'json' }).$type<string[]>().notNull(),
});
