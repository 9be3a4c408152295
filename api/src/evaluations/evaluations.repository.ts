import { Injectable } from '@nestjs/common';
import { eq } from 'drizzle-orm';
import { Connection, type Tx } from '../database/connection.js';
import { evaluation } from '../database/schema/evaluation.js';

export type EvaluationRow = typeof evaluation.$inferSelect;

/** The usage table: every evaluation that gave a number. */
@Injectable()
export class EvaluationsRepository {
  constructor(private readonly connection: Connection) {}

  insert(tx: Tx, row: EvaluationRow): void {
    tx.insert(evaluation).values(row).run();
  }

  find(id: string): EvaluationRow | undefined {
    return this.connection.reader.select().from(evaluation).where(eq(evaluation.id, id)).get();
  }
}
