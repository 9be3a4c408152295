import { Injectable } from '@nestjs/common';
import type { Actor } from '../common/actor.js';
import { Clock } from '../common/clock.js';
import type { Act } from '../journal/acts.js';
import { appendToJournal } from './append-to-journal.js';
import type { JsonObject } from '../journal/entry.js';
import { Connection, type Tx } from './connection.js';

/** What an act hands back: its result, and what the journal is to say about it. */
export interface Written<T> {
  /** Path of what was acted on, as in the API, such as `correlations/some-slug/revisions/2`. */
  readonly subject: string;
  readonly detail: JsonObject;
  readonly result: T;
}

/** The writes that are not journalled, by decision; there are no others. */
export type Unjournalled = 'session-touch' | 'draft-autosave' | 'mail-delivery' | 'evaluation' | 'checkpoint';

/**
 * The one way to change anything. The work runs synchronously between BEGIN IMMEDIATE and COMMIT: load, authorise and
 * check versions in there, and do slow things (hashing a password, reading a file) before. If it throws, nothing was
 * written. `at` is the moment of the act, the same in the rows and in the journal.
 */
@Injectable()
export class Writer {
  constructor(
    private readonly connection: Connection,
    private readonly clock: Clock,
  ) {}

  write<T>(actor: Actor, act: Act, work: (tx: Tx, at: string) => Written<T>): T {
    return this.transact((tx, at) => {
      const { subject, detail, result } = work(tx, at);
      appendToJournal(tx, at, actor, act, subject, detail);
      return result;
    });
  }

  writeUnjournalled<T>(_kind: Unjournalled, work: (tx: Tx, at: string) => T): T {
    return this.transact(work);
  }

  private transact<T>(work: (tx: Tx, at: string) => T): T {
    if (this.connection.sqlite.inTransaction) throw new Error('An act cannot be nested in another.');
    const at = this.clock.now().toISOString();
    return this.connection.query.transaction((tx) => work(tx, at), { behavior: 'immediate' });
  }
}
