import { Injectable } from '@nestjs/common';
import { and, desc, eq, isNull, lt } from 'drizzle-orm';
import type { Actor } from '../common/actor.js';
import type { Authorized } from '../common/authorized.js';
import { Connection, type Reader, type Tx } from '../database/connection.js';
import { appointment } from '../database/schema/appointments.js';

export type AppointmentRow = typeof appointment.$inferSelect;
export type ProposedAppointment = Pick<AppointmentRow, 'id' | 'personId' | 'geometries' | 'until'>;

@Injectable()
export class AppointmentRepository {
  constructor(private readonly connection: Connection) {}

  /** All there ever were, the latest proposal first. */
  all(): AppointmentRow[] {
    return this.connection.reader
      .select()
      .from(appointment)
      .orderBy(desc(appointment.proposedAt), desc(appointment.id))
      .all();
  }

  find(id: string, reader: Reader = this.connection.reader): AppointmentRow | undefined {
    return reader.select().from(appointment).where(eq(appointment.id, id)).get();
  }

  /** Somebody's appointments that nobody ended; their date may have passed. */
  open(personId: string, reader: Reader = this.connection.reader): AppointmentRow[] {
    return reader
      .select()
      .from(appointment)
      .where(and(eq(appointment.personId, personId), isNull(appointment.endedAt)))
      .all();
  }

  /** Those whose last day lies before a day and that nobody ended. */
  lapsed(day: string): AppointmentRow[] {
    return this.connection.reader
      .select()
      .from(appointment)
      .where(and(isNull(appointment.endedAt), lt(appointment.until, day)))
      .all();
  }

  insert(tx: Tx, proposed: ProposedAppointment, by: Actor, at: string): void {
    tx.insert(appointment)
      .values({ ...proposed, proposedAt: at, proposedById: by.id, proposedByName: by.name })
      .run();
  }

  confirm(tx: Tx, { id }: Authorized<AppointmentRow>, by: Actor, at: string): void {
    tx.update(appointment)
      .set({ confirmedAt: at, confirmedById: by.id, confirmedByName: by.name })
      .where(eq(appointment.id, id))
      .run();
  }

  end(tx: Tx, { id }: Authorized<AppointmentRow>, by: Actor, at: string, reason: string): void {
    tx.update(appointment)
      .set({ endedAt: at, endedById: by.id, endedByName: by.name, endReason: reason })
      .where(eq(appointment.id, id))
      .run();
  }
}
