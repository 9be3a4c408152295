import { compareDefinitions, type CorrelationDefinition } from '@merestone/engine';
import type { Actor } from '../common/actor.js';
import { keptInspection } from '../revisions/kept-inspection.js';
import type { CommentFacts } from '../revisions/revision-facts.js';
import type { RevisionRecord } from '../revisions/revision-record.js';
import {
  handsOf,
  isCurrent,
  mayAnswer,
  mayComment,
  mayPutForward,
  mayResolve,
  mayReview,
  mayTakeReview,
  tally,
} from '../revisions/reviewing.policy.js';
import {
  mayApprove,
  mayDecline,
  mayEdit,
  mayReinstate,
  maySuspend,
  mayWithdraw,
  type ApprovalGround,
} from '../revisions/revision.policy.js';
import type { ReviewAbilities, ReviewComment, ReviewIteration, ReviewPage } from './dto/review-page.dto.js';
import type { CommentRow, IterationRow, ReviewFile } from './review-page.read-model.js';

/** All that the page of a review is put together from. */
export interface ReviewPageParts {
  readonly actor: Actor;
  readonly ground: ApprovalGround;
  readonly record: RevisionRecord;
  readonly definition: CorrelationDefinition;
  readonly file: ReviewFile;
  readonly nameOf: (personId: string) => string;
}

export function reviewPage(parts: ReviewPageParts): ReviewPage {
  const { record, definition, file, ground, nameOf } = parts;
  const last = file.submissions.at(-1);
  const { favourable } = tally(record.iteration, file.reviews);
  return {
    slug: record.slug,
    title: definition.title,
    revision: record.number,
    iteration: record.iteration,
    hash: record.hash,
    standing: record.standing,
    originator: { id: record.originatorId, name: nameOf(record.originatorId) },
    hands: handsOf(record, last, file.reviews),
    definition,
    inspection: last === undefined ? null : keptInspection(last.report),
    reviewersNeeded: ground.reviewsNeeded,
    assignments: file.assignments.map(({ reviewerId, byId, at }) => ({
      reviewer: { id: reviewerId, name: nameOf(reviewerId) },
      how: byId === reviewerId ? 'taken' : 'named',
      at,
    })),
    verdicts: file.reviews.map((row) => ({
      reviewer: { id: row.reviewerId, name: row.reviewerName },
      verdict: row.verdict,
      checklist: row.checklist,
      note: row.note,
      at: row.at,
      iteration: row.iteration,
      hash: row.hash,
      current: isCurrent(row, record.iteration, file.reviews),
    })),
    comments: file.comments.map((row) => reviewComment(parts, row)),
    rounds: file.submissions.map(({ round, iteration, at, note, byId, byName }) => ({
      round,
      iteration,
      at,
      note,
      by: { id: byId, name: byName },
    })),
    iterations: iterations(file),
    abilities: abilities(parts),
    approvals: { favourable, needed: ground.reviewsNeeded },
  };
}

function reviewComment({ actor, record }: ReviewPageParts, row: CommentRow): ReviewComment {
  const { comment, resolution, answers } = row;
  const facts = factsOf(row);
  return {
    id: comment.id,
    field: comment.field,
    text: comment.text,
    by: { id: comment.byId, name: comment.byName },
    at: comment.at,
    iteration: comment.iteration,
    resolved: resolution && { by: { id: resolution.byId, name: resolution.byName }, at: resolution.at },
    answers: answers.map(({ id, text, byId, byName, at }) => ({
      id,
      text,
      by: { id: byId, name: byName },
      at,
    })),
    abilities: {
      answer: mayAnswer(actor, facts).allowed,
      resolve: mayResolve(actor, record, facts).allowed,
    },
  };
}

function factsOf({ comment, resolution, answers }: CommentRow): CommentFacts {
  return { byId: comment.byId, resolved: resolution !== null, answers: answers.length };
}

/**
 * What reviewers had before them, or spoke of, and the present content; each with what changed since the one before.
 * What an originator kept on the way to a submission is not shown.
 */
function iterations({ iterations: all, submissions, reviews, comments }: ReviewFile): ReviewIteration[] {
  const spokenOf = new Set([
    ...[...submissions, ...reviews].map(({ iteration }) => iteration),
    ...comments.map(({ comment }) => comment.iteration),
  ]);
  const shown = all.filter(({ iteration }, i) => i === all.length - 1 || spokenOf.has(iteration));
  return shown.map((row, i) => {
    const before = shown[i - 1];
    return {
      number: row.iteration,
      at: row.at,
      hash: row.hash,
      differences: before === undefined ? [] : compareDefinitions(definitionOf(before), definitionOf(row)),
    };
  });
}

function definitionOf({ canonicalText }: IterationRow): CorrelationDefinition {
  return JSON.parse(canonicalText) as CorrelationDefinition;
}

function abilities({ actor, record, file, ground }: ReviewPageParts): ReviewAbilities {
  const hands = handsOf(record, file.submissions.at(-1), file.reviews);
  const assigned = file.assignments.some(({ reviewerId }) => reviewerId === actor.id);
  return {
    take: !assigned && mayTakeReview(actor, record).allowed,
    comment: mayComment(actor).allowed,
    resolve: file.comments.some((row) => mayResolve(actor, record, factsOf(row)).allowed),
    verdict: mayReview(actor, record, hands).allowed,
    putForward: mayPutForward(actor, record, hands).allowed,
    approve: mayApprove(actor, record, file.reviews, ground).allowed,
    decline: mayDecline(actor, record, ground).allowed,
    edit: mayEdit(actor, record).allowed,
    suspend: maySuspend(actor, record).allowed,
    reinstate: mayReinstate(actor, record).allowed,
    withdraw: mayWithdraw(actor, record).allowed,
  };
}
