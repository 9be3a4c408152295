import { randomUUID } from 'node:crypto';
import { Injectable } from '@nestjs/common';
import type { Actor } from '../common/actor.js';
import { ApiProblem } from '../common/problem.js';
import { roleConflict, type Role } from '../common/roles.js';
import type { Reader, Tx } from '../database/connection.js';
import { Writer } from '../database/write.js';
import { PasswordService } from './password.service.js';
import { PeopleRepository } from './people.repository.js';
import { actorFrom, hasJoined, normalEmail, type NewPerson, type Person } from './person.js';

export interface PersonToAdd {
  readonly name: string;
  readonly email: string;
  readonly password: string;
  readonly roles: readonly Role[];
}

/** What the other features do with people. */
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
    const passwordHash = await this.passwords.hash(password);
    return this.writer.write(actor, 'person.added', (tx, at) => {
      const id = this.insert(tx, at, { name, email, passwordHash, roles });
      return { subject: `people/${id}`, detail: { name, email, roles }, result: { id, name, roles } };
    });
  }

  /** The same within an act of another feature; gives the id. Without a hash the person has yet to join. */
  insert(tx: Tx, at: string, person: NewPerson): string {
    const conflict = roleConflict(person.roles);
    if (conflict !== undefined) throw ApiProblem.ofField('conflict', 'roles', conflict);
    if (this.people.byEmail(person.email, tx) !== undefined) {
      throw ApiProblem.ofField('duplicate', 'email', 'Somebody with this address is here already.');
    }
    const id = randomUUID();
    this.people.insert(tx, id, person, at);
    return id;
  }

  setPasswordHash(tx: Tx, id: string, passwordHash: string): void {
    this.people.setPasswordHash(tx, id, passwordHash);
  }

  setName(tx: Tx, id: string, name: string): void {
    this.people.setName(tx, id, name);
  }

  /** Throws `conflict` for roles that exclude each other. */
  setRoles(tx: Tx, person: Person, roles: readonly Role[]): void {
    const conflict = roleConflict(roles);
    if (conflict !== undefined) throw ApiProblem.ofField('conflict', 'roles', conflict);
    this.people.setRoles(tx, person, roles);
  }

  /** The person as an actor, if here, active and joined. */
  activeActor(id: string): Actor | undefined {
    const person = this.people.byId(id);
    return person?.active === true && hasJoined(person) ? actorFrom(person) : undefined;
  }

  /** The person with this address and password, if active. Takes the same time whoever is asked for. */
  async withCredentials(email: string, password: string): Promise<Person | undefined> {
    const person = this.people.byEmail(email);
    const fits = await this.passwords.fits(password, person?.passwordHash);
    return fits && person?.active === true ? person : undefined;
  }

  byId(id: string, reader?: Reader): Person | undefined {
    return this.people.byId(id, reader);
  }

  byEmail(email: string, reader?: Reader): Person | undefined {
    return this.people.byEmail(email, reader);
  }

  /** Everybody active, by name; only those with the role when one is given. Who has yet to join is left out. */
  list(role?: Role, reader?: Reader): Person[] {
    return this.people.active(reader).filter((person) => role === undefined || person.roles.includes(role));
  }
}
