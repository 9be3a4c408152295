import type { Actor } from '../common/actor.js';
import { hasPermission } from '../common/permissions.js';
import type { RevisionRecord } from '../revisions/revision-record.js';
import { handsOf, mayReview, mayTakeReview, tally } from '../revisions/reviewing.policy.js';
import { mayApprove, type ApprovalGround } from '../revisions/revision.policy.js';
import { isOriginator } from '../revisions/rule-terms.js';
import type { OpenComment, OpenReport, ReviewProgress } from './desk.read-model.js';
import type { DeskItem } from './dto/desk.dto.js';

/** A revision that is worked on, and how far that has come. */
export interface OpenRevision {
  readonly record: RevisionRecord;
  readonly progress: ReviewProgress;
}

/** Drafts, and revisions in review whose turn is the originator's. */
export function draftItems(actor: Actor, open: readonly OpenRevision[]): DeskItem[] {
  return open.flatMap(({ record, progress }): DeskItem[] => {
    if (record.originatorId !== actor.id) return [];
    if (record.standing === 'draft') {
      return [
        item(record, `revision ${record.number}, not submitted yet`, revisePath(record), record.createdAt),
      ];
    }
    if (handsOf(record, progress.lastRound, progress.verdicts) === 'reviewers') return [];
    const edited = progress.lastRound?.iteration !== record.iteration;
    const line = edited
      ? `revision ${record.number}, edited and not put forward again`
      : `revision ${record.number}: changes are asked for`;
    return [item(record, line, reviewPath(record), progress.lastRound?.at ?? record.standingAt)];
  });
}

export function toReviewItems(actor: Actor, open: readonly OpenRevision[]): DeskItem[] {
  return open.flatMap(({ record, progress }): DeskItem[] => {
    const hands = handsOf(record, progress.lastRound, progress.verdicts);
    const given = progress.verdicts.some(
      ({ reviewerId, iteration }) => reviewerId === actor.id && iteration === record.iteration,
    );
    const asked = progress.reviewerIds.includes(actor.id);
    if (!asked || given || !mayReview(actor, record, hands).allowed) return [];
    const line = `revision ${record.number}, iteration ${record.iteration}: your verdict is missing`;
    return [item(record, line, reviewPath(record), progress.lastRound?.at ?? record.standingAt)];
  });
}

/** Reviews for which not enough people were found yet. */
export function toTakeItems(actor: Actor, open: readonly OpenRevision[], needed: number): DeskItem[] {
  return open.flatMap(({ record, progress: { reviewerIds, lastRound } }): DeskItem[] => {
    const wanting = needed - reviewerIds.length;
    if (wanting <= 0 || reviewerIds.includes(actor.id) || !mayTakeReview(actor, record).allowed) return [];
    const line = `revision ${record.number}: ${wanting} of ${needed} reviewers wanting`;
    return [item(record, line, reviewPath(record), lastRound?.at ?? record.standingAt)];
  });
}

/** Comments that wait for a word of this person: as the originator's answer, or as the commenter's consent to one. */
export function commentItems(actor: Actor, open: readonly OpenRevision[]): DeskItem[] {
  return open.flatMap(({ record, progress }) =>
    progress.openComments
      .filter((comment) => waitsFor(actor, record, comment))
      .map(({ field, text, byName, at, lastAnswer }) => {
        const where = field === '' ? 'the whole' : field;
        const line =
          lastAnswer === undefined
            ? `${byName} on ${where}: ${shortened(text)}`
            : `${lastAnswer.byName} answered on ${where}`;
        return item(record, line, reviewPath(record), lastAnswer?.at ?? at);
      }),
  );
}

function waitsFor(actor: Actor, record: RevisionRecord, { byId, lastAnswer }: OpenComment): boolean {
  const lastWord = lastAnswer?.byId ?? byId;
  if (lastWord === actor.id) return false;
  return isOriginator(actor, record) || byId === actor.id;
}

export function toApproveItems(
  actor: Actor,
  open: readonly OpenRevision[],
  groundFor: (record: RevisionRecord) => ApprovalGround,
): DeskItem[] {
  return open.flatMap(({ record, progress }): DeskItem[] => {
    if (!mayApprove(actor, record, progress.verdicts, groundFor(record)).allowed) return [];
    const { favourable } = tally(record.iteration, progress.verdicts);
    const line = `revision ${record.number}: ${favourable} favourable reviews`;
    return [item(record, line, reviewPath(record), record.standingAt)];
  });
}

export function reportItems(
  actor: Actor,
  reports: readonly OpenReport[],
  suspended: readonly RevisionRecord[],
  titleOf: (slug: string) => string,
): DeskItem[] {
  const decides = hasPermission(actor.roles, 'problem-report.answer');
  const concerned = (originatorId: string) => decides || originatorId === actor.id;
  return [
    ...reports
      .filter(({ originatorId }) => concerned(originatorId))
      .map(({ slug, revision, severity, text, byName, at }) => ({
        title: titleOf(slug),
        line: `${byName} reports (${severity}): ${shortened(text)}`,
        href: `/register/${slug}/revisions/${revision}`,
        at,
      })),
    ...suspended
      .filter(({ originatorId }) => concerned(originatorId))
      .map((record) =>
        item(record, `revision ${record.number} is suspended`, sheetPath(record), record.standingAt),
      ),
  ];
}

export function dueItems(actor: Actor, due: readonly RevisionRecord[], now: string): DeskItem[] {
  const decides = hasPermission(actor.roles, 'correlation.approve');
  return due
    .filter(({ originatorId }) => decides || originatorId === actor.id)
    .map((record) => {
      const day = record.reviewDue ?? now;
      const line = `revision ${record.number} ${day <= now ? 'was' : 'is'} due for review on ${day.slice(0, 10)}`;
      return item(record, line, sheetPath(record), day);
    });
}

function item({ title }: RevisionRecord, line: string, href: string, at: string): DeskItem {
  return { title, line, href, at };
}

function shortened(text: string): string {
  const characters = [...text];
  return characters.length <= 120 ? text : `${characters.slice(0, 119).join('')}…`;
}

function revisePath({ slug }: RevisionRecord): string {
  return `/register/${slug}/revise`;
}

function reviewPath({ slug, number }: RevisionRecord): string {
  return `/register/${slug}/revisions/${number}/review`;
}

function sheetPath({ slug, number }: RevisionRecord): string {
  return `/register/${slug}/revisions/${number}`;
}
