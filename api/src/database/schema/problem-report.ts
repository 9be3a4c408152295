import { index, integer, sqliteTable, text } from 'drizzle-orm/sqlite-core';
import { REPORT_OUTCOMES, REPORT_SEVERITIES } from '../../common/problem-report.js';
import { revision } from './revision.js';

/** What somebody found wrong with a revision, or asks about it. */
export const problemReport = sqliteTable(
  'problem_report',
  {
    id: integer('id').primaryKey(),
    revisionId: integer('revision_id')
      .notNull()
      .references(() => revision.id),
    hash: text('hash').notNull(),
    severity: text('severity', { enum: REPORT_SEVERITIES }).notNull(),
    text: text('text').notNull(),
    byId: text('by_id').notNull(),
    byName: text('by_name').notNull(),
    at: text('at').notNull(),
  },
  (table) => [index('problem_report_by_revision').on(table.revisionId)],
);

/** What a technical authority found; closes the report. */
export const problemReportAnswer = sqliteTable('problem_report_answer', {
  id: integer('id').primaryKey(),
  reportId: integer('report_id')
    .notNull()
    .unique()
    .references(() => problemReport.id),
  outcome: text('outcome', { enum: REPORT_OUTCOMES }).notNull(),
  text: text('text').notNull(),
  byId: text('by_id').notNull(),
  byName: text('by_name').notNull(),
  at: text('at').notNull(),
});
