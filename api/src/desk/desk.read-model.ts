import { Injectable } from '@nestjs/common';
import { and, asc, desc, eq, inArray, isNull } from 'drizzle-orm';
import { Connection } from '../database/connection.js';
import { notice } from '../database/schema/notices.js';
import { problemReport, problemReportAnswer } from '../database/schema/problem-report.js';
import { correlation } from '../database/schema/register-entry.js';
import {
  comment,
  commentAnswer,
  commentResolution,
  review,
  reviewAssignment,
  submission,
} from '../database/schema/review.js';
import { revision } from '../database/schema/revision.js';
import type { RoundFact, VerdictFact } from '../revisions/revision-facts.js';

/** A comment that is not settled yet. */
export interface OpenComment {
  readonly id: number;
  readonly revisionId: number;
  readonly field: string;
  readonly text: string;
  readonly byId: string;
  readonly byName: string;
  readonly at: string;
  /** Who answered last; undefined without an answer. */
  readonly lastAnswer: { readonly byId: string; readonly byName: string; readonly at: string } | undefined;
}

/** How far the review of one revision has come. */
export interface ReviewProgress {
  readonly reviewerIds: readonly string[];
  readonly verdicts: readonly VerdictFact[];
  readonly lastRound: (RoundFact & { readonly at: string }) | undefined;
  readonly openComments: readonly OpenComment[];
}

export interface OpenReport {
  readonly id: number;
  readonly slug: string;
  readonly revision: number;
  readonly originatorId: string;
  readonly severity: string;
  readonly text: string;
  readonly byName: string;
  readonly at: string;
}

const MOST_NOTICES = 20;

@Injectable()
export class DeskReadModel {
  constructor(private readonly connection: Connection) {}

  /** By revision id. */
  progress(revisionIds: readonly number[]): ReadonlyMap<number, ReviewProgress> {
    const ids = [...revisionIds];
    const { reader } = this.connection;
    const assignments = reader
      .select({ revisionId: reviewAssignment.revisionId, reviewerId: reviewAssignment.reviewerId })
      .from(reviewAssignment)
      .where(inArray(reviewAssignment.revisionId, ids))
      .all();
    const reviews = reader
      .select()
      .from(review)
      .where(inArray(review.revisionId, ids))
      .orderBy(asc(review.id))
      .all();
    const rounds = reader
      .select({
        revisionId: submission.revisionId,
        round: submission.round,
        iteration: submission.iteration,
        at: submission.at,
      })
      .from(submission)
      .where(inArray(submission.revisionId, ids))
      .orderBy(asc(submission.id))
      .all();
    const comments = this.openComments(ids);
    return new Map(
      ids.map((id) => {
        const ofThis = (row: { readonly revisionId: number }) => row.revisionId === id;
        return [
          id,
          {
            reviewerIds: assignments.filter(ofThis).map(({ reviewerId }) => reviewerId),
            verdicts: reviews.filter(ofThis),
            lastRound: rounds.findLast(ofThis),
            openComments: comments.filter(ofThis),
          },
        ];
      }),
    );
  }

  /** Problem reports without an answer, the oldest first. */
  openReports(): OpenReport[] {
    return this.connection.reader
      .select({
        id: problemReport.id,
        slug: correlation.slug,
        revision: revision.number,
        originatorId: revision.originatorId,
        severity: problemReport.severity,
        text: problemReport.text,
        byName: problemReport.byName,
        at: problemReport.at,
      })
      .from(problemReport)
      .innerJoin(revision, eq(revision.id, problemReport.revisionId))
      .innerJoin(correlation, eq(correlation.id, revision.correlationId))
      .leftJoin(problemReportAnswer, eq(problemReportAnswer.reportId, problemReport.id))
      .where(isNull(problemReportAnswer.id))
      .orderBy(asc(problemReport.id))
      .all();
  }

  /** What somebody was told and has not read, the latest first. */
  unreadNotices(personId: string): { text: string; href: string; at: string }[] {
    return this.connection.reader
      .select({ text: notice.text, href: notice.href, at: notice.at })
      .from(notice)
      .where(and(eq(notice.personId, personId), isNull(notice.readAt)))
      .orderBy(desc(notice.id))
      .limit(MOST_NOTICES)
      .all();
  }

  private openComments(revisionIds: number[]): OpenComment[] {
    const { reader } = this.connection;
    const open = reader
      .select({ comment })
      .from(comment)
      .leftJoin(commentResolution, eq(commentResolution.commentId, comment.id))
      .where(and(inArray(comment.revisionId, revisionIds), isNull(commentResolution.id)))
      .orderBy(asc(comment.id))
      .all();
    const answers = reader
      .select()
      .from(commentAnswer)
      .where(
        inArray(
          commentAnswer.commentId,
          open.map((row) => row.comment.id),
        ),
      )
      .orderBy(asc(commentAnswer.id))
      .all();
    return open.map(({ comment: { id, revisionId, field, text, byId, byName, at } }) => ({
      id,
      revisionId,
      field,
      text,
      byId,
      byName,
      at,
      lastAnswer: answers.findLast(({ commentId }) => commentId === id),
    }));
  }
}
