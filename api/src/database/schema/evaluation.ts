import { index, integer, sqliteTable, text } from 'drizzle-orm/sqlite-core';
import { STANDINGS } from '../../common/standing.js';
import { revision } from './revision.js';

export interface Provenance {
  slug: string;
  revision: number;
  hash: string;
  /** Name and version of the engine. */
  engine: string;
  equations: { key: string; revision: number; hash: string }[];
  rows: Record<string, string>;
}

/** Every evaluation that gave a number, kept whole: what went in, what came out, by which content. */
export const evaluation = sqliteTable(
  'evaluation',
  {
    id: text('id').primaryKey(),
    revisionId: integer('revision_id')
      .notNull()
      .references(() => revision.id),
    standing: text('standing', { enum: STANDINGS }).notNull(),
    personId: text('person_id').notNull(),
    personName: text('person_name').notNull(),
    at: text('at').notNull(),
    outcome: text('outcome', { enum: ['within', 'unchecked', 'deviating'] }).notNull(),
    request: text('request', { mode: 'json' }).$type<unknown>().notNull(),
    response: text('response', { mode: 'json' }).$type<unknown>().notNull(),
    provenance: text('provenance', { mode: 'json' }).$type<Provenance>().notNull(),
  },
  (table) => [
    index('evaluation_by_revision').on(table.revisionId),
    index('evaluation_by_person').on(table.personId, table.at),
  ],
);
