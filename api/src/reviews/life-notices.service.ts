import { Injectable } from '@nestjs/common';
import type { Actor } from '../common/actor.js';
import type { Tx } from '../database/connection.js';
import { NoticesService, type Notice } from '../notices/notices.service.js';
import type { RevisionRecord } from '../revisions/revision-record.js';

/** Tells people what happens to the revisions that concern them. Nobody is told what they did themselves. */
@Injectable()
export class LifeNoticesService {
  private silent = false;

  constructor(private readonly notices: NoticesService) {}

  /** Property equations have no page of their own to lead to, so nothing is told of them. */
  tell(
    tx: Tx,
    at: string,
    by: Actor,
    record: RevisionRecord,
    personIds: readonly string[],
    notice: Notice,
  ): void {
    if (this.silent || record.kind !== 'correlation') return;
    this.notices.tell(
      tx,
      at,
      personIds.filter((id) => id !== by.id),
      notice,
    );
  }

  /** While a library is brought in, nobody needs a letter on each of its sheets. */
  async without<T>(work: () => Promise<T>): Promise<T> {
    this.silent = true;
    try {
      return await work();
    } finally {
      this.silent = false;
    }
  }
}
