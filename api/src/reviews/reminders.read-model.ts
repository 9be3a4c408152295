import { Injectable } from '@nestjs/common';
import { eq } from 'drizzle-orm';
import { Connection } from '../database/connection.js';
import { notice } from '../database/schema/notices.js';

@Injectable()
export class RemindersReadModel {
  constructor(private readonly connection: Connection) {}

  /** Whether anybody was told under this key already. */
  wasTold(once: string): boolean {
    return (
      this.connection.reader.select({ id: notice.id }).from(notice).where(eq(notice.onceKey, once)).get() !==
      undefined
    );
  }
}
