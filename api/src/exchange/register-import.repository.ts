import { Injectable } from '@nestjs/common';
import { eq } from 'drizzle-orm';
import type { Tx } from '../database/connection.js';
import { formerJournal, formerJournalEntry, formerPerson } from '../database/schema/exchange.js';
import { geometry } from '../database/schema/geometry.js';
import { problemReport, problemReportAnswer } from '../database/schema/problem-report.js';
import { correlation, propertyEquation } from '../database/schema/register-entry.js';
import {
  approval,
  comment,
  commentAnswer,
  commentResolution,
  review,
  reviewAssignment,
  submission,
} from '../database/schema/review.js';
import { revision, revisionContent, standingEvent } from '../database/schema/revision.js';
import type { ExchangedJournal, ExchangedRegister, ExchangedRevision } from './register-format.js';

type Correlation = ExchangedRegister['correlations'][number];
type PropertyEquation = ExchangedRegister['propertyEquations'][number];
type Geometry = ExchangedRegister['geometries'][number];

/** A revision that was written, with the rows that others speak of. */
export interface WrittenRevision {
  readonly id: number;
  readonly number: number;
  readonly reportIds: readonly number[];
}

/** Writes the records of another office as they were: nobody's act here but the one that brings them in. */
@Injectable()
export class RegisterImportRepository {
  isEmpty(tx: Tx): boolean {
    const tables = [correlation, propertyEquation, formerJournal] as const;
    return tables.every((table) => tx.select().from(table).limit(1).get() === undefined);
  }

  geometry(tx: Tx, slug: string): Geometry | undefined {
    return tx.select().from(geometry).where(eq(geometry.slug, slug)).get();
  }

  insertGeometry(tx: Tx, row: Geometry): void {
    tx.insert(geometry).values(row).run();
  }

  insertPerson(tx: Tx, person: ExchangedRegister['people'][number]): void {
    tx.insert(formerPerson).values(person).run();
  }

  insertJournal(tx: Tx, place: number, { entries, checkpoints, keys }: ExchangedJournal): void {
    tx.insert(formerJournal)
      .values({ place, checkpoints: JSON.stringify(checkpoints), keys: JSON.stringify(keys) })
      .run();
    for (const [index, entry] of entries.entries()) {
      tx.insert(formerJournalEntry).values({ place, index, entry }).run();
    }
  }

  insertCorrelation(tx: Tx, { slug, geometry: place, createdAt, createdBy, revisions }: Correlation) {
    const { id } = tx
      .insert(correlation)
      .values({ slug, geometry: place, createdAt, createdBy })
      .returning({ id: correlation.id })
      .get();
    return this.insertRevisions(tx, { correlationId: id, propertyEquationId: null }, revisions);
  }

  insertPropertyEquation(tx: Tx, { slug, createdAt, createdBy, revisions }: PropertyEquation) {
    const { id } = tx
      .insert(propertyEquation)
      .values({ slug, createdAt, createdBy })
      .returning({ id: propertyEquation.id })
      .get();
    return this.insertRevisions(tx, { correlationId: null, propertyEquationId: id }, revisions);
  }

  /** Standings last: they may name the reports of any revision, and they freeze the contents. */
  private insertRevisions(
    tx: Tx,
    subject: { correlationId: number | null; propertyEquationId: number | null },
    revisions: readonly ExchangedRevision[],
  ): WrittenRevision[] {
    const written = revisions.map((one): WrittenRevision => {
      const { id } = tx
        .insert(revision)
        .values({ ...subject, number: one.number, originatorId: one.originator, createdAt: one.createdAt })
        .returning({ id: revision.id })
        .get();
      this.insertRecords(tx, id, one);
      return { id, number: one.number, reportIds: this.insertReports(tx, id, one) };
    });
    for (const [i, one] of revisions.entries()) {
      const id = written[i]?.id;
      if (id !== undefined) this.insertStandings(tx, id, one, written);
    }
    return written;
  }

  private insertRecords(tx: Tx, revisionId: number, one: ExchangedRevision): void {
    for (const { text, by, ...content } of one.contents) {
      tx.insert(revisionContent)
        .values({ revisionId, canonicalText: text, byId: by, ...content })
        .run();
    }
    for (const { by, ...row } of one.submissions) {
      tx.insert(submission)
        .values({ revisionId, byId: by, ...row })
        .run();
    }
    for (const { reviewer, by, at } of one.assignments) {
      tx.insert(reviewAssignment).values({ revisionId, reviewerId: reviewer, byId: by, at }).run();
    }
    for (const { by, byName, ...row } of one.reviews) {
      tx.insert(review)
        .values({ revisionId, reviewerId: by, reviewerName: byName, ...row })
        .run();
    }
    for (const row of one.comments) this.insertComment(tx, revisionId, row);
    if (one.approval !== null) {
      const { by, ...row } = one.approval;
      tx.insert(approval)
        .values({ revisionId, byId: by, ...row })
        .run();
    }
  }

  private insertComment(tx: Tx, revisionId: number, row: ExchangedRevision['comments'][number]): void {
    const { by, answers, resolution, ...said } = row;
    const { id } = tx
      .insert(comment)
      .values({ revisionId, byId: by, ...said })
      .returning({ id: comment.id })
      .get();
    for (const answer of answers) {
      tx.insert(commentAnswer)
        .values({ commentId: id, text: answer.text, ...signer(answer) })
        .run();
    }
    if (resolution !== null) {
      tx.insert(commentResolution)
        .values({ commentId: id, ...signer(resolution) })
        .run();
    }
  }

  private insertReports(tx: Tx, revisionId: number, one: ExchangedRevision): number[] {
    return one.problemReports.map(({ by, answer, ...row }) => {
      const { id } = tx
        .insert(problemReport)
        .values({ revisionId, byId: by, ...row })
        .returning({ id: problemReport.id })
        .get();
      if (answer !== null) {
        const { outcome, text } = answer;
        tx.insert(problemReportAnswer)
          .values({ reportId: id, outcome, text, ...signer(answer) })
          .run();
      }
      return id;
    });
  }

  private insertStandings(
    tx: Tx,
    revisionId: number,
    { standings }: ExchangedRevision,
    written: readonly WrittenRevision[],
  ): void {
    for (const { by, class: withdrawalClass, problemReport: about, ...row } of standings) {
      const reports = written.find(({ number }) => number === about?.revision)?.reportIds ?? [];
      const problemReportId = about === null ? null : (reports[about.place] ?? null);
      tx.insert(standingEvent)
        .values({ revisionId, byId: by, withdrawalClass, problemReportId, ...row })
        .run();
    }
  }
}

function signer({ by, byName, at }: { by: string; byName: string; at: string }) {
  return { byId: by, byName, at };
}
