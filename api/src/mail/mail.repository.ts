import { Injectable } from '@nestjs/common';
import { and, asc, desc, eq, lte } from 'drizzle-orm';
import { Connection, type Tx } from '../database/connection.js';
import { mail } from '../database/schema/mail.js';

export type MailRow = typeof mail.$inferSelect;

@Injectable()
export class MailRepository {
  constructor(private readonly connection: Connection) {}

  insert(tx: Tx, row: typeof mail.$inferInsert): void {
    tx.insert(mail).values(row).run();
  }

  latest(limit: number): MailRow[] {
    return this.connection.reader
      .select()
      .from(mail)
      .orderBy(desc(mail.writtenAt), desc(mail.id))
      .limit(limit)
      .all();
  }

  /** The letters whose time to be sent has come, the oldest first. */
  due(at: string, limit: number): MailRow[] {
    return this.connection.reader
      .select()
      .from(mail)
      .where(and(eq(mail.state, 'waiting'), lte(mail.nextTryAt, at)))
      .orderBy(asc(mail.nextTryAt))
      .limit(limit)
      .all();
  }

  update(tx: Tx, id: string, values: Partial<Omit<MailRow, 'id'>>): void {
    tx.update(mail).set(values).where(eq(mail.id, id)).run();
  }
}
