import { Injectable } from '@nestjs/common';
import { asc, eq } from 'drizzle-orm';
import type { Actor } from '../common/actor.js';
import type { Authorized } from '../common/authorized.js';
import type { Checklist, Verdict } from '../common/verdict.js';
import type { Reader, Tx } from '../database/connection.js';
import { approval, comment, review, reviewAssignment, submission } from '../database/schema/review.js';
import type { RevisionRecord } from '../revisions/revision-record.js';
import type { VerdictFact } from '../revisions/revision.policy.js';

type Subject = Authorized<RevisionRecord>;

/** What people did with a revision on its way. Every row names the hash of the content it speaks of. */
@Injectable()
export class ReviewsRepository {
  /** The verdicts on a revision, on whatever content, in the order given. */
  verdicts(revisionId: number, reader: Reader): VerdictFact[] {
    return reader
      .select({ reviewerId: review.reviewerId, verdict: review.verdict, hash: review.hash })
      .from(review)
      .where(eq(review.revisionId, revisionId))
      .orderBy(asc(review.id))
      .all();
  }

  insertSubmission(
    tx: Tx,
    { id, hash }: Subject,
    by: Actor,
    at: string,
    engine: string,
    report: unknown,
  ): void {
    tx.insert(submission)
      .values({ revisionId: id, hash, at, byId: by.id, byName: by.name, engine, report })
      .run();
  }

  /** Somebody asked twice stays asked once. */
  insertAssignments(tx: Tx, { id }: Subject, reviewerIds: readonly string[], by: Actor, at: string): void {
    const asked = tx
      .select({ reviewerId: reviewAssignment.reviewerId })
      .from(reviewAssignment)
      .where(eq(reviewAssignment.revisionId, id))
      .all()
      .map(({ reviewerId }) => reviewerId);
    for (const reviewerId of reviewerIds.filter((one) => !asked.includes(one))) {
      tx.insert(reviewAssignment).values({ revisionId: id, reviewerId, at, byId: by.id }).run();
    }
  }

  insertReview(
    tx: Tx,
    { id, hash }: Subject,
    by: Actor,
    at: string,
    values: { verdict: Verdict; checklist: Checklist; note?: string | undefined },
  ): void {
    tx.insert(review)
      .values({ revisionId: id, hash, reviewerId: by.id, reviewerName: by.name, at, ...values })
      .run();
  }

  insertComment(
    tx: Tx,
    { id, hash }: Subject,
    by: Actor,
    at: string,
    values: { field: string; text: string },
  ): void {
    tx.insert(comment)
      .values({ revisionId: id, hash, byId: by.id, byName: by.name, at, ...values })
      .run();
  }

  insertApproval(
    tx: Tx,
    { id, hash }: Subject,
    by: Actor,
    at: string,
    values: { meaning: string; note?: string | undefined },
  ): void {
    tx.insert(approval)
      .values({ revisionId: id, hash, byId: by.id, byName: by.name, at, ...values })
      .run();
  }
}
