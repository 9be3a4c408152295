import { Injectable } from '@nestjs/common';
import { SYSTEM_ACTOR, type Actor } from '../common/actor.js';
import { authorize, type Decision } from '../common/authorized.js';
import { ApiProblem } from '../common/problem.js';
import type { WithdrawalClass } from '../common/standing.js';
import type { Tx } from '../database/connection.js';
import { Writer } from '../database/write.js';
import type { Act } from '../journal/acts.js';
import type { JsonObject } from '../journal/entry.js';
import type { Notice } from '../notices/notices.service.js';
import { ProblemReportsService } from '../problem-reports/problem-reports.service.js';
import type { NewStanding } from '../revisions/new-standing.js';
import type { RevisionFacts } from '../revisions/revision-facts.js';
import { subjectOf, type RevisionKey, type RevisionRecord } from '../revisions/revision-record.js';
import { mayReinstate, maySuspend, mayWithdraw } from '../revisions/revision.policy.js';
import { RevisionsService } from '../revisions/revisions.service.js';
import { LifeNoticesService } from './life-notices.service.js';
import { reviewLetters } from './review-letters.js';
import { ReviewsRepository } from './reviews.repository.js';
import { SupersessionService } from './supersession.service.js';

export interface Suspension {
  readonly reason: string;
  readonly problemReport?: number | undefined;
}

export interface Withdrawal {
  readonly reason: string;
  readonly class: WithdrawalClass;
  readonly successor?: string | undefined;
}

/** What a change of standing is made of. */
interface Change {
  readonly act: Act;
  readonly rule: (actor: Actor, revision: RevisionFacts) => Decision;
  /** Worked out inside the act, from what is on record then. */
  readonly standing: (record: RevisionRecord, tx: Tx) => NewStanding;
  readonly detail: JsonObject;
  readonly letter: (actor: Actor, record: RevisionRecord) => Notice;
}

/** Takes revisions out of use, for a while or for good. */
@Injectable()
export class StandingService {
  constructor(
    private readonly revisions: RevisionsService,
    private readonly reviews: ReviewsRepository,
    private readonly reports: ProblemReportsService,
    private readonly supersession: SupersessionService,
    private readonly notices: LifeNoticesService,
    private readonly writer: Writer,
  ) {}

  /** A problem is being looked into, perhaps one that was reported. */
  suspend(actor: Actor, key: RevisionKey, { reason, problemReport }: Suspension): RevisionRecord {
    return this.change(actor, key, {
      act: 'revision.suspended',
      rule: maySuspend,
      standing: (record, tx) => {
        if (problemReport !== undefined) this.reports.assertOpen(record, problemReport, 'problemReport', tx);
        return { standing: 'suspended', note: reason, problemReportId: problemReport };
      },
      detail: { reason, ...(problemReport === undefined ? {} : { problemReport }) },
      letter: (by, record) => reviewLetters.outOfUse(by, record, 'suspended'),
    });
  }

  /** It was looked into and the revision holds. Where a later one is in force by now it is superseded. */
  reinstate(actor: Actor, key: RevisionKey, reason: string): RevisionRecord {
    return this.change(actor, key, {
      act: 'revision.reinstated',
      rule: mayReinstate,
      standing: ({ kind, slug, number }, tx) => {
        const later = this.revisions.all(kind, slug, tx).some((one) => one.number > number && one.inForce);
        return { standing: later ? 'superseded' : 'approved', note: reason };
      },
      detail: { reason },
      letter: reviewLetters.reinstated,
    });
  }

  /** For good. `successor` names the correlation to turn to instead; one of its revisions must be in force. */
  withdraw(actor: Actor, key: RevisionKey, given: Withdrawal): RevisionRecord {
    const { reason, successor } = given;
    return this.change(actor, key, {
      act: 'revision.withdrawn',
      rule: mayWithdraw,
      standing: (record, tx) => {
        if (successor !== undefined) this.assertSuccessor(record, successor, tx);
        return { standing: 'withdrawn', note: reason, withdrawalClass: given.class, successor };
      },
      detail: { reason, class: given.class, ...(successor === undefined ? {} : { successor }) },
      letter: (by, record) => reviewLetters.outOfUse(by, record, 'withdrew'),
    });
  }

  private change(actor: Actor, key: RevisionKey, change: Change): RevisionRecord {
    return this.writer.write(actor, change.act, (tx, at) => {
      this.supersession.settle(tx, at, SYSTEM_ACTOR, key);
      const found = this.revisions.one(actor, key, tx);
      const record = authorize(found, change.rule(actor, found));
      const standing = change.standing(record, tx);
      const result = this.revisions.setStanding(tx, record, standing, actor, at);
      // A revision that comes back takes the place of those that stood in for it.
      const superseded = this.supersession.settle(tx, at, actor, record);
      this.notices.tell(
        tx,
        at,
        actor,
        record,
        this.reviews.concerned(record, tx),
        change.letter(actor, record),
      );
      const detail = {
        hash: record.hash,
        from: record.standing,
        ...change.detail,
        ...(superseded.length === 0 ? {} : { superseded }),
      };
      return { subject: subjectOf(record), detail, result };
    });
  }

  private assertSuccessor(record: RevisionRecord, slug: string, tx: Tx): void {
    const inForce = this.revisions
      .all(record.kind, slug, tx)
      .some((one) => one.inForce && one.id !== record.id);
    if (inForce) return;
    throw ApiProblem.ofField('malformed', 'successor', `No other revision of "${slug}" is in force.`);
  }
}
