import { Injectable, Logger } from '@nestjs/common';
import { ANONYMOUS_ACTOR } from '../common/actor.js';
import { AttemptLimiter } from '../common/attempt-limiter.js';
import { ApiProblem } from '../common/problem.js';
import { Config } from '../config/config.js';
import type { Tx } from '../database/connection.js';
import { Writer } from '../database/write.js';
import { passwordResetLetter } from '../mail/letters.js';
import { MailService } from '../mail/mail.service.js';
import { officeAddress } from '../mail/office-address.js';
import { OneTimeLinkService } from '../people/one-time-link.service.js';
import { PasswordService } from '../people/password.service.js';
import { PeopleService } from '../people/people.service.js';
import { hasJoined, normalEmail, type Person } from '../people/person.js';
import { OwnSessionsService } from '../session/own-sessions.service.js';
import { SettingsService } from '../settings/settings.service.js';

/** A new password for whoever reads the mail of an address of the office. */
@Injectable()
export class PasswordResetsService {
  private readonly logger = new Logger('PasswordResets');

  constructor(
    private readonly people: PeopleService,
    private readonly links: OneTimeLinkService,
    private readonly passwords: PasswordService,
    private readonly sessions: OwnSessionsService,
    private readonly mail: MailService,
    private readonly settings: SettingsService,
    private readonly limiter: AttemptLimiter,
    private readonly writer: Writer,
    private readonly config: Config,
  ) {}

  /**
   * Sends a link if the address is of somebody here. The answer is the same for every address and does not wait for the
   * work, which is the same too but for the letter's row: nobody learns from either who is here. Counted, so that
   * nobody is flooded.
   */
  ask(email: string, address: string): void {
    const { windowSeconds, perAddress, perPerson } = this.config.signInLimits;
    this.limiter.begin([
      { key: `reset-from:${address}`, limit: perAddress, windowSeconds },
      { key: `reset-for:${normalEmail(email)}`, limit: perPerson, windowSeconds },
    ]);
    setImmediate(() => {
      this.follow(email, address);
    });
  }

  /** Throws `not-found` for a link that does not hold; at `password` for one that cannot be taken. */
  async choose(token: string, password: string): Promise<void> {
    const person = this.owner(this.links.look(token, ['password-reset']).personId);
    const passwordHash = await this.passwords.choose(password, person);
    this.writer.write(ANONYMOUS_ACTOR, 'password-reset.done', (tx, at) => {
      const { personId } = this.links.use(tx, at, token, ['password-reset']);
      const owner = this.owner(personId, tx);
      const sessionsEnded = this.sessions.replacePassword(tx, at, owner, passwordHash);
      return { subject: `people/${owner.id}`, detail: { sessionsEnded }, result: undefined };
    });
  }

  private follow(email: string, address: string): void {
    try {
      this.record(email, address);
    } catch (error) {
      this.logger.error(error instanceof Error ? (error.stack ?? error.message) : String(error));
    }
  }

  private record(email: string, address: string): void {
    this.writer.write(ANONYMOUS_ACTOR, 'password-reset.asked', (tx, at) => {
      const person = this.people.byEmail(email, tx);
      const known = person?.active === true && hasJoined(person);
      const token = this.links.make(tx, at, 'password-reset', known ? person.id : null);
      if (known) this.send(tx, at, person, token);
      // Not what was typed: people type their password into the wrong field, and the journal keeps everything.
      return {
        subject: known ? `people/${person.id}` : 'password-resets',
        detail: { address },
        result: undefined,
      };
    });
  }

  private send(tx: Tx, at: string, { name, email }: Person, token: string): void {
    const link = officeAddress(this.config, `/password-reset/${token}`);
    const { officeName } = this.settings.current(tx);
    this.mail.post(tx, at, { to: email, ...passwordResetLetter({ officeName, name, link }) });
  }

  private owner(id: string | null, tx?: Tx): Person {
    const person = id === null ? undefined : this.people.byId(id, tx);
    if (person?.active !== true) {
      throw new ApiProblem('not-found', 'This link does not hold, or not any more. Ask for a new one.');
    }
    return person;
  }
}
