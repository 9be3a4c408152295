import { Injectable } from '@nestjs/common';
import { and, count, desc, eq, isNull, lt } from 'drizzle-orm';
import type { NoticeKind } from '../common/notice-kinds.js';
import { Connection, type Reader, type Tx } from '../database/connection.js';
import { notice, noticePreference } from '../database/schema/notices.js';

export type NoticeRow = typeof notice.$inferSelect;

@Injectable()
export class NoticeRepository {
  constructor(private readonly connection: Connection) {}

  /** Whether it was told now; false when the same reminder was before. */
  insert(tx: Tx, row: Omit<NoticeRow, 'id' | 'readAt'>): boolean {
    return tx.insert(notice).values(row).onConflictDoNothing().run().changes > 0;
  }

  /** Somebody's notices below an id, the latest first. */
  latestBelow(personId: string, id: number, limit: number): NoticeRow[] {
    return this.connection.reader
      .select()
      .from(notice)
      .where(and(eq(notice.personId, personId), lt(notice.id, id)))
      .orderBy(desc(notice.id))
      .limit(limit)
      .all();
  }

  unread(personId: string): number {
    const row = this.connection.reader
      .select({ unread: count() })
      .from(notice)
      .where(and(eq(notice.personId, personId), isNull(notice.readAt)))
      .get();
    return row?.unread ?? 0;
  }

  ofPerson(personId: string, id: number, reader: Reader = this.connection.reader): NoticeRow | undefined {
    return reader
      .select()
      .from(notice)
      .where(and(eq(notice.personId, personId), eq(notice.id, id)))
      .get();
  }

  setRead(tx: Tx, id: number, at: string): void {
    tx.update(notice).set({ readAt: at }).where(eq(notice.id, id)).run();
  }

  /** The kinds on which somebody chose, with the choice. */
  choices(personId: string, reader: Reader = this.connection.reader): ReadonlyMap<NoticeKind, boolean> {
    const rows = reader.select().from(noticePreference).where(eq(noticePreference.personId, personId)).all();
    return new Map(rows.map(({ kind, mail }) => [kind, mail]));
  }

  choose(tx: Tx, personId: string, kind: NoticeKind, mail: boolean): void {
    tx.insert(noticePreference)
      .values({ personId, kind, mail })
      .onConflictDoUpdate({
        target: [noticePreference.personId, noticePreference.kind],
        set: { mail },
      })
      .run();
  }
}
