import { SYSTEM_ACTOR } from '../common/actor.js';
import { grouped } from './grouped.js';
import type { RegisterRows } from './register-export.read-model.js';
import {
  REGISTER_FORMAT,
  type ExchangedJournal,
  type ExchangedRegister,
  type ExchangedRevision,
} from './register-format.js';

/** The register as a file: the same records give the same file, whatever numbers their rows have. */
export function registerFile(
  rows: RegisterRows,
  journals: ExchangedJournal[],
  nameOf: (personId: string) => string,
): ExchangedRegister {
  const of = new RevisionFiles(rows);
  const file = {
    format: REGISTER_FORMAT,
    geometries: rows.geometries.map(({ slug, name, summary, characteristicLength, velocity, cautions }) => ({
      slug,
      name,
      summary,
      characteristicLength,
      velocity,
      cautions,
    })),
    propertyEquations: rows.propertyEquations.map(({ id, slug, createdAt, createdBy }) => ({
      slug,
      createdAt,
      createdBy,
      revisions: of.subject(({ propertyEquationId }) => propertyEquationId === id),
    })),
    correlations: rows.correlations.map(({ id, slug, geometry, createdAt, createdBy }) => ({
      slug,
      geometry,
      createdAt,
      createdBy,
      revisions: of.subject(({ correlationId }) => correlationId === id),
    })),
    journals,
  } as const;
  const people = [...namedIn(file)]
    .filter((id) => id !== SYSTEM_ACTOR.id)
    .sort()
    .map((id) => ({ id, name: nameOf(id) }));
  return { ...file, people };
}

type Row<K extends keyof RegisterRows> = RegisterRows[K][number];

/** Puts the rows of each revision together. */
class RevisionFiles {
  private readonly contents;
  private readonly standings;
  private readonly submissions;
  private readonly assignments;
  private readonly reviews;
  private readonly comments;
  private readonly approvals;
  private readonly reports;
  private readonly answers;
  private readonly resolutions;
  private readonly reportAnswers;
  private readonly numbers;
  private readonly reportOf;

  constructor(private readonly rows: RegisterRows) {
    const byRevision = <T extends { readonly revisionId: number }>(list: T[]) =>
      grouped(list, ({ revisionId }) => revisionId);
    this.contents = byRevision(rows.contents);
    this.standings = byRevision(rows.standings);
    this.submissions = byRevision(rows.submissions);
    this.assignments = byRevision(rows.assignments);
    this.reviews = byRevision(rows.reviews);
    this.comments = byRevision(rows.comments);
    this.approvals = byRevision(rows.approvals);
    this.reports = byRevision(rows.reports);
    this.answers = grouped(rows.answers, ({ commentId }) => commentId);
    this.resolutions = new Map(rows.resolutions.map((row) => [row.commentId, row]));
    this.reportAnswers = new Map(rows.reportAnswers.map((row) => [row.reportId, row]));
    this.numbers = new Map(rows.revisions.map(({ id, number }) => [id, number]));
    this.reportOf = new Map(rows.reports.map((row) => [row.id, row]));
  }

  subject(belongs: (row: Row<'revisions'>) => boolean): ExchangedRevision[] {
    return this.rows.revisions.filter(belongs).map((row) => this.revision(row));
  }

  private revision({ id, number, originatorId, createdAt }: Row<'revisions'>): ExchangedRevision {
    const [signed] = this.approvals.get(id) ?? [];
    return {
      number,
      originator: originatorId,
      createdAt,
      contents: (this.contents.get(id) ?? []).map(({ iteration, format, canonicalText, hash, at, byId }) => ({
        iteration,
        format,
        text: canonicalText,
        hash,
        at,
        by: byId,
      })),
      standings: (this.standings.get(id) ?? []).map((row) => ({
        standing: row.standing,
        hash: row.hash,
        ...signer(row),
        note: row.note,
        class: row.withdrawalClass,
        successor: row.successor,
        problemReport: this.reportPlace(row.problemReportId),
      })),
      submissions: (this.submissions.get(id) ?? []).map((row) => ({
        hash: row.hash,
        iteration: row.iteration,
        round: row.round,
        note: row.note,
        ...signer(row),
        engine: row.engine,
        report: row.report,
      })),
      assignments: (this.assignments.get(id) ?? []).map(({ reviewerId, at, byId }) => ({
        reviewer: reviewerId,
        at,
        by: byId,
      })),
      reviews: (this.reviews.get(id) ?? []).map((row) => ({
        hash: row.hash,
        iteration: row.iteration,
        round: row.round,
        by: row.reviewerId,
        byName: row.reviewerName,
        at: row.at,
        verdict: row.verdict,
        checklist: row.checklist,
        note: row.note,
      })),
      comments: (this.comments.get(id) ?? []).map((row) => this.comment(row)),
      approval:
        signed === undefined
          ? null
          : {
              hash: signed.hash,
              ...signer(signed),
              meaning: signed.meaning,
              note: signed.note,
              effectiveFrom: signed.effectiveFrom,
              reviewDue: signed.reviewDue,
            },
      problemReports: (this.reports.get(id) ?? []).map((row) => this.report(row)),
    };
  }

  private comment(row: Row<'comments'>): ExchangedRevision['comments'][number] {
    const resolution = this.resolutions.get(row.id);
    return {
      hash: row.hash,
      iteration: row.iteration,
      field: row.field,
      text: row.text,
      ...signer(row),
      answers: (this.answers.get(row.id) ?? []).map((answer) => ({ text: answer.text, ...signer(answer) })),
      resolution: resolution === undefined ? null : signer(resolution),
    };
  }

  private report(row: Row<'reports'>): ExchangedRevision['problemReports'][number] {
    const answer = this.reportAnswers.get(row.id);
    return {
      hash: row.hash,
      severity: row.severity,
      text: row.text,
      ...signer(row),
      answer: answer === undefined ? null : { outcome: answer.outcome, text: answer.text, ...signer(answer) },
    };
  }

  private reportPlace(id: number | null): ExchangedRevision['standings'][number]['problemReport'] {
    const report = id === null ? undefined : this.reportOf.get(id);
    if (report === undefined) return null;
    const place = (this.reports.get(report.revisionId) ?? []).indexOf(report);
    return { revision: this.numbers.get(report.revisionId) ?? 0, place };
  }
}

function signer({ byId, byName, at }: { byId: string; byName: string; at: string }) {
  return { by: byId, byName, at };
}

/** Every person named by id anywhere in a register. */
export function namedIn({
  correlations,
  propertyEquations,
}: Pick<ExchangedRegister, 'correlations' | 'propertyEquations'>): Set<string> {
  const named = new Set<string>();
  for (const { createdBy, revisions } of [...correlations, ...propertyEquations]) {
    named.add(createdBy);
    for (const one of revisions) {
      named.add(one.originator);
      for (const { reviewer } of one.assignments) named.add(reviewer);
      for (const { by } of signedIn(one)) named.add(by);
    }
  }
  return named;
}

function signedIn(one: ExchangedRevision): readonly { readonly by: string }[] {
  return [
    ...one.contents,
    ...one.standings,
    ...one.submissions,
    ...one.assignments,
    ...one.reviews,
    ...one.comments.flatMap(({ by, answers, resolution }) => [{ by }, ...answers, ...present(resolution)]),
    ...present(one.approval),
    ...one.problemReports.flatMap(({ by, answer }) => [{ by }, ...present(answer)]),
  ];
}

function present<T>(value: T | null): T[] {
  return value === null ? [] : [value];
}
