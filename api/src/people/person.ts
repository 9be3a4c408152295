import type { Actor } from '../common/actor.js';
import type { Role } from '../common/roles.js';

export interface Person {
  readonly id: string;
  readonly name: string;
  readonly email: string;
  readonly active: boolean;
  readonly passwordHash: string | null;
  readonly roles: readonly Role[];
}

export interface NewPerson {
  readonly name: string;
  readonly email: string;
  readonly passwordHash: string | null;
  readonly roles: readonly Role[];
}

export function actorFrom(person: Pick<Person, 'id' | 'name' | 'roles'>): Actor {
  return { id: person.id, name: person.name, roles: person.roles };
}

/** Whether an invited person took the invitation up: until then there is no password. */
export function hasJoined({ passwordHash }: Pick<Person, 'passwordHash'>): boolean {
  return passwordHash !== null;
}

/** Addresses are kept and compared in lower case. */
export function normalEmail(email: string): string {
  return email.trim().toLowerCase();
}
