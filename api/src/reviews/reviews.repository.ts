import { Injectable } from '@nestjs/common';
import { asc, desc, eq } from 'drizzle-orm';
import type { InspectionReport } from '@merestone/engine';
import type { Actor } from '../common/actor.js';
import type { Authorized } from '../common/authorized.js';
import type { Checklist, Verdict } from '../common/verdict.js';
import { Connection, type Reader, type Tx } from '../database/connection.js';
import { evaluation } from '../database/schema/evaluation.js';
import { approval, review, reviewAssignment, submission } from '../database/schema/review.js';
import type { RoundFact, VerdictFact } from '../revisions/revision-facts.js';
import type { RevisionRecord } from '../revisions/revision-record.js';

type Subject = Authorized<Pick<RevisionRecord, 'id' | 'hash' | 'iteration'>>;

/** What is put forward, said and signed on a revision; each row names the content it speaks of. */
@Injectable()
export class ReviewsRepository {
  constructor(private readonly connection: Connection) {}

  /** The verdicts on a revision, on whatever content, in the order given. */
  verdicts(revisionId: number, reader: Reader = this.connection.reader): VerdictFact[] {
    return reader
      .select({
        reviewerId: review.reviewerId,
        verdict: review.verdict,
        iteration: review.iteration,
        round: review.round,
      })
      .from(review)
      .where(eq(review.revisionId, revisionId))
      .orderBy(asc(review.id))
      .all();
  }

  /** The last time a revision was put forward. */
  lastRound(revisionId: number, reader: Reader = this.connection.reader): RoundFact | undefined {
    return reader
      .select({ round: submission.round, iteration: submission.iteration })
      .from(submission)
      .where(eq(submission.revisionId, revisionId))
      .orderBy(desc(submission.id))
      .get();
  }

  insertSubmission(
    tx: Tx,
    { id, hash, iteration }: Subject,
    by: Actor,
    at: string,
    values: { round: number; engine: string; report: InspectionReport; note?: string | undefined },
  ): void {
    tx.insert(submission)
      .values({ revisionId: id, hash, iteration, at, byId: by.id, byName: by.name, ...values })
      .run();
  }

  reviewerIds(revisionId: number, reader: Reader = this.connection.reader): string[] {
    return reader
      .select({ reviewerId: reviewAssignment.reviewerId })
      .from(reviewAssignment)
      .where(eq(reviewAssignment.revisionId, revisionId))
      .all()
      .map(({ reviewerId }) => reviewerId);
  }

  /** Somebody asked twice stays asked once. Whoever assigns themselves takes the review. */
  insertAssignments(
    tx: Tx,
    { id }: Pick<Subject, 'id'>,
    reviewerIds: readonly string[],
    by: Actor,
    at: string,
  ): void {
    const asked = this.reviewerIds(id, tx);
    for (const reviewerId of reviewerIds.filter((one) => !asked.includes(one))) {
      tx.insert(reviewAssignment).values({ revisionId: id, reviewerId, at, byId: by.id }).run();
    }
  }

  insertReview(
    tx: Tx,
    { id, hash, iteration }: Subject,
    by: Actor,
    at: string,
    values: { round: number; verdict: Verdict; checklist: Checklist; note?: string | undefined },
  ): void {
    tx.insert(review)
      .values({ revisionId: id, hash, iteration, reviewerId: by.id, reviewerName: by.name, at, ...values })
      .run();
  }

  insertApproval(
    tx: Tx,
    { id, hash }: Subject,
    by: Actor,
    at: string,
    values: {
      meaning: string;
      note?: string | undefined;
      effectiveFrom: string;
      reviewDue: string;
    },
  ): void {
    tx.insert(approval)
      .values({ revisionId: id, hash, byId: by.id, byName: by.name, at, ...values })
      .run();
  }

  /** Everybody who has a number by a revision, or stood for it: whom its end concerns. */
  concerned(record: Pick<RevisionRecord, 'id' | 'originatorId'>, reader: Reader): string[] {
    const users = reader
      .selectDistinct({ id: evaluation.personId })
      .from(evaluation)
      .where(eq(evaluation.revisionId, record.id))
      .all();
    const signers = reader
      .select({ id: approval.byId })
      .from(approval)
      .where(eq(approval.revisionId, record.id))
      .all();
    const reviewers = reader
      .selectDistinct({ id: review.reviewerId })
      .from(review)
      .where(eq(review.revisionId, record.id))
      .all();
    return [record.originatorId, ...[...signers, ...reviewers, ...users].map(({ id }) => id)];
  }
}
