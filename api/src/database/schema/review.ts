import { index, integer, sqliteTable, text, unique } from 'drizzle-orm/sqlite-core';
import { VERDICTS, type Checklist } from '../../common/verdict.js';
import { revision } from './revision.js';

/** Each time a revision was put forward, with what the machine check found. */
export const submission = sqliteTable(
  'submission',
  {
    id: integer('id').primaryKey(),
    revisionId: integer('revision_id')
      .notNull()
      .references(() => revision.id),
    hash: text('hash').notNull(),
    /** The iteration that was put forward. */
    iteration: integer('iteration').notNull().default(1),
    /** Counts how often the revision was put forward. */
    round: integer('round').notNull().default(1),
    note: text('note'),
    at: text('at').notNull(),
    byId: text('by_id').notNull(),
    byName: text('by_name').notNull(),
    /** The engine that ran the checks, and its report on each. */
    engine: text('engine').notNull(),
    report: text('report', { mode: 'json' }).$type<unknown>().notNull(),
  },
  (table) => [index('submission_by_revision').on(table.revisionId)],
);

/** Who was asked to review a revision. */
export const reviewAssignment = sqliteTable(
  'review_assignment',
  {
    id: integer('id').primaryKey(),
    revisionId: integer('revision_id')
      .notNull()
      .references(() => revision.id),
    reviewerId: text('reviewer_id').notNull(),
    at: text('at').notNull(),
    byId: text('by_id').notNull(),
  },
  (table) => [unique('assignment_once').on(table.revisionId, table.reviewerId)],
);

/** A reviewer's verdict on one content, named by its hash. */
export const review = sqliteTable(
  'review',
  {
    id: integer('id').primaryKey(),
    revisionId: integer('revision_id')
      .notNull()
      .references(() => revision.id),
    hash: text('hash').notNull(),
    /** A verdict counts for its iteration alone, even if a later one has the same hash again. */
    iteration: integer('iteration').notNull().default(1),
    round: integer('round').notNull().default(1),
    reviewerId: text('reviewer_id').notNull(),
    reviewerName: text('reviewer_name').notNull(),
    verdict: text('verdict', { enum: VERDICTS }).notNull(),
    checklist: text('checklist', { mode: 'json' }).$type<Checklist>().notNull(),
    note: text('note'),
    at: text('at').notNull(),
  },
  (table) => [index('review_by_revision').on(table.revisionId)],
);

/** A remark on one field of a content. */
export const comment = sqliteTable(
  'comment',
  {
    id: integer('id').primaryKey(),
    revisionId: integer('revision_id')
      .notNull()
      .references(() => revision.id),
    hash: text('hash').notNull(),
    iteration: integer('iteration').notNull().default(1),
    /** Path in the definition, such as `bounds.0.stretches`; empty for the whole. */
    field: text('field').notNull(),
    text: text('text').notNull(),
    byId: text('by_id').notNull(),
    byName: text('by_name').notNull(),
    at: text('at').notNull(),
  },
  (table) => [index('comment_by_revision').on(table.revisionId)],
);

/** What was said to a comment. */
export const commentAnswer = sqliteTable(
  'comment_answer',
  {
    id: integer('id').primaryKey(),
    commentId: integer('comment_id')
      .notNull()
      .references(() => comment.id),
    text: text('text').notNull(),
    byId: text('by_id').notNull(),
    byName: text('by_name').notNull(),
    at: text('at').notNull(),
  },
  (table) => [index('comment_answer_by_comment').on(table.commentId)],
);

/** That the matter of a comment is settled; once. */
export const commentResolution = sqliteTable('comment_resolution', {
  id: integer('id').primaryKey(),
  commentId: integer('comment_id')
    .notNull()
    .unique()
    .references(() => comment.id),
  byId: text('by_id').notNull(),
  byName: text('by_name').notNull(),
  at: text('at').notNull(),
});

/** An authority's signature: name, time, meaning, and the content it is bound to. One per revision, ever. */
export const approval = sqliteTable('approval', {
  id: integer('id').primaryKey(),
  revisionId: integer('revision_id')
    .notNull()
    .unique()
    .references(() => revision.id),
  hash: text('hash').notNull(),
  byId: text('by_id').notNull(),
  byName: text('by_name').notNull(),
  meaning: text('meaning').notNull(),
  note: text('note'),
  at: text('at').notNull(),
  /** The moment from which on it holds; null: that of the signature. */
  effectiveFrom: text('effective_from'),
  /** When the office wants to look at it again. */
  reviewDue: text('review_due'),
});
