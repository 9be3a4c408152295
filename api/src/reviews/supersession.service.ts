import { Injectable, type OnModuleInit } from '@nestjs/common';
import { SYSTEM_ACTOR, type Actor } from '../common/actor.js';
import { ALLOWED, authorize } from '../common/authorized.js';
import { appendToJournal } from '../database/append-to-journal.js';
import type { Tx } from '../database/connection.js';
import { Writer } from '../database/write.js';
import { subjectOf, type RevisionRecord } from '../revisions/revision-record.js';
import { RevisionsService } from '../revisions/revisions.service.js';
import { ScheduleService } from '../schedule/schedule.service.js';
import { LifeNoticesService } from './life-notices.service.js';
import { reviewLetters } from './review-letters.js';
import { ReviewsRepository } from './reviews.repository.js';

/**
 * Writes down that a revision was superseded when the effective date of a later one came. Every read of a standing
 * reckons with the date itself, so that nothing hangs on how soon this is done.
 */
@Injectable()
export class SupersessionService implements OnModuleInit {
  constructor(
    private readonly revisions: RevisionsService,
    private readonly reviews: ReviewsRepository,
    private readonly notices: LifeNoticesService,
    private readonly schedule: ScheduleService,
    private readonly writer: Writer,
  ) {}

  onModuleInit(): void {
    this.schedule.add({ name: 'effective dates', run: (now) => this.writeDown(now) });
  }

  /** One act for each; none when nothing is due. */
  writeDown(now: Date): void {
    for (const { record, by } of this.revisions.toSupersede(now.toISOString())) {
      this.writer.write(SYSTEM_ACTOR, 'revision.superseded', (tx, at) => {
        this.supersede(tx, at, SYSTEM_ACTOR, record, by);
        return { subject: subjectOf(record), detail: detailOf(record, by), result: undefined };
      });
    }
  }

  /**
   * The same inside another act, before it looks at standings or after it changed them: gives the numbers of the
   * revisions of this subject that were superseded.
   */
  settle(tx: Tx, at: string, actor: Actor, subject: Pick<RevisionRecord, 'kind' | 'slug'>): number[] {
    const due = this.revisions
      .toSupersede(at, tx)
      .filter(({ record }) => record.kind === subject.kind && record.slug === subject.slug);
    for (const { record, by } of due) {
      this.supersede(tx, at, actor, record, by);
      appendToJournal(tx, at, actor, 'revision.superseded', subjectOf(record), detailOf(record, by));
    }
    return due.map(({ record }) => record.number);
  }

  private supersede(tx: Tx, at: string, actor: Actor, record: RevisionRecord, by: number): void {
    const note = `Superseded by revision ${by}.`;
    const subject = authorize(record, ALLOWED);
    this.revisions.setStanding(tx, subject, { standing: 'superseded', note }, actor, record.standingAt);
    const concerned = this.reviews.concerned(record, tx);
    this.notices.tell(tx, at, actor, record, concerned, reviewLetters.superseded(record, by));
  }
}

function detailOf(record: RevisionRecord, by: number) {
  return { hash: record.hash, by, from: record.standingAt };
}
