import { Injectable } from '@nestjs/common';
import type { Actor } from '../common/actor.js';
import { ApiProblem } from '../common/problem.js';
import { PasswordService } from './password.service.js';
import { PeopleRepository } from './people.repository.js';

/** Asks for the password once more before an act that signs something. Call it before `Writer.write`. */
@Injectable()
export class SigningService {
  constructor(
    private readonly people: PeopleRepository,
    private readonly passwords: PasswordService,
  ) {}

  /** Throws `password-refused` at the field `password` unless it is the actor's own. */
  async confirm(actor: Actor, password: string): Promise<void> {
    const person = this.people.byId(actor.id);
    const fits = await this.passwords.fits(password, person?.passwordHash);
    if (!fits || person?.active !== true) {
      throw ApiProblem.ofField(
        'password-refused',
        'password',
        'This is not your password; nothing was signed.',
      );
    }
  }
}
