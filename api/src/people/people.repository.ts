import { Injectable } from '@nestjs/common';
import { asc, eq, inArray } from 'drizzle-orm';
import { ROLES } from '../common/roles.js';
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

  /** Everybody who is active, by name. */
  active(reader: Reader = this.connection.reader): Person[] {
    const rows = reader.select().from(person).where(eq(person.active, true)).orderBy(asc(person.name)).all();
    return this.withRoles(rows, reader);
  }

  insert(tx: Tx, id: string, values: NewPerson, at: string): void {
    const { name, email, passwordHash, roles } = values;
    tx.insert(person)
      .values({ id, name, email: normalEmail(email), passwordHash, createdAt: at })
      .run();
    if (roles.length > 0) {
      tx.insert(personRole)
        .values(roles.map((role) => ({ personId: id, role })))
        .run();
    }
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
