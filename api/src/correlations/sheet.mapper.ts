import type { CheckReport, CompiledCorrelation } from '@merestone/engine';
import type { Actor } from '../common/actor.js';
import { CAUTION } from '../revisions/caution.js';
import { countRemarks, keptInspection } from '../revisions/kept-inspection.js';
import { handsOf, isCurrent, mayComment, mayReview } from '../revisions/reviewing.policy.js';
import type { RevisionRecord } from '../revisions/revision-record.js';
import {
  mayApprove,
  mayDecline,
  mayEdit,
  mayEvaluate,
  mayReinstate,
  maySubmit,
  maySuspend,
  mayWithdraw,
  type ApprovalGround,
} from '../revisions/revision.policy.js';
import type { Sheet, SheetAbilities } from './dto/sheet.dto.js';
import type { RevisionFile } from './sheet.read-model.js';

/** All that a sheet is put together from. */
export interface SheetParts {
  readonly actor: Actor;
  /** What the office says on an approval by the caller. */
  readonly ground: ApprovalGround;
  readonly record: RevisionRecord;
  readonly compiled: CompiledCorrelation;
  /** The revisions of the correlation that the caller may see. */
  readonly revisions: readonly RevisionRecord[];
  readonly file: RevisionFile;
  readonly checks: readonly CheckReport[];
  readonly equations: Sheet['equations'];
  readonly originatorName: string;
  readonly successor: Sheet['successor'];
  readonly geometryName: string;
}

export function sheet(parts: SheetParts): Sheet {
  const { record, compiled, file } = parts;
  const { definition } = compiled;
  return {
    slug: record.slug,
    title: definition.title,
    geometry: definition.geometry,
    geometryName: parts.geometryName,
    standing: record.standing,
    revision: record.number,
    iteration: record.iteration,
    hash: record.hash,
    definition,
    originator: { id: record.originatorId, name: parts.originatorName },
    revisions: parts.revisions.map(({ number, standing, hash, standingAt }) => ({
      number,
      standing,
      hash,
      at: standingAt,
    })),
    ...onRecord(record, file),
    checks: [...parts.checks],
    standingNote: record.standing === 'approved' ? null : record.standingNote,
    usage: { evaluations: file.evaluations, calculations: 0 },
    equations: parts.equations,
    abilities: abilities(parts),
    effectiveFrom: record.effectiveFrom,
    reviewDue: record.reviewDue,
    inForce: record.inForce,
    successor: parts.successor,
    ...outOfUse(record, file),
    openReports: file.openReports,
    inspection: inspectionSummary(file),
    caution: CAUTION,
  };
}

/** Why it may not be used, from the standing event that says so. */
function outOfUse(
  { standing }: RevisionRecord,
  { history }: RevisionFile,
): Pick<Sheet, 'withdrawal' | 'suspension'> {
  const last = history.at(-1);
  if (last === undefined || last.standing !== standing) return { withdrawal: null, suspension: null };
  const said = { reason: last.note ?? '', by: { id: last.byId, name: last.byName }, at: last.at };
  return {
    withdrawal:
      standing === 'withdrawn' && last.withdrawalClass !== null
        ? { ...said, class: last.withdrawalClass }
        : null,
    suspension: standing === 'suspended' ? { ...said, problemReport: last.problemReportId } : null,
  };
}

function inspectionSummary({ submission }: RevisionFile): Sheet['inspection'] {
  if (submission === undefined) return null;
  const report = keptInspection(submission.report);
  const { warnings, errors } = countRemarks(report);
  return { passed: report.passed, warnings, errors };
}

function onRecord(
  record: RevisionRecord,
  { history, reviews, comments, approval }: RevisionFile,
): Pick<Sheet, 'history' | 'reviews' | 'comments' | 'approval'> {
  return {
    history: history.map(({ standing, at, byId, byName, note, withdrawalClass }) => ({
      standing,
      at,
      by: { id: byId, name: byName },
      note,
      class: withdrawalClass,
    })),
    reviews: reviews.map((row) => ({
      reviewer: { id: row.reviewerId, name: row.reviewerName },
      verdict: row.verdict,
      at: row.at,
      note: row.note,
      hash: row.hash,
      current: isCurrent(row, record.iteration, reviews),
    })),
    comments: comments.map(({ id, field, text, byId, byName, at, hash }) => ({
      id,
      field,
      text,
      by: { id: byId, name: byName },
      at,
      hash,
    })),
    approval: approval
      ? {
          by: { id: approval.byId, name: approval.byName },
          at: approval.at,
          meaning: approval.meaning,
          hash: approval.hash,
        }
      : null,
  };
}

function abilities({ actor, record, file: { reviews, submission }, ground }: SheetParts): SheetAbilities {
  return {
    evaluate: mayEvaluate(actor, record).allowed,
    edit: mayEdit(actor, record).allowed,
    submit: maySubmit(actor, record).allowed,
    comment: mayComment(actor).allowed,
    review: mayReview(actor, record, handsOf(record, submission, reviews)).allowed,
    approve: mayApprove(actor, record, reviews, ground).allowed,
    decline: mayDecline(actor, record, ground).allowed,
    suspend: maySuspend(actor, record).allowed,
    reinstate: mayReinstate(actor, record).allowed,
    withdraw: mayWithdraw(actor, record).allowed,
  };
}
