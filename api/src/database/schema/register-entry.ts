import { integer, sqliteTable, text } from 'drizzle-orm/sqlite-core';
import { geometry } from './geometry.js';

/** A correlation is its slug and geometry; everything else stands in its revisions. */
export const correlation = sqliteTable('correlation', {
  id: integer('id').primaryKey(),
  slug: text('slug').notNull().unique(),
  geometry: text('geometry')
    .notNull()
    .references(() => geometry.slug),
  createdAt: text('created_at').notNull(),
  createdBy: text('created_by').notNull(),
});

/** A published equation for a fluid property, kept and revised like a correlation. */
export const propertyEquation = sqliteTable('property_equation', {
  id: integer('id').primaryKey(),
  slug: text('slug').notNull().unique(),
  createdAt: text('created_at').notNull(),
  createdBy: text('created_by').notNull(),
});
