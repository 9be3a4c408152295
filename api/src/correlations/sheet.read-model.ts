import { Injectable } from '@nestjs/common';
import { and, asc, count, desc, eq, isNull } from 'drizzle-orm';
import { Connection, type Reader } from '../database/connection.js';
import { evaluation } from '../database/schema/evaluation.js';
import { problemReport, problemReportAnswer } from '../database/schema/problem-report.js';
import { approval, comment, review, submission } from '../database/schema/review.js';
import { standingEvent } from '../database/schema/revision.js';

export type HistoryRow = typeof standingEvent.$inferSelect;
export type ReviewRow = typeof review.$inferSelect;
export type CommentRow = typeof comment.$inferSelect;
export type ApprovalRow = typeof approval.$inferSelect;
export type SubmissionRow = typeof submission.$inferSelect;

/** What stands on record about one revision. */
export interface RevisionFile {
  readonly history: readonly HistoryRow[];
  readonly reviews: readonly ReviewRow[];
  readonly comments: readonly CommentRow[];
  readonly approval: ApprovalRow | undefined;
  /** The last time it was put forward. */
  readonly submission: SubmissionRow | undefined;
  readonly openReports: number;
  readonly evaluations: number;
}

@Injectable()
export class SheetReadModel {
  constructor(private readonly connection: Connection) {}

  file(revisionId: number, reader: Reader = this.connection.reader): RevisionFile {
    return {
      history: reader
        .select()
        .from(standingEvent)
        .where(eq(standingEvent.revisionId, revisionId))
        .orderBy(asc(standingEvent.id))
        .all(),
      reviews: reader
        .select()
        .from(review)
        .where(eq(review.revisionId, revisionId))
        .orderBy(asc(review.id))
        .all(),
      comments: reader
        .select()
        .from(comment)
        .where(eq(comment.revisionId, revisionId))
        .orderBy(asc(comment.id))
        .all(),
      approval: reader.select().from(approval).where(eq(approval.revisionId, revisionId)).get(),
      submission: reader
        .select()
        .from(submission)
        .where(eq(submission.revisionId, revisionId))
        .orderBy(desc(submission.id))
        .get(),
      openReports: this.openReports(revisionId, reader),
      evaluations: this.evaluations(revisionId, reader),
    };
  }

  private openReports(revisionId: number, reader: Reader): number {
    const row = reader
      .select({ open: count() })
      .from(problemReport)
      .leftJoin(problemReportAnswer, eq(problemReportAnswer.reportId, problemReport.id))
      .where(and(eq(problemReport.revisionId, revisionId), isNull(problemReportAnswer.id)))
      .get();
    return row?.open ?? 0;
  }

  private evaluations(revisionId: number, reader: Reader): number {
    const row = reader
      .select({ kept: count() })
      .from(evaluation)
      .where(eq(evaluation.revisionId, revisionId))
      .get();
    return row?.kept ?? 0;
  }
}
