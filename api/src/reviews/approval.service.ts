import { Injectable } from '@nestjs/common';
import { AppointmentsService } from '../appointments/appointments.service.js';
import type { Actor } from '../common/actor.js';
import { authorize } from '../common/authorized.js';
import { ApiProblem } from '../common/problem.js';
import type { Tx } from '../database/connection.js';
import { Writer } from '../database/write.js';
import { appendToJournal } from '../database/append-to-journal.js';
import { SigningService } from '../people/signing.service.js';
import { subjectOf, type RevisionKey, type RevisionRecord } from '../revisions/revision-record.js';
import { mayApprove, maySupersede } from '../revisions/revision.policy.js';
import { RevisionsService } from '../revisions/revisions.service.js';
import { assertCurrent } from './assert-current.js';
import { ReviewsRepository } from './reviews.repository.js';

export interface Approval {
  readonly password: string;
  readonly meaning: string;
  readonly hash: string;
  readonly note?: string | undefined;
}

@Injectable()
export class ApprovalService {
  constructor(
    private readonly revisions: RevisionsService,
    private readonly reviews: ReviewsRepository,
    private readonly appointments: AppointmentsService,
    private readonly signing: SigningService,
    private readonly writer: Writer,
  ) {}

  /** Signs the present content with name, time and meaning. The revision approved before is superseded. */
  async approve(actor: Actor, key: RevisionKey, signed: Approval): Promise<RevisionRecord> {
    this.revisions.one(actor, key);
    await this.signing.confirm(actor, signed.password);
    const { meaning, hash, note } = signed;
    return this.writer.write(actor, 'revision.approved', (tx, at) => {
      const found = this.revisions.one(actor, key, tx);
      const ground = this.appointments.approvalGround(actor.id, found.geometry, at, tx);
      const verdicts = this.reviews.verdicts(found.id, tx);
      const record = authorize(found, mayApprove(actor, found, verdicts, ground));
      assertCurrent(record, hash);
      const superseded = this.supersede(tx, at, actor, record);
      this.reviews.insertApproval(tx, record, actor, at, { meaning, note });
      const result = this.revisions.setStanding(tx, record, { standing: 'approved', note }, actor, at);
      const detail = { hash, meaning, superseded, ...(note === undefined ? {} : { note }) };
      return { subject: subjectOf(record), detail, result };
    });
  }

  /** The numbers of the revisions that this one takes the place of. Each gets a journal row of its own. */
  private supersede(tx: Tx, at: string, actor: Actor, record: RevisionRecord): number[] {
    const inUse = this.revisions
      .all(record.kind, record.slug, tx)
      .filter(({ standing }) => standing === 'approved');
    if (inUse.some(({ number }) => number > record.number)) {
      throw new ApiProblem('conflict', 'A later revision is approved already.');
    }
    for (const former of inUse) {
      const note = `Superseded by revision ${record.number}.`;
      const subject = authorize(former, maySupersede(actor, former));
      this.revisions.setStanding(tx, subject, { standing: 'superseded', note }, actor, at);
      const detail = { hash: former.hash, by: record.number };
      appendToJournal(tx, at, actor, 'revision.superseded', subjectOf(former), detail);
    }
    return inUse.map(({ number }) => number);
  }
}
