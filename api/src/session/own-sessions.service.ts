import { Injectable, type OnModuleInit } from '@nestjs/common';
import type { Actor } from '../common/actor.js';
import { Clock } from '../common/clock.js';
import { ApiProblem } from '../common/problem.js';
import type { Tx } from '../database/connection.js';
import { Writer } from '../database/write.js';
import { passwordChangedLetter } from '../mail/letters.js';
import { MailService } from '../mail/mail.service.js';
import { Departures } from '../people/departures.js';
import { PasswordService } from '../people/password.service.js';
import { OneTimeLinkService } from '../people/one-time-link.service.js';
import { PeopleService } from '../people/people.service.js';
import type { Person } from '../people/person.js';
import { SigningService } from '../people/signing.service.js';
import { SettingsService } from '../settings/settings.service.js';
import { sessionItem, shortIdOf, type SessionsResponse } from './dto/own-sessions.dto.js';
import { hashOfSessionId, SessionRepository } from './session.repository.js';

/** What somebody does with their own sessions and password. */
@Injectable()
export class OwnSessionsService implements OnModuleInit {
  constructor(
    private readonly sessions: SessionRepository,
    private readonly people: PeopleService,
    private readonly departures: Departures,
    private readonly signing: SigningService,
    private readonly passwords: PasswordService,
    private readonly links: OneTimeLinkService,
    private readonly mail: MailService,
    private readonly settings: SettingsService,
    private readonly writer: Writer,
    private readonly clock: Clock,
  ) {}

  onModuleInit(): void {
    this.departures.follow((tx, { personId, from }) => {
      if (from === 'office') this.sessions.endAllOf(tx, personId);
    });
  }

  list(actor: Actor, sessionId: string): SessionsResponse {
    const current = hashOfSessionId(sessionId);
    const rows = this.sessions.liveOf(actor.id, this.clock.now().toISOString());
    return { items: rows.map((row) => sessionItem(row, current)) };
  }

  /** Ends one of the caller's other sessions; the one in use is ended by signing out. */
  end(actor: Actor, shortId: string, sessionId: string): void {
    this.writer.write(actor, 'session.closed', (tx, at) => {
      const row = this.sessions.liveOf(actor.id, at, tx).find(({ idHash }) => shortIdOf(idHash) === shortId);
      if (row === undefined) throw new ApiProblem('not-found', 'You have no such session.');
      if (row.idHash === hashOfSessionId(sessionId)) {
        throw new ApiProblem('conflict', 'This is the session you are in; sign out to end it.');
      }
      this.sessions.endHashed(tx, row.idHash);
      return { subject: `people/${actor.id}`, detail: { startedAt: row.startedAt }, result: undefined };
    });
  }

  /** Throws at `current` or `password`. The session in use goes on, all others end, and the person is told by mail. */
  async changePassword(actor: Actor, current: string, password: string, sessionId: string): Promise<void> {
    const person = this.people.byId(actor.id);
    if (person === undefined) throw new ApiProblem('not-signed-in', 'Sign in first.');
    await this.signing.confirm(actor, current, { field: 'current', undone: 'it was not changed' });
    if (current === password) {
      throw ApiProblem.ofField('malformed', 'password', 'This is the password you have.');
    }
    const passwordHash = await this.passwords.choose(password, person);
    this.writer.write(actor, 'password.changed', (tx, at) => {
      const sessionsEnded = this.replacePassword(tx, at, person, passwordHash, sessionId);
      return { subject: `people/${actor.id}`, detail: { sessionsEnded }, result: undefined };
    });
  }

  /** Sets a password within an act; gives how many sessions ended with it. Links to choose one are void after it. */
  replacePassword(tx: Tx, at: string, person: Person, passwordHash: string, keep?: string): number {
    this.people.setPasswordHash(tx, person.id, passwordHash);
    this.links.void(tx, at, 'password-reset', person.id);
    const { officeName } = this.settings.current(tx);
    this.mail.post(tx, at, { to: person.email, ...passwordChangedLetter({ officeName, name: person.name }) });
    return this.sessions.endAllOf(tx, person.id, keep);
  }
}
