import { Injectable } from '@nestjs/common';
import { desc, eq } from 'drizzle-orm';
import type { Actor } from '../common/actor.js';
import type { Authorized } from '../common/authorized.js';
import type { ReportOutcome, ReportSeverity } from '../common/problem-report.js';
import { Connection, type Reader, type Tx } from '../database/connection.js';
import { problemReport, problemReportAnswer } from '../database/schema/problem-report.js';
import { correlation } from '../database/schema/register-entry.js';
import { revision } from '../database/schema/revision.js';
import type { RevisionRecord } from '../revisions/revision-record.js';

/** A report with what became of it. */
export interface ReportRecord {
  readonly id: number;
  readonly slug: string;
  readonly revision: number;
  readonly hash: string;
  readonly severity: ReportSeverity;
  readonly text: string;
  readonly byId: string;
  readonly byName: string;
  readonly at: string;
  readonly answer: {
    readonly outcome: ReportOutcome;
    readonly text: string;
    readonly byId: string;
    readonly byName: string;
    readonly at: string;
  } | null;
}

@Injectable()
export class ProblemReportsRepository {
  constructor(private readonly connection: Connection) {}

  find(id: number, reader: Reader = this.connection.reader): ReportRecord | undefined {
    return this.select(reader).where(eq(problemReport.id, id)).get();
  }

  /** Those on a correlation, the latest first. */
  of(slug: string, reader: Reader = this.connection.reader): ReportRecord[] {
    return this.select(reader).where(eq(correlation.slug, slug)).orderBy(desc(problemReport.id)).all();
  }

  insert(
    tx: Tx,
    { id, hash }: Authorized<RevisionRecord>,
    by: Actor,
    at: string,
    values: { severity: ReportSeverity; text: string },
  ): number {
    return tx
      .insert(problemReport)
      .values({ revisionId: id, hash, byId: by.id, byName: by.name, at, ...values })
      .returning({ id: problemReport.id })
      .get().id;
  }

  insertAnswer(
    tx: Tx,
    { id }: Authorized<ReportRecord>,
    by: Actor,
    at: string,
    values: { outcome: ReportOutcome; text: string },
  ): void {
    tx.insert(problemReportAnswer)
      .values({ reportId: id, byId: by.id, byName: by.name, at, ...values })
      .run();
  }

  private select(reader: Reader) {
    return reader
      .select({
        id: problemReport.id,
        slug: correlation.slug,
        revision: revision.number,
        hash: problemReport.hash,
        severity: problemReport.severity,
        text: problemReport.text,
        byId: problemReport.byId,
        byName: problemReport.byName,
        at: problemReport.at,
        answer: {
          outcome: problemReportAnswer.outcome,
          text: problemReportAnswer.text,
          byId: problemReportAnswer.byId,
          byName: problemReportAnswer.byName,
          at: problemReportAnswer.at,
        },
      })
      .from(problemReport)
      .innerJoin(revision, eq(revision.id, problemReport.revisionId))
      .innerJoin(correlation, eq(correlation.id, revision.correlationId))
      .leftJoin(problemReportAnswer, eq(problemReportAnswer.reportId, problemReport.id))
      .$dynamic();
  }
}
