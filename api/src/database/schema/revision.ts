import { sql } from 'drizzle-orm';
import { check, index, integer, sqliteTable, sqliteView, text, unique } from 'drizzle-orm/sqlite-core';
import { STANDINGS, WITHDRAWAL_CLASSES } from '../../common/standing.js';
import { correlation, propertyEquation } from './register-entry.js';

/** One revision of a correlation or of a property equation: its identity and number, never its content. */
export const revision = sqliteTable(
  'revision',
  {
    id: integer('id').primaryKey(),
    correlationId: integer('correlation_id').references(() => correlation.id),
    propertyEquationId: integer('property_equation_id').references(() => propertyEquation.id),
    number: integer('number').notNull(),
    originatorId: text('originator_id').notNull(),
    createdAt: text('created_at').notNull(),
  },
  (table) => [
    unique('revision_of_correlation').on(table.correlationId, table.number),
    unique('revision_of_property_equation').on(table.propertyEquationId, table.number),
    check('revision_has_one_subject', sql`(correlation_id IS NULL) <> (property_equation_id IS NULL)`),
  ],
);

/** What a revision said at one iteration. Never changed: a change of content is a further iteration. */
export const revisionContent = sqliteTable(
  'revision_content',
  {
    id: integer('id').primaryKey(),
    revisionId: integer('revision_id')
      .notNull()
      .references(() => revision.id),
    iteration: integer('iteration').notNull(),
    format: text('format').notNull(),
    /** The definition as RFC 8785 canonical JSON; the hash is of exactly this text in UTF-8. */
    canonicalText: text('canonical_text').notNull(),
    hash: text('hash').notNull(),
    title: text('title')
      .notNull()
      .generatedAlwaysAs(sql`json_extract(canonical_text, '$.title')`, { mode: 'stored' }),
    /** Null for a property equation. */
    phase: text('phase').generatedAlwaysAs(sql`json_extract(canonical_text, '$.phase')`, { mode: 'stored' }),
    at: text('at').notNull(),
    byId: text('by_id').notNull(),
  },
  (table) => [unique('content_iteration').on(table.revisionId, table.iteration)],
);

/** Every standing a revision has had; the last one holds. Standing is never part of the hashed content. */
export const standingEvent = sqliteTable(
  'standing_event',
  {
    id: integer('id').primaryKey(),
    revisionId: integer('revision_id')
      .notNull()
      .references(() => revision.id),
    standing: text('standing', { enum: STANDINGS }).notNull(),
    /** The content it speaks of. */
    hash: text('hash').notNull(),
    at: text('at').notNull(),
    byId: text('by_id').notNull(),
    byName: text('by_name').notNull(),
    note: text('note'),
    withdrawalClass: text('withdrawal_class', { enum: WITHDRAWAL_CLASSES }),
    /** Of a withdrawal: slug of the correlation to turn to instead. */
    successor: text('successor'),
    /** Of a suspension: the report that is being looked into. */
    problemReportId: integer('problem_report_id'),
  },
  (table) => [index('standing_event_by_revision').on(table.revisionId, table.id)],
);

/**
 * Each revision with its last standing and its latest content: a view of the tables above, so that it cannot say
 * anything else. Made in the migrations. An approved revision whose `supersededFrom` has come is superseded by then,
 * whether or not that was written down: ask `standingAt`, which knows the time, and not `standing`.
 */
export const revisionNow = sqliteView('revision_now', {
  id: integer('id').notNull(),
  kind: text('kind', { enum: ['correlation', 'property-equation'] }).notNull(),
  slug: text('slug').notNull(),
  /** Null for a property equation. */
  geometry: text('geometry'),
  number: integer('number').notNull(),
  originatorId: text('originator_id').notNull(),
  createdAt: text('created_at').notNull(),
  standing: text('standing', { enum: STANDINGS }).notNull(),
  standingAt: text('standing_at').notNull(),
  standingNote: text('standing_note'),
  contentId: integer('content_id').notNull(),
  iteration: integer('iteration').notNull(),
  hash: text('hash').notNull(),
  title: text('title').notNull(),
  phase: text('phase'),
  effectiveFrom: text('effective_from'),
  reviewDue: text('review_due'),
  /** When a later approved revision takes its place, and the number of that one. */
  supersededFrom: text('superseded_from'),
  supersededBy: integer('superseded_by'),
}).existing();
