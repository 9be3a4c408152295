import { Injectable } from '@nestjs/common';
import { SYSTEM_ACTOR } from '../common/actor.js';
import { Connection } from '../database/connection.js';
import { office } from '../database/schema/office.js';
import { Writer } from '../database/write.js';

/** Whether the office was set up, and whether it is the demo one. */
@Injectable()
export class OfficeService {
  constructor(
    private readonly connection: Connection,
    private readonly writer: Writer,
  ) {}

  isFounded(): boolean {
    return this.row() !== undefined;
  }

  isDemo(): boolean {
    return this.row()?.demo ?? false;
  }

  /** Closes the setting up of a new database. Until then an interrupted start begins again from nothing. */
  found(demo: boolean): void {
    this.writer.write(SYSTEM_ACTOR, 'office.founded', (tx, at) => {
      tx.insert(office).values({ id: 1, foundedAt: at, demo }).run();
      return { subject: 'office', detail: { demo }, result: undefined };
    });
  }

  private row(): typeof office.$inferSelect | undefined {
    return this.connection.reader.select().from(office).get();
  }
}
