import type { Actor } from '../common/actor.js';
import { ALLOWED, denied, type Decision } from '../common/authorized.js';
import type { Standing } from '../common/standing.js';
import type { Verdict } from '../common/verdict.js';
import type { CommentFacts, Hands, RevisionFacts, RoundFact, VerdictFact } from './revision-facts.js';
import { asOriginator, first, holds, inStanding, isOriginator, unless } from './rule-terms.js';

/** The turn goes to the originator when changes are asked for, or the content is edited, until it is put forward again. */
export function handsOf(
  { iteration }: Pick<RevisionFacts, 'iteration'>,
  last: RoundFact | undefined,
  verdicts: readonly VerdictFact[],
): Hands {
  if (last?.iteration !== iteration) return 'originator';
  const asked = verdicts.some(({ verdict, round }) => verdict === 'ask-for-changes' && round === last.round);
  return asked ? 'originator' : 'reviewers';
}

/** Whether the originator may say that a revision in review is ready again. */
export function mayPutForward(actor: Actor, revision: RevisionFacts, hands: Hands): Decision {
  return first(
    holds(actor, 'correlation.submit'),
    asOriginator(actor, revision, 'puts it forward'),
    inStanding(revision, ['in review'], 'Only a revision in review can be put forward again.'),
    hands === 'originator' ? ALLOWED : denied('It is with its reviewers already.', 'conflict'),
  );
}

/** Whether somebody may be one of the reviewers of a revision, as which they are asked or come by themselves. */
export function mayTakeReview(actor: Actor, revision: RevisionFacts): Decision {
  return first(
    holds(actor, 'correlation.review'),
    unless(isOriginator(actor, revision), 'Nobody reviews a revision that they originated.'),
    inStanding(revision, ['in review'], 'Only a revision in review can be reviewed.'),
  );
}

export function mayReview(actor: Actor, revision: RevisionFacts, hands: Hands): Decision {
  return first(
    mayTakeReview(actor, revision),
    hands === 'reviewers'
      ? ALLOWED
      : denied('It is with its originator; a verdict is given once it was put forward again.', 'conflict'),
  );
}

/** Distinct reviewers whose last word on this very iteration is favourable, and those whose last word is not. */
export function tally(
  iteration: number,
  verdicts: readonly VerdictFact[],
): { favourable: number; open: number } {
  const last = new Map<string, Verdict>();
  for (const fact of verdicts) if (fact.iteration === iteration) last.set(fact.reviewerId, fact.verdict);
  const words = [...last.values()];
  const favourable = words.filter((verdict) => verdict === 'recommend').length;
  return { favourable, open: words.length - favourable };
}

/** Whether a verdict counts: it speaks of the present iteration and is its reviewer's last word on it. */
export function isCurrent(fact: VerdictFact, iteration: number, verdicts: readonly VerdictFact[]): boolean {
  const words = verdicts.filter((one) => one.reviewerId === fact.reviewerId && one.iteration === iteration);
  return words.at(-1) === fact;
}

/** What a verdict does to the standing; undefined leaves it. */
export function standingAfter(verdict: Verdict): Standing | undefined {
  switch (verdict) {
    case 'recommend':
    case 'ask-for-changes':
      return undefined;
    case 'decline':
      return 'declined';
  }
}

export function mayComment(actor: Actor): Decision {
  return holds(actor, 'correlation.comment');
}

export function mayAnswer(actor: Actor, comment: CommentFacts): Decision {
  return first(
    mayComment(actor),
    comment.resolved ? denied('This comment was resolved.', 'conflict') : ALLOWED,
  );
}

/** A comment is settled by whoever made it, or by the originator once it has an answer. */
export function mayResolve(actor: Actor, revision: RevisionFacts, comment: CommentFacts): Decision {
  if (comment.resolved)
    return first(mayComment(actor), denied('This comment was resolved already.', 'conflict'));
  if (comment.byId === actor.id) return mayComment(actor);
  return first(
    mayComment(actor),
    unless(
      !isOriginator(actor, revision),
      'A comment is resolved by whoever made it, or by the originator of the revision.',
    ),
    comment.answers > 0 ? ALLOWED : denied('Answer the comment before you resolve it.', 'conflict'),
  );
}
