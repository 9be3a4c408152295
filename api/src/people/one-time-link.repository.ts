import { Injectable } from '@nestjs/common';
import { and, eq, gt, isNull } from 'drizzle-orm';
import { Connection, type Reader, type Tx } from '../database/connection.js';
import { oneTimeLink } from '../database/schema/one-time-links.js';

export type LinkRow = typeof oneTimeLink.$inferSelect;
export type LinkPurpose = LinkRow['purpose'];

@Injectable()
export class OneTimeLinkRepository {
  constructor(private readonly connection: Connection) {}

  insert(tx: Tx, row: Omit<LinkRow, 'endedAt' | 'ending'>): void {
    tx.insert(oneTimeLink).values(row).run();
  }

  /** The link, unless it was used or replaced or its time is over. */
  live(tokenHash: string, at: string, reader: Reader = this.connection.reader): LinkRow | undefined {
    return reader
      .select()
      .from(oneTimeLink)
      .where(
        and(eq(oneTimeLink.tokenHash, tokenHash), isNull(oneTimeLink.endedAt), gt(oneTimeLink.expiresAt, at)),
      )
      .get();
  }

  use(tx: Tx, tokenHash: string, at: string): void {
    tx.update(oneTimeLink)
      .set({ endedAt: at, ending: 'used' })
      .where(and(eq(oneTimeLink.tokenHash, tokenHash), isNull(oneTimeLink.endedAt)))
      .run();
  }

  /** Voids what somebody still has for this purpose. */
  replace(tx: Tx, personId: string | null, purpose: LinkPurpose, at: string): void {
    tx.update(oneTimeLink)
      .set({ endedAt: at, ending: 'replaced' })
      .where(
        and(
          personId === null ? isNull(oneTimeLink.personId) : eq(oneTimeLink.personId, personId),
          eq(oneTimeLink.purpose, purpose),
          isNull(oneTimeLink.endedAt),
        ),
      )
      .run();
  }
}
