import { Injectable } from '@nestjs/common';
import { eq } from 'drizzle-orm';
import { Connection } from '../database/connection.js';
import { formerPerson } from '../database/schema/exchange.js';
import { person } from '../database/schema/people.js';

/** Names of people whom records name: those of this office, and those of the office that a register came from. */
@Injectable()
export class NamesReadModel {
  constructor(private readonly connection: Connection) {}

  name(id: string): string | undefined {
    const { reader } = this.connection;
    const here = reader.select({ name: person.name }).from(person).where(eq(person.id, id)).get();
    if (here !== undefined) return here.name;
    return reader.select({ name: formerPerson.name }).from(formerPerson).where(eq(formerPerson.id, id)).get()
      ?.name;
  }
}
