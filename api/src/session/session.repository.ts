import { createHash } from 'node:crypto';
import { Injectable } from '@nestjs/common';
import { and, eq, gt, lte, or } from 'drizzle-orm';
import { Connection, type Tx } from '../database/connection.js';
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
