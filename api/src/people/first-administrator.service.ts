import { createHash, randomBytes, timingSafeEqual } from 'node:crypto';
import { Injectable } from '@nestjs/common';
import { SYSTEM_ACTOR, type Actor } from '../common/actor.js';
import { ApiProblem } from '../common/problem.js';
import { PeopleService } from './people.service.js';

export interface FirstAdministrator {
  readonly name: string;
  readonly email: string;
  readonly password: string;
}

/**
 * Lets the first administrator into an office that has none. Whoever reads the server's terminal gets a token; it is
 * kept in memory alone, as a hash, and is void once it was used or the server has ended.
 */
@Injectable()
export class FirstAdministratorService {
  private tokenHash: Buffer | undefined;

  constructor(private readonly people: PeopleService) {}

  /** A token, in place of any given out before; undefined when there is an administrator. */
  newToken(): string | undefined {
    if (this.hasAdministrator()) return undefined;
    const token = randomBytes(32).toString('base64url');
    this.tokenHash = hashOf(token);
    return token;
  }

  /** Adds the administrator. Throws `forbidden` for a token that does not hold, or no longer. */
  async accept(token: string, person: FirstAdministrator): Promise<Actor> {
    const expected = this.tokenHash;
    if (expected === undefined || !timingSafeEqual(expected, hashOf(token)) || this.hasAdministrator()) {
      throw new ApiProblem(
        'forbidden',
        'This link does not hold, or was used. A new start prints a new one.',
      );
    }
    // Spent before anything is awaited, so that it serves once; given back when nobody was added.
    this.tokenHash = undefined;
    try {
      const { name, email, password } = person;
      return await this.people.add(SYSTEM_ACTOR, { name, email, password, roles: ['administrator'] });
    } catch (error) {
      this.tokenHash = expected;
      throw error;
    }
  }

  private hasAdministrator(): boolean {
    return this.people.list('administrator').length > 0;
  }
}

function hashOf(token: string): Buffer {
  return createHash('sha256').update(token, 'utf8').digest();
}
