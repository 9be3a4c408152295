import { Injectable } from '@nestjs/common';
import { and, asc, eq, like, ne, or } from 'drizzle-orm';
import { Connection } from '../database/connection.js';
import { formerJournal, formerJournalEntry } from '../database/schema/exchange.js';
import { journal, journalCheckpoint, journalKey } from '../database/schema/journal.js';
import type { ExchangedJournal } from './register-format.js';

/** The journals that tell how the register came to be. */
@Injectable()
export class JournalsReadModel {
  constructor(private readonly connection: Connection) {}

  /** Those that came along with the register, the earliest office's first. */
  former(): ExchangedJournal[] {
    const { reader } = this.connection;
    return reader
      .select()
      .from(formerJournal)
      .orderBy(asc(formerJournal.place))
      .all()
      .map(({ place, checkpoints, keys }) => ({
        entries: reader
          .select({ entry: formerJournalEntry.entry })
          .from(formerJournalEntry)
          .where(eq(formerJournalEntry.place, place))
          .orderBy(asc(formerJournalEntry.index))
          .all()
          .map(({ entry }) => entry),
        checkpoints: JSON.parse(checkpoints) as ExchangedJournal['checkpoints'],
        keys: JSON.parse(keys) as ExchangedJournal['keys'],
      }));
  }

  /** This office's own. */
  own(): ExchangedJournal {
    const { reader } = this.connection;
    return {
      entries: reader
        .select({ entry: journal.entry })
        .from(journal)
        .orderBy(asc(journal.index))
        .all()
        .map(({ entry }) => entry),
      checkpoints: reader.select().from(journalCheckpoint).orderBy(asc(journalCheckpoint.size)).all(),
      keys: reader.select().from(journalKey).orderBy(asc(journalKey.since)).all(),
    };
  }

  /** Whether this office did more on the register than bring it in. */
  actedOnRegister(): boolean {
    const onRegister = or(
      like(journal.subject, 'correlations/%'),
      like(journal.subject, 'property-equations/%'),
      eq(journal.subject, 'geometries'),
    );
    const found = this.connection.reader
      .select({ index: journal.index })
      .from(journal)
      .where(and(onRegister, ne(journal.act, 'register.imported')))
      .get();
    return found !== undefined;
  }
}
