import { createHash } from 'node:crypto';
import { Injectable } from '@nestjs/common';
import { and, desc, eq, gt, lte, ne, or } from 'drizzle-orm';
import { Connection, type Reader, type Tx } from '../database/connection.js';
import { session } from '../database/schema/sessions.js';

export type SessionRow = typeof session.$inferSelect;

export function hashOfSessionId(id: string): string {
  return createHash('sha256').update(id).digest('hex');
}

@Injectable()
export class SessionRepository {
  constructor(private readonly connection: Connection) {}

  /** The session with this id, unless it has ended by then. */
  live(id: string, at: string): SessionRow | undefined {
    return this.connection.reader
      .select()
      .from(session)
      .where(and(eq(session.idHash, hashOfSessionId(id)), gt(session.idleUntil, at), gt(session.endsAt, at)))
      .get();
  }

  /** Somebody's sessions that have not ended by then, the one used last first. */
  liveOf(personId: string, at: string, reader: Reader = this.connection.reader): SessionRow[] {
    return reader
      .select()
      .from(session)
      .where(and(eq(session.personId, personId), gt(session.idleUntil, at), gt(session.endsAt, at)))
      .orderBy(desc(session.seenAt), desc(session.startedAt))
      .all();
  }

  setAgent(tx: Tx, id: string, agent: string): void {
    tx.update(session)
      .set({ agent })
      .where(eq(session.idHash, hashOfSessionId(id)))
      .run();
  }

  endHashed(tx: Tx, idHash: string): void {
    tx.delete(session).where(eq(session.idHash, idHash)).run();
  }

  /** Ends every session of somebody; the one with this id goes on. */
  endAllOf(tx: Tx, personId: string, but?: string): number {
    const ofPerson = eq(session.personId, personId);
    const which = but === undefined ? ofPerson : and(ofPerson, ne(session.idHash, hashOfSessionId(but)));
    return tx.delete(session).where(which).run().changes;
  }

  start(tx: Tx, id: string, values: Omit<SessionRow, 'idHash'>): void {
    tx.insert(session)
      .values({ idHash: hashOfSessionId(id), ...values })
      .run();
  }

  touch(tx: Tx, id: string, seenAt: string, idleUntil: string): void {
    tx.update(session)
      .set({ seenAt, idleUntil })
      .where(eq(session.idHash, hashOfSessionId(id)))
      .run();
  }

  end(tx: Tx, id: string): void {
    tx.delete(session)
      .where(eq(session.idHash, hashOfSessionId(id)))
      .run();
  }

  removeEnded(tx: Tx, at: string): void {
    tx.delete(session)
      .where(or(lte(session.idleUntil, at), lte(session.endsAt, at)))
      .run();
  }
}
