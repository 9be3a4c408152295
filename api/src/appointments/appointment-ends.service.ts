import { Injectable, type OnModuleInit } from '@nestjs/common';
import { SYSTEM_ACTOR } from '../common/actor.js';
import { authorize } from '../common/authorized.js';
import { appendToJournal } from '../database/append-to-journal.js';
import type { Tx } from '../database/connection.js';
import { Writer } from '../database/write.js';
import { NoticesService } from '../notices/notices.service.js';
import { Departures, type Departure } from '../people/departures.js';
import { ScheduleService } from '../schedule/schedule.service.js';
import { dayOf, mayEnd } from './appointment.policy.js';
import { AppointmentRepository, type AppointmentRow } from './appointment.repository.js';

const LAPSED = 'Its last day has passed.';

/** Ends appointments that nobody ends by hand: those whose day has passed, and those of people who leave. */
@Injectable()
export class AppointmentEndsService implements OnModuleInit {
  constructor(
    private readonly appointments: AppointmentRepository,
    private readonly notices: NoticesService,
    private readonly schedule: ScheduleService,
    private readonly departures: Departures,
    private readonly writer: Writer,
  ) {}

  onModuleInit(): void {
    this.schedule.add({ name: 'appointments', run: (at) => this.endLapsed(at) });
    this.departures.follow((tx, departure) => {
      this.endAllOf(tx, departure);
    });
  }

  /** Writes down what has ended by itself; approvals were refused from that day on in any case. */
  endLapsed(now: Date): void {
    for (const { id } of this.appointments.lapsed(dayOf(now.toISOString()))) this.endLapsedOne(id);
  }

  private endLapsedOne(id: string): void {
    this.writer.write(SYSTEM_ACTOR, 'appointment.lapsed', (tx, at) => {
      const row = this.appointments.find(id, tx);
      if (row === undefined) throw new Error(`The appointment ${id} is not there any more.`);
      this.appointments.end(tx, authorize(row, { allowed: true }), SYSTEM_ACTOR, at, LAPSED);
      this.notices.tell(tx, at, [row.personId, row.proposedById], {
        kind: 'appointment',
        text: `An appointment as technical authority ended with ${row.until}. Approvals that were given stand.`,
        href: '/office/appointments',
      });
      return {
        subject: `appointments/${id}`,
        detail: { person: row.personId, until: row.until },
        result: undefined,
      };
    });
  }

  private endAllOf(tx: Tx, { personId, by, at, reason }: Departure): void {
    for (const row of this.appointments.open(personId, tx)) {
      if (!mayEnd(row, at).allowed) continue;
      this.appointments.end(tx, this.goneWith(row, at), by, at, reason);
      appendToJournal(tx, at, by, 'appointment.ended', `appointments/${row.id}`, {
        person: personId,
        reason,
      });
    }
  }

  private goneWith(row: AppointmentRow, at: string) {
    return authorize(row, mayEnd(row, at));
  }
}
