import { Injectable, type OnModuleInit } from '@nestjs/common';
import { AppointmentsService } from '../appointments/appointments.service.js';
import { SYSTEM_ACTOR } from '../common/actor.js';
import { Writer } from '../database/write.js';
import { PeopleService } from '../people/people.service.js';
import { subjectOf, type RevisionRecord } from '../revisions/revision-record.js';
import { RevisionsService } from '../revisions/revisions.service.js';
import { ScheduleService } from '../schedule/schedule.service.js';
import { LifeNoticesService } from './life-notices.service.js';
import { RemindersReadModel } from './reminders.read-model.js';
import { reviewLetters } from './review-letters.js';

const DAYS_AHEAD = 30;
const DAY_MS = 24 * 3600_000;

/** Reminds of reviews that fall due: once thirty days before, and once on the day. */
@Injectable()
export class ReviewRemindersService implements OnModuleInit {
  constructor(
    private readonly revisions: RevisionsService,
    private readonly reminders: RemindersReadModel,
    private readonly appointments: AppointmentsService,
    private readonly people: PeopleService,
    private readonly notices: LifeNoticesService,
    private readonly schedule: ScheduleService,
    private readonly writer: Writer,
  ) {}

  onModuleInit(): void {
    this.schedule.add({ name: 'review reminders', run: (now) => this.remind(now) });
  }

  remind(now: Date): void {
    const soon = new Date(now.getTime() + DAYS_AHEAD * DAY_MS).toISOString();
    for (const record of this.revisions.ofCorrelations()) {
      const { inForce, reviewDue } = record;
      if (inForce && reviewDue !== null && reviewDue <= soon) this.remindOf(record, reviewDue, now);
    }
  }

  private remindOf(record: RevisionRecord, reviewDue: string, now: Date): void {
    const isDue = reviewDue <= now.toISOString();
    const once = `review-due ${subjectOf(record)} ${reviewDue} ${isDue ? 'due' : 'soon'}`;
    const concerned = this.concerned(record, now);
    if (concerned.length === 0 || this.reminders.wasTold(once)) return;
    this.writer.write(SYSTEM_ACTOR, 'revision.review-due', (tx, at) => {
      const letter = { ...reviewLetters.due(record, reviewDue, isDue), once };
      this.notices.tell(tx, at, SYSTEM_ACTOR, record, concerned, letter);
      return { subject: subjectOf(record), detail: { hash: record.hash, reviewDue }, result: undefined };
    });
  }

  /** Its originator, and whoever may approve what comes of the review; of these, those who are here. */
  private concerned({ originatorId, geometry }: RevisionRecord, now: Date): string[] {
    const at = now.toISOString();
    const authorities = this.people
      .list('authority')
      .filter(({ id }) => this.appointments.mayApproveFor(id, geometry, at))
      .map(({ id }) => id);
    const originator = this.people.activeActor(originatorId) === undefined ? [] : [originatorId];
    return [...new Set([...originator, ...authorities])];
  }
}
