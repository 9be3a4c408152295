import { Injectable } from '@nestjs/common';
import { ANONYMOUS_ACTOR, type Actor } from '../common/actor.js';
import { ApiProblem } from '../common/problem.js';
import type { Role } from '../common/roles.js';
import { Config } from '../config/config.js';
import type { Tx } from '../database/connection.js';
import { Writer } from '../database/write.js';
import { invitationLetter } from '../mail/letters.js';
import { MailService } from '../mail/mail.service.js';
import { officeAddress } from '../mail/office-address.js';
import type { ManagedPerson } from '../people/dto/people-response.dto.js';
import { OneTimeLinkService } from '../people/one-time-link.service.js';
import { PasswordService } from '../people/password.service.js';
import { PeopleAdministrationService } from '../people/people-administration.service.js';
import { mayHaveRoles } from '../people/people.policy.js';
import { PeopleService } from '../people/people.service.js';
import { hasJoined, normalEmail, type Person } from '../people/person.js';
import { SettingsService } from '../settings/settings.service.js';
import type { AcceptanceDto, InvitationResponse, JoinedResponse } from './dto/invitations.dto.js';
import { FirstAdministratorService } from './first-administrator.service.js';

export interface Invitation {
  readonly name: string;
  readonly email: string;
  readonly roles: readonly Role[];
}

/** People come in by a link sent to their address, which works once and for seven days. */
@Injectable()
export class InvitationsService {
  constructor(
    private readonly people: PeopleService,
    private readonly administration: PeopleAdministrationService,
    private readonly links: OneTimeLinkService,
    private readonly passwords: PasswordService,
    private readonly mail: MailService,
    private readonly settings: SettingsService,
    private readonly first: FirstAdministratorService,
    private readonly writer: Writer,
    private readonly config: Config,
  ) {}

  /**
   * Invites somebody; whoever was invited and has not joined yet is invited anew, with the name and roles now given,
   * and the former link is void. Throws `duplicate` at `email` for somebody who is here.
   */
  invite(actor: Actor, { name, roles, ...given }: Invitation): ManagedPerson {
    const email = normalEmail(given.email);
    const id = this.writer.write(actor, 'person.invited', (tx, at) => {
      const decision = mayHaveRoles([], roles);
      if (!decision.allowed) throw ApiProblem.ofField(decision.code, 'roles', decision.reason);
      const before = this.people.byEmail(email, tx);
      const personId =
        before === undefined
          ? this.add(tx, at, { name, email, roles })
          : this.renew(tx, before, { name, email, roles });
      const token = this.links.make(tx, at, 'invitation', personId);
      this.mail.post(tx, at, {
        to: email,
        ...invitationLetter({
          officeName: this.settings.current(tx).officeName,
          name,
          invitedBy: actor.name,
          link: officeAddress(this.config, `/invitation/${token}`),
        }),
      });
      const detail = { name, email, roles, again: before !== undefined };
      return { subject: `people/${personId}`, detail, result: personId };
    });
    return this.administration.entry(id);
  }

  /** Whom an invitation is for; the first administrator is yet to say. */
  show(token: string): InvitationResponse {
    const { personId } = this.links.look(token, ['invitation', 'first-administrator']);
    if (personId === null) return { name: null, email: null };
    const { name, email } = this.invited(personId);
    return { name, email };
  }

  /** Takes an invitation up. Throws at `password` (and of the first administrator at `name` and `email`). */
  async accept(token: string, given: AcceptanceDto): Promise<JoinedResponse> {
    const { personId } = this.links.look(token, ['invitation', 'first-administrator']);
    if (personId === null) return this.first.accept(token, given);
    const { name, email } = this.invited(personId);
    const passwordHash = await this.passwords.choose(given.password, { name, email });
    return this.writer.write(ANONYMOUS_ACTOR, 'person.joined', (tx, at) => {
      this.links.use(tx, at, token, ['invitation']);
      const person = this.invited(personId, tx);
      this.people.setPasswordHash(tx, person.id, passwordHash);
      const result = { name: person.name, email: person.email };
      return { subject: `people/${personId}`, detail: {}, result };
    });
  }

  private add(tx: Tx, at: string, { name, email, roles }: Invitation): string {
    return this.people.insert(tx, at, { name, email, roles, passwordHash: null });
  }

  private renew(tx: Tx, before: Person, { name, roles }: Invitation): string {
    if (hasJoined(before)) {
      throw ApiProblem.ofField('duplicate', 'email', 'Somebody with this address is here already.');
    }
    if (!before.active) {
      throw ApiProblem.ofField(
        'conflict',
        'email',
        'Whoever has this address was made inactive; make them active first.',
      );
    }
    this.people.setName(tx, before.id, name);
    this.people.setRoles(tx, before, roles);
    return before.id;
  }

  /** Somebody made inactive in the meantime, or who has joined, does not come in by an old link. */
  private invited(id: string, tx?: Tx): Person {
    const person = this.people.byId(id, tx);
    if (person?.active !== true || hasJoined(person)) {
      throw new ApiProblem('not-found', 'This link does not hold, or not any more. Ask for a new one.');
    }
    return person;
  }
}
