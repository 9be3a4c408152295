import { Injectable } from '@nestjs/common';
import { AppointmentsService } from '../appointments/appointments.service.js';
import { SYSTEM_ACTOR, type Actor } from '../common/actor.js';
import { authorize } from '../common/authorized.js';
import { ApiProblem } from '../common/problem.js';
import type { Tx } from '../database/connection.js';
import { Writer } from '../database/write.js';
import { SigningService } from '../people/signing.service.js';
import { subjectOf, type RevisionKey, type RevisionRecord } from '../revisions/revision-record.js';
import { mayApprove, mayDecline } from '../revisions/revision.policy.js';
import { RevisionsService } from '../revisions/revisions.service.js';
import { SettingsService } from '../settings/settings.service.js';
import { assertCurrent } from './assert-current.js';
import { effectiveDates } from './effective-dates.js';
import { LifeNoticesService } from './life-notices.service.js';
import { reviewLetters } from './review-letters.js';
import { ReviewsRepository } from './reviews.repository.js';
import { SupersessionService } from './supersession.service.js';

export interface Approval {
  readonly password: string;
  readonly meaning: string;
  readonly hash: string;
  readonly note?: string | undefined;
  /** Days, or moments, in ISO 8601. */
  readonly effectiveFrom?: string | undefined;
  readonly reviewDue?: string | undefined;
}

/** The technical authority's decision on what peers have reviewed. */
@Injectable()
export class ApprovalService {
  constructor(
    private readonly revisions: RevisionsService,
    private readonly reviews: ReviewsRepository,
    private readonly appointments: AppointmentsService,
    private readonly settings: SettingsService,
    private readonly supersession: SupersessionService,
    private readonly signing: SigningService,
    private readonly notices: LifeNoticesService,
    private readonly writer: Writer,
  ) {}

  /**
   * Signs the present content with name, time and meaning. The revision in force before is superseded when this one's
   * effective date comes, which without a date is at once.
   */
  async approve(actor: Actor, key: RevisionKey, signed: Approval): Promise<RevisionRecord> {
    this.revisions.one(actor, key);
    await this.signing.confirm(actor, signed.password);
    const { meaning, hash, note } = signed;
    return this.writer.write(actor, 'revision.approved', (tx, at) => {
      this.supersession.settle(tx, at, SYSTEM_ACTOR, key);
      const found = this.revisions.one(actor, key, tx);
      const ground = this.appointments.approvalGround(actor.id, found.geometry, at, tx);
      const record = authorize(found, mayApprove(actor, found, this.reviews.verdicts(found.id, tx), ground));
      assertCurrent(record, hash);
      this.assertNoneLater(record, tx);
      const dates = effectiveDates(signed, at, this.settings.current(tx).reviewDueMonths);
      this.reviews.insertApproval(tx, record, actor, at, { meaning, note, ...dates });
      const result = this.revisions.setStanding(tx, record, { standing: 'approved', note }, actor, at);
      const superseded = this.supersession.settle(tx, at, actor, record);
      const letter = reviewLetters.approved(actor, record, dates.effectiveFrom, at);
      this.notices.tell(tx, at, actor, record, this.reviews.concerned(record, tx), letter);
      const detail = { hash, meaning, superseded, ...dates, ...(note === undefined ? {} : { note }) };
      return { subject: subjectOf(record), detail, result };
    });
  }

  /** Ends a review with a no. A next revision may still be drafted. */
  decline(actor: Actor, key: RevisionKey, reason: string): RevisionRecord {
    return this.writer.write(actor, 'revision.declined', (tx, at) => {
      const found = this.revisions.one(actor, key, tx);
      const ground = this.appointments.approvalGround(actor.id, found.geometry, at, tx);
      const record = authorize(found, mayDecline(actor, found, ground));
      const standing = { standing: 'declined', note: reason } as const;
      const result = this.revisions.setStanding(tx, record, standing, actor, at);
      const concerned = [record.originatorId, ...this.reviews.reviewerIds(record.id, tx)];
      this.notices.tell(tx, at, actor, record, concerned, reviewLetters.declined(actor, record));
      const { hash, iteration } = record;
      return { subject: subjectOf(record), detail: { hash, iteration, reason }, result };
    });
  }

  private assertNoneLater({ kind, slug, number }: RevisionRecord, tx: Tx): void {
    const all = this.revisions.all(kind, slug, tx);
    if (all.some((one) => one.number > number && one.standing === 'approved')) {
      throw new ApiProblem('conflict', 'A later revision is approved already.');
    }
  }
}
