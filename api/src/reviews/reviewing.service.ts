import { Injectable } from '@nestjs/common';
import type { Actor } from '../common/actor.js';
import { authorize } from '../common/authorized.js';
import { ApiProblem } from '../common/problem.js';
import { CHECKLIST_POINTS, type Checklist, type Verdict } from '../common/verdict.js';
import { Writer } from '../database/write.js';
import { DefinitionsService } from '../revisions/definitions.service.js';
import { subjectOf, type RevisionKey, type RevisionRecord } from '../revisions/revision-record.js';
import { mayComment, mayReview, standingAfter } from '../revisions/revision.policy.js';
import { RevisionsService } from '../revisions/revisions.service.js';
import { assertCurrent } from './assert-current.js';
import { leadsSomewhere } from './field-path.js';
import { ReviewsRepository } from './reviews.repository.js';
import { reviewFaults } from './review.policy.js';

export interface Review {
  readonly verdict: Verdict;
  readonly checklist: Checklist;
  readonly note?: string | undefined;
}

@Injectable()
export class ReviewingService {
  constructor(
    private readonly revisions: RevisionsService,
    private readonly definitions: DefinitionsService,
    private readonly reviews: ReviewsRepository,
    private readonly writer: Writer,
  ) {}

  /**
   * A verdict on the present content. Asking for changes makes a draft of it again, declining ends it. `ifMatch`, when
   * given, is the hash of the content that the reviewer has read.
   */
  review(actor: Actor, key: RevisionKey, given: Review, ifMatch?: string): RevisionRecord {
    const faults = reviewFaults(given);
    if (faults.length > 0)
      throw new ApiProblem('malformed', 'The review is not complete.', { fields: faults });
    const standing = standingAfter(given.verdict);
    const act = standing === 'declined' ? 'revision.declined' : 'revision.reviewed';
    return this.writer.write(actor, act, (tx, at) => {
      const found = this.revisions.one(actor, key, tx);
      const record = authorize(found, mayReview(actor, found));
      assertCurrent(record, ifMatch);
      const { verdict, note } = given;
      const checklist = checklistOf(given.checklist);
      this.reviews.insertReview(tx, record, actor, at, { verdict, checklist, note });
      const result =
        standing === undefined
          ? record
          : this.revisions.setStanding(tx, record, { standing, note }, actor, at);
      const detail = { hash: record.hash, verdict, checklist, ...(note === undefined ? {} : { note }) };
      return { subject: subjectOf(record), detail, result };
    });
  }

  /** A remark on one field of the present content, or on the whole of it. */
  comment(actor: Actor, key: RevisionKey, field: string, text: string): RevisionRecord {
    return this.writer.write(actor, 'revision.commented', (tx, at) => {
      const found = this.revisions.one(actor, key, tx);
      const record = authorize(found, mayComment(actor));
      if (!leadsSomewhere(this.definitions.definition(record), field)) {
        throw ApiProblem.ofField('malformed', 'field', 'There is no such field on this sheet.');
      }
      this.reviews.insertComment(tx, record, actor, at, { field, text });
      const detail = { hash: record.hash, field, text };
      return { subject: subjectOf(record), detail, result: record };
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
