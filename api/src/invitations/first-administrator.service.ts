import { Injectable } from '@nestjs/common';
import { ANONYMOUS_ACTOR, SYSTEM_ACTOR } from '../common/actor.js';
import { ApiProblem, type FieldProblem } from '../common/problem.js';
import type { Reader } from '../database/connection.js';
import { Writer } from '../database/write.js';
import { OneTimeLinkService } from '../people/one-time-link.service.js';
import { PasswordService } from '../people/password.service.js';
import { PeopleService } from '../people/people.service.js';
import { normalEmail } from '../people/person.js';
import type { AcceptanceDto, JoinedResponse } from './dto/invitations.dto.js';

/** An office without an administrator is entered by a link that the program prints where it was started. */
@Injectable()
export class FirstAdministratorService {
  constructor(
    private readonly people: PeopleService,
    private readonly links: OneTimeLinkService,
    private readonly passwords: PasswordService,
    private readonly writer: Writer,
  ) {}

  /** The link to print, if there is no administrator; a link printed before is void then. `address`: the server's. */
  open(address: string): string | undefined {
    if (this.hasAdministrator()) return undefined;
    const token = this.writer.write(SYSTEM_ACTOR, 'office.first-link', (tx, at) => ({
      subject: 'office',
      detail: {},
      result: this.links.make(tx, at, 'first-administrator', null),
    }));
    return `${address}/invitation/${token}`;
  }

  /** Throws at `name`, `email` or `password` for what is missing or cannot be taken. */
  async accept(token: string, { name, email, password }: AcceptanceDto): Promise<JoinedResponse> {
    if (name === undefined || email === undefined) throw missing({ name, email });
    const address = normalEmail(email);
    const passwordHash = await this.passwords.choose(password, { name, email: address });
    return this.writer.write(ANONYMOUS_ACTOR, 'person.added', (tx, at) => {
      this.links.use(tx, at, token, ['first-administrator']);
      if (this.hasAdministrator(tx)) {
        throw new ApiProblem('conflict', 'The office has an administrator already, who can invite you.');
      }
      const roles = ['administrator'] as const;
      const id = this.people.insert(tx, at, { name, email: address, passwordHash, roles });
      const detail = { name, email: address, roles };
      return { subject: `people/${id}`, detail, result: { name, email: address } };
    });
  }

  private hasAdministrator(reader?: Reader): boolean {
    return this.people.list('administrator', reader).length > 0;
  }
}

function missing(given: Record<string, string | undefined>): ApiProblem {
  const fields = Object.entries(given)
    .filter(([, value]) => value === undefined)
    .map(([field]): FieldProblem => ({
      field,
      code: 'missing',
      message: 'The first administrator gives this.',
    }));
  return new ApiProblem('missing', 'Say who the first administrator is.', { fields });
}
