import { Injectable } from '@nestjs/common';
import expressSession, { type SessionData } from 'express-session';
import { Clock } from '../common/clock.js';
import { Config } from '../config/config.js';
import { Writer } from '../database/write.js';
import { SessionRepository } from './session.repository.js';

declare module 'express-session' {
  interface SessionData {
    /** What passport keeps of whoever signed in: the person's id. */
    passport?: { user?: string };
  }
}

type Done<T = void> = (error?: unknown, value?: T) => void;

const MINUTE_MS = 60_000;

/**
 * Keeps sessions in the database. All that a session holds is who signed in and how long it lasts, and only signed-in
 * sessions are kept.
 */
@Injectable()
export class SessionStore extends expressSession.Store {
  constructor(
    private readonly sessions: SessionRepository,
    private readonly writer: Writer,
    private readonly clock: Clock,
    private readonly config: Config,
  ) {
    super();
  }

  override get(id: string, done: Done<SessionData | null>): void {
    settle(done, () => {
      const row = this.sessions.live(id, this.clock.now().toISOString());
      return row === undefined
        ? null
        : { cookie: { originalMaxAge: null }, passport: { user: row.personId } };
    });
  }

  override set(id: string, data: SessionData, done: Done = () => undefined): void {
    settle(done, () => {
      const personId = data.passport?.user;
      this.writer.writeUnjournalled('session-touch', (tx, at) => {
        this.sessions.removeEnded(tx, at);
        const { agent = null } = this.sessions.live(id, at) ?? {};
        this.sessions.end(tx, id);
        if (personId === undefined) return;
        const idleUntil = this.later(at, this.config.sessionSpans.idleMinutes);
        const endsAt = this.later(at, this.config.sessionSpans.absoluteHours * 60);
        this.sessions.start(tx, id, { personId, startedAt: at, seenAt: at, idleUntil, endsAt, agent });
      });
    });
  }

  /** Moves the idle end with use, at most once a minute, so that reading does not turn into writing. */
  override touch(id: string, _data: SessionData, done: Done = () => undefined): void {
    settle(done, () => {
      const row = this.sessions.live(id, this.clock.now().toISOString());
      if (row === undefined || this.clock.now().getTime() - Date.parse(row.seenAt) < MINUTE_MS) return;
      this.writer.writeUnjournalled('session-touch', (tx, at) => {
        this.sessions.touch(tx, id, at, this.later(at, this.config.sessionSpans.idleMinutes));
      });
    });
  }

  /** Keeps what the browser says of itself with the session. */
  describe(id: string, agent: string): void {
    this.writer.writeUnjournalled('session-touch', (tx) => {
      this.sessions.setAgent(tx, id, agent);
    });
  }

  override destroy(id: string, done: Done = () => undefined): void {
    settle(done, () => {
      this.writer.writeUnjournalled('session-touch', (tx) => {
        this.sessions.end(tx, id);
      });
    });
  }

  private later(at: string, minutes: number): string {
    return new Date(Date.parse(at) + minutes * MINUTE_MS).toISOString();
  }
}

/** Runs synchronous work for a caller who wants to be called back. */
function settle<T>(done: Done<T>, work: () => T): void {
  let value: T;
  try {
    value = work();
  } catch (error) {
    done(error);
    return;
  }
  done(null, value);
}
