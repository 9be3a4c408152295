import { randomUUID } from 'node:crypto';
import { Injectable } from '@nestjs/common';
import type { Actor } from '../common/actor.js';
import { ApiProblem } from '../common/problem.js';
import { roleConflict, type Role } from '../common/roles.js';
import { Writer } from '../database/write.js';
import { PasswordService } from './password.service.js';
import { PeopleRepository } from './people.repository.js';
import { actorFrom, normalEmail, type Person } from './person.js';

export interface PersonToAdd {
  readonly name: string;
  readonly email: string;
  readonly password: string;
  readonly roles: readonly Role[];
}

@Injectable()
export class PeopleService {
  constructor(
    private readonly people: PeopleRepository,
    private readonly passwords: PasswordService,
    private readonly writer: Writer,
  ) {}

  /** Adds a person. Throws `conflict` for roles that exclude each other, `duplicate` for a taken address. */
  async add(actor: Actor, person: PersonToAdd): Promise<Actor> {
    const { name, password, roles } = person;
    const email = normalEmail(person.email);
    const conflict = roleConflict(roles);
    if (conflict !== undefined) throw ApiProblem.ofField('conflict', 'roles', conflict);
    const passwordHash = await this.passwords.hash(password);
    const id = randomUUID();
    return this.writer.write(actor, 'person.added', (tx, at) => {
      if (this.people.byEmail(email, tx) !== undefined) {
        throw ApiProblem.ofField('duplicate', 'email', 'Somebody with this address is here already.');
      }
      this.people.insert(tx, id, { name, email, passwordHash, roles }, at);
      return { subject: `people/${id}`, detail: { name, email, roles }, result: { id, name, roles } };
    });
  }

  /** The person as an actor, if here and active. */
  activeActor(id: string): Actor | undefined {
    const person = this.people.byId(id);
    return person?.active === true ? actorFrom(person) : undefined;
  }

  /** The person with this address and password, if active. Takes the same time whoever is asked for. */
  async withCredentials(email: string, password: string): Promise<Person | undefined> {
    const person = this.people.byEmail(email);
    const fits = await this.passwords.fits(password, person?.passwordHash);
    return fits && person?.active === true ? person : undefined;
  }

  byId(id: string): Person | undefined {
    return this.people.byId(id);
  }

  byEmail(email: string): Person | undefined {
    return this.people.byEmail(email);
  }

  /** Everybody active, by name; only those with the role when one is given. */
  list(role?: Role): Person[] {
    return this.people.active().filter((person) => role === undefined || person.roles.includes(role));
  }
}
