import { Injectable } from '@nestjs/common';
import type { Actor } from '../common/actor.js';
import { authorize } from '../common/authorized.js';
import { hasPermission } from '../common/permissions.js';
import { ApiProblem } from '../common/problem.js';
import type { Role } from '../common/roles.js';
import type { Tx } from '../database/connection.js';
import { Writer } from '../database/write.js';
import { Departures } from './departures.js';
import {
  managedPerson,
  peopleResponse,
  type ManagedPerson,
  type PeopleResponse,
} from './dto/people-response.dto.js';
import { PeopleRepository } from './people.repository.js';
import { mayDeactivate, mayDoWithout, mayHaveRoles, mayReactivate } from './people.policy.js';
import type { Person } from './person.js';
import { SignInsReadModel } from './sign-ins.read-model.js';

export interface PersonChange {
  readonly name?: string | undefined;
  readonly roles?: readonly Role[] | undefined;
}

/** What administrators do with people. */
@Injectable()
export class PeopleAdministrationService {
  constructor(
    private readonly people: PeopleRepository,
    private readonly signIns: SignInsReadModel,
    private readonly departures: Departures,
    private readonly writer: Writer,
  ) {}

  /** Administrators see everybody and all that is needed to look after them; others see who is here. */
  list(actor: Actor): PeopleResponse {
    if (!hasPermission(actor.roles, 'people.manage')) return peopleResponse(this.people.active());
    return { items: this.people.all().map((person) => this.managed(person)) };
  }

  entry(id: string): ManagedPerson {
    return this.managed(this.one(id));
  }

  /** Throws at `roles` where they exclude each other, make an authority or leave no administrator. */
  change(actor: Actor, id: string, { name, roles }: PersonChange): ManagedPerson {
    if (name === undefined && roles === undefined) {
      throw new ApiProblem('missing', 'Say what is to be changed: the name, the roles or both.');
    }
    this.writer.write(actor, 'person.changed', (tx, at) => {
      const before = this.one(id, tx);
      if (name !== undefined) this.people.setName(tx, id, name);
      if (roles !== undefined) this.changeRoles(tx, at, actor, before, roles);
      const detail = {
        ...(name === undefined ? {} : { name: { from: before.name, to: name } }),
        ...(roles === undefined ? {} : { roles: { from: before.roles, to: roles } }),
      };
      return { subject: `people/${id}`, detail, result: undefined };
    });
    return this.entry(id);
  }

  /** Ends everything that the person has open here, at once. */
  deactivate(actor: Actor, id: string, reason: string): ManagedPerson {
    this.writer.write(actor, 'person.deactivated', (tx, at) => {
      const found = this.one(id, tx);
      const person = authorize(found, mayDeactivate(actor.id, found, this.administrators(tx)));
      this.people.setActive(tx, person.id, false);
      this.departures.tell(tx, { personId: id, from: 'office', by: actor, at, reason });
      return { subject: `people/${id}`, detail: { reason }, result: undefined };
    });
    return this.entry(id);
  }

  /** What was ended stays ended: the person signs in anew. */
  reactivate(actor: Actor, id: string, reason: string): ManagedPerson {
    this.writer.write(actor, 'person.reactivated', (tx) => {
      const found = this.one(id, tx);
      const person = authorize(found, mayReactivate(found));
      this.people.setActive(tx, person.id, true);
      return { subject: `people/${id}`, detail: { reason }, result: undefined };
    });
    return this.entry(id);
  }

  private changeRoles(tx: Tx, at: string, by: Actor, before: Person, roles: readonly Role[]): void {
    const decisions = [mayHaveRoles(before.roles, roles)];
    const leaves = (role: Role): boolean => before.roles.includes(role) && !roles.includes(role);
    if (leaves('administrator')) decisions.push(mayDoWithout(before, this.administrators(tx)));
    for (const decision of decisions) {
      if (!decision.allowed) throw ApiProblem.ofField(decision.code, 'roles', decision.reason);
    }
    this.people.setRoles(tx, before, roles);
    if (!leaves('authority')) return;
    const reason = 'The role of technical authority was taken.';
    this.departures.tell(tx, { personId: before.id, from: 'authority', by, at, reason });
  }

  private administrators(tx: Tx): Person[] {
    return this.people.active(tx).filter(({ roles }) => roles.includes('administrator'));
  }

  private one(id: string, tx?: Tx): Person {
    const person = this.people.byId(id, tx);
    if (person === undefined) throw new ApiProblem('not-found', 'There is no such person.');
    return person;
  }

  private managed(person: Person): ManagedPerson {
    return managedPerson(person, this.signIns.last(person.id));
  }
}
