import { Injectable } from '@nestjs/common';
import { and, desc, eq } from 'drizzle-orm';
import { Connection } from '../database/connection.js';
import { journal } from '../database/schema/journal.js';

/** When people last signed in, read out of the journal, which keeps that anyway. */
@Injectable()
export class SignInsReadModel {
  constructor(private readonly connection: Connection) {}

  last(personId: string): string | null {
    const row = this.connection.reader
      .select({ at: journal.at })
      .from(journal)
      .where(and(eq(journal.actorId, personId), eq(journal.act, 'session.started')))
      .orderBy(desc(journal.index))
      .limit(1)
      .get();
    return row?.at ?? null;
  }
}
