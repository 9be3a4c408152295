import { Injectable } from '@nestjs/common';
import type { Actor } from '../common/actor.js';
import { AttemptLimiter } from '../common/attempt-limiter.js';
import { ApiProblem } from '../common/problem.js';
import { Config } from '../config/config.js';
import { PasswordService } from './password.service.js';
import { PeopleRepository } from './people.repository.js';

/** Asks for the password once more before an act that signs something. Call it before `Writer.write`. */
@Injectable()
export class SigningService {
  constructor(
    private readonly people: PeopleRepository,
    private readonly passwords: PasswordService,
    private readonly limiter: AttemptLimiter,
    private readonly config: Config,
  ) {}

  /**
   * Throws `password-refused` at the field unless it is the actor's own; after too many, `too-many-requests`.
   * `undone` says what therefore was not done.
   */
  async confirm(
    actor: Actor,
    password: string,
    { field = 'password', undone = 'nothing was signed' } = {},
  ): Promise<void> {
    const { windowSeconds, perPerson } = this.config.signInLimits;
    const attempt = this.limiter.begin([{ key: `signing:${actor.id}`, limit: perPerson, windowSeconds }]);
    const person = this.people.byId(actor.id);
    const fits = await this.passwords.fits(password, person?.passwordHash);
    if (!fits || person?.active !== true) {
      throw ApiProblem.ofField('password-refused', field, `This is not your password; ${undone}.`);
    }
    attempt.succeed();
  }
}
