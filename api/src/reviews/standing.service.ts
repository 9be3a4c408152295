import { Injectable } from '@nestjs/common';
import type { Actor } from '../common/actor.js';
import { authorize, type Decision } from '../common/authorized.js';
import type { WithdrawalClass } from '../common/standing.js';
import { Writer } from '../database/write.js';
import type { Act } from '../journal/acts.js';
import { subjectOf, type RevisionKey, type RevisionRecord } from '../revisions/revision-record.js';
import { mayReinstate, maySuspend, mayWithdraw, type RevisionFacts } from '../revisions/revision.policy.js';
import type { NewStanding } from '../revisions/new-standing.js';
import { RevisionsService } from '../revisions/revisions.service.js';

/** Takes revisions out of use, for a while or for good. */
@Injectable()
export class StandingService {
  constructor(
    private readonly revisions: RevisionsService,
    private readonly writer: Writer,
  ) {}

  /** A problem is being looked into. */
  suspend(actor: Actor, key: RevisionKey, reason: string): RevisionRecord {
    return this.set(actor, key, 'revision.suspended', maySuspend, { standing: 'suspended', note: reason });
  }

  /** It was looked into and the revision holds. When a later one was approved in the meantime it is superseded. */
  reinstate(actor: Actor, key: RevisionKey, reason: string): RevisionRecord {
    const later = this.revisions
      .all(key.kind, key.slug)
      .some(({ number, standing }) => number > key.number && standing === 'approved');
    const standing = later ? 'superseded' : 'approved';
    return this.set(actor, key, 'revision.reinstated', mayReinstate, { standing, note: reason });
  }

  withdraw(actor: Actor, key: RevisionKey, reason: string, withdrawalClass: WithdrawalClass): RevisionRecord {
    const standing: NewStanding = { standing: 'withdrawn', note: reason, withdrawalClass };
    return this.set(actor, key, 'revision.withdrawn', mayWithdraw, standing);
  }

  private set(
    actor: Actor,
    key: RevisionKey,
    act: Act,
    rule: (actor: Actor, revision: RevisionFacts) => Decision,
    standing: NewStanding,
  ): RevisionRecord {
    return this.writer.write(actor, act, (tx, at) => {
      const found = this.revisions.one(actor, key, tx);
      const record = authorize(found, rule(actor, found));
      const result = this.revisions.setStanding(tx, record, standing, actor, at);
      const { note = '', withdrawalClass } = standing;
      const detail = {
        hash: record.hash,
        from: record.standing,
        reason: note,
        ...(withdrawalClass === undefined ? {} : { class: withdrawalClass }),
      };
      return { subject: subjectOf(record), detail, result };
    });
  }
}
