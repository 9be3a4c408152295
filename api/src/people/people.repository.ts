import { Injectable } from '@nestjs/common';
import { and, asc, eq, inArray, isNotNull } from 'drizzle-orm';
import { ROLES, type Role } from '../common/roles.js';
import { Connection, type Reader, type Tx } from '../database/connection.js';
import { person, personRole } from '../database/schema/people.js';
import { normalEmail, type NewPerson, type Person } from './person.js';

@Injectable()
export class PeopleRepository {
  constructor(private readonly connection: Connection) {}

  byId(id: string, reader: Reader = this.connection.reader): Person | undefined {
    const row = reader.select().from(person).where(eq(person.id, id)).get();
    return row && this.withRoles([row], reader)[0];
  }

  byEmail(email: string, reader: Reader = this.connection.reader): Person | undefined {
    const row = reader
      .select()
      .from(person)
      .where(eq(person.email, normalEmail(email)))
      .get();
    return row && this.withRoles([row], reader)[0];
  }

  /** Everybody who is active and has a password, by name. */
  active(reader: Reader = this.connection.reader): Person[] {
    const rows = reader
      .select()
      .from(person)
      .where(and(eq(person.active, true), isNotNull(person.passwordHash)))
      .orderBy(asc(person.name))
      .all();
    return this.withRoles(rows, reader);
  }

  /** Everybody there ever was, by name. */
  all(reader: Reader = this.connection.reader): Person[] {
    return this.withRoles(reader.select().from(person).orderBy(asc(person.name)).all(), reader);
  }

  insert(tx: Tx, id: string, values: NewPerson, at: string): void {
    const { name, email, passwordHash, roles } = values;
    tx.insert(person)
      .values({ id, name, email: normalEmail(email), passwordHash, createdAt: at })
      .run();
    this.giveRoles(tx, id, roles);
  }

  setName(tx: Tx, id: string, name: string): void {
    tx.update(person).set({ name }).where(eq(person.id, id)).run();
  }

  setActive(tx: Tx, id: string, active: boolean): void {
    tx.update(person).set({ active }).where(eq(person.id, id)).run();
  }

  setPasswordHash(tx: Tx, id: string, passwordHash: string): void {
    tx.update(person).set({ passwordHash }).where(eq(person.id, id)).run();
  }

  /** Takes what is not wanted any more before giving what is new, since some roles exclude each other. */
  setRoles(tx: Tx, { id, roles }: Pick<Person, 'id' | 'roles'>, wanted: readonly Role[]): void {
    const taken = roles.filter((role) => !wanted.includes(role));
    if (taken.length > 0) {
      tx.delete(personRole)
        .where(and(eq(personRole.personId, id), inArray(personRole.role, taken)))
        .run();
    }
    this.giveRoles(
      tx,
      id,
      wanted.filter((role) => !roles.includes(role)),
    );
  }

  private giveRoles(tx: Tx, id: string, roles: readonly Role[]): void {
    if (roles.length === 0) return;
    tx.insert(personRole)
      .values(roles.map((role) => ({ personId: id, role })))
      .run();
  }

  private withRoles(rows: (typeof person.$inferSelect)[], reader: Reader): Person[] {
    if (rows.length === 0) return [];
    const ids = rows.map((row) => row.id);
    const held = reader.select().from(personRole).where(inArray(personRole.personId, ids)).all();
    return rows.map(({ id, name, email, active, passwordHash }) => ({
      id,
      name,
      email,
      active,
      passwordHash,
      roles: ROLES.filter((role) => held.some((row) => row.personId === id && row.role === role)),
    }));
  }
}
