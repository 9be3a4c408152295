import { Injectable } from '@nestjs/common';
import { asc, eq } from 'drizzle-orm';
import { Connection, type Reader } from '../database/connection.js';
import {
  comment,
  commentAnswer,
  commentResolution,
  review,
  reviewAssignment,
  submission,
} from '../database/schema/review.js';
import { revisionContent } from '../database/schema/revision.js';

export type AssignmentRow = typeof reviewAssignment.$inferSelect;
export type SubmissionRow = typeof submission.$inferSelect;
export type ReviewRow = typeof review.$inferSelect;
export type AnswerRow = typeof commentAnswer.$inferSelect;
export type IterationRow = Pick<
  typeof revisionContent.$inferSelect,
  'iteration' | 'at' | 'hash' | 'canonicalText'
>;

export interface CommentRow {
  readonly comment: typeof comment.$inferSelect;
  readonly resolution: typeof commentResolution.$inferSelect | null;
  readonly answers: readonly AnswerRow[];
}

/** All that was put forward, asked and said in the review of one revision. */
export interface ReviewFile {
  readonly assignments: readonly AssignmentRow[];
  readonly submissions: readonly SubmissionRow[];
  readonly reviews: readonly ReviewRow[];
  readonly comments: readonly CommentRow[];
  readonly iterations: readonly IterationRow[];
}

@Injectable()
export class ReviewPageReadModel {
  constructor(private readonly connection: Connection) {}

  file(revisionId: number, reader: Reader = this.connection.reader): ReviewFile {
    return {
      assignments: reader
        .select()
        .from(reviewAssignment)
        .where(eq(reviewAssignment.revisionId, revisionId))
        .orderBy(asc(reviewAssignment.id))
        .all(),
      submissions: reader
        .select()
        .from(submission)
        .where(eq(submission.revisionId, revisionId))
        .orderBy(asc(submission.id))
        .all(),
      reviews: reader
        .select()
        .from(review)
        .where(eq(review.revisionId, revisionId))
        .orderBy(asc(review.id))
        .all(),
      comments: this.comments(revisionId, reader),
      iterations: reader
        .select({
          iteration: revisionContent.iteration,
          at: revisionContent.at,
          hash: revisionContent.hash,
          canonicalText: revisionContent.canonicalText,
        })
        .from(revisionContent)
        .where(eq(revisionContent.revisionId, revisionId))
        .orderBy(asc(revisionContent.iteration))
        .all(),
    };
  }

  private comments(revisionId: number, reader: Reader): CommentRow[] {
    const answers = reader
      .select({ answer: commentAnswer })
      .from(commentAnswer)
      .innerJoin(comment, eq(comment.id, commentAnswer.commentId))
      .where(eq(comment.revisionId, revisionId))
      .orderBy(asc(commentAnswer.id))
      .all()
      .map(({ answer }) => answer);
    return reader
      .select({ comment, resolution: commentResolution })
      .from(comment)
      .leftJoin(commentResolution, eq(commentResolution.commentId, comment.id))
      .where(eq(comment.revisionId, revisionId))
      .orderBy(asc(comment.id))
      .all()
      .map((row) => ({ ...row, answers: answers.filter(({ commentId }) => commentId === row.comment.id) }));
  }
}
