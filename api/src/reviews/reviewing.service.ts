import { Injectable } from '@nestjs/common';
import type { Actor } from '../common/actor.js';
import { authorize } from '../common/authorized.js';
import { ApiProblem } from '../common/problem.js';
import { CHECKLIST_POINTS, type Checklist, type Verdict } from '../common/verdict.js';
import { Writer } from '../database/write.js';
import { subjectOf, type RevisionKey, type RevisionRecord } from '../revisions/revision-record.js';
import { handsOf, mayReview, mayTakeReview, standingAfter } from '../revisions/reviewing.policy.js';
import { RevisionsService } from '../revisions/revisions.service.js';
import { assertCurrent } from './assert-current.js';
import { LifeNoticesService } from './life-notices.service.js';
import { reviewLetters } from './review-letters.js';
import { reviewFaults } from './review.policy.js';
import { ReviewsRepository } from './reviews.repository.js';

export interface Review {
  readonly verdict: Verdict;
  readonly checklist: Checklist;
  readonly note?: string | undefined;
}

@Injectable()
export class ReviewingService {
  constructor(
    private readonly revisions: RevisionsService,
    private readonly reviews: ReviewsRepository,
    private readonly notices: LifeNoticesService,
    private readonly writer: Writer,
  ) {}

  /** Takes a review from the desk, without having been asked. */
  take(actor: Actor, key: RevisionKey): RevisionRecord {
    return this.writer.write(actor, 'review.taken', (tx, at) => {
      const found = this.revisions.one(actor, key, tx);
      const record = authorize(found, mayTakeReview(actor, found));
      if (this.reviews.reviewerIds(record.id, tx).includes(actor.id)) {
        throw new ApiProblem('duplicate', 'This review is yours already.');
      }
      this.reviews.insertAssignments(tx, record, [actor.id], actor, at);
      const { hash, iteration } = record;
      return { subject: subjectOf(record), detail: { hash, iteration }, result: record };
    });
  }

  /**
   * A verdict on the present content. Asking for changes gives the turn back to the originator, declining ends it. Who
   * was not asked takes the review by giving a verdict. `ifMatch`, when given, is the hash of the content that the
   * reviewer has read.
   */
  review(actor: Actor, key: RevisionKey, given: Review, ifMatch?: string): RevisionRecord {
    const faults = reviewFaults(given);
    if (faults.length > 0)
      throw new ApiProblem('malformed', 'The review is not complete.', { fields: faults });
    const standing = standingAfter(given.verdict);
    const act = standing === 'declined' ? 'revision.declined' : 'revision.reviewed';
    return this.writer.write(actor, act, (tx, at) => {
      const found = this.revisions.one(actor, key, tx);
      const last = this.reviews.lastRound(found.id, tx);
      const hands = handsOf(found, last, this.reviews.verdicts(found.id, tx));
      const record = authorize(found, mayReview(actor, found, hands));
      assertCurrent(record, ifMatch);
      const { verdict, note } = given;
      const checklist = checklistOf(given.checklist);
      const round = last?.round ?? 1;
      this.reviews.insertAssignments(tx, record, [actor.id], actor, at);
      this.reviews.insertReview(tx, record, actor, at, { round, verdict, checklist, note });
      const result =
        standing === undefined
          ? record
          : this.revisions.setStanding(tx, record, { standing, note }, actor, at);
      const letter = reviewLetters.verdict(actor, record, verdict);
      this.notices.tell(tx, at, actor, record, [record.originatorId], letter);
      const { hash, iteration } = record;
      const detail = { hash, iteration, verdict, checklist, ...(note === undefined ? {} : { note }) };
      return { subject: subjectOf(record), detail, result };
    });
  }
}

function checklistOf(given: Checklist): Checklist {
  const { expression, definitions, ranges, basis, recalculated, duplicates } = given;
  return { expression, definitions, ranges, basis, recalculated, duplicates } satisfies Record<
    (typeof CHECKLIST_POINTS)[number],
    boolean
  >;
}
