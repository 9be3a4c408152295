import { SYSTEM_ACTOR, type Actor } from '../common/actor.js';
import { ALLOWED, denied, type Decision } from '../common/authorized.js';
import { hasPermission, type Permission } from '../common/permissions.js';
import type { Verdict } from '../common/verdict.js';
import { UNAPPROVED, type Standing } from '../common/standing.js';

/** How many favourable reviews an approval rests on. */
export const REVIEWS_NEEDED = 2;

/** What the rules of a revision's life look at. */
export interface RevisionFacts {
  readonly standing: Standing;
  readonly originatorId: string;
  readonly hash: string;
}

/** One verdict, in the order in which they were given. */
export interface VerdictFact {
  readonly reviewerId: string;
  readonly verdict: Verdict;
  readonly hash: string;
}

/** What somebody sees of the register. */
export interface Sight {
  /** Drafts, reviews in progress and declined revisions of everybody. */
  readonly everything: boolean;
  /** Else those of these people. */
  readonly originators: readonly string[];
}

/** Whose drafts somebody sees and may take up: their own and, for whoever may draft, those the library came with. */
export function originatorsOf(actor: Actor): string[] {
  return hasPermission(actor.roles, 'correlation.draft') ? [actor.id, SYSTEM_ACTOR.id] : [actor.id];
}

/** Whether somebody sees drafts, reviews in progress and declined revisions of others. */
export function seesUnapproved(actor: Actor): boolean {
  return hasPermission(actor.roles, 'register.read-unapproved');
}

export function maySee(actor: Actor, revision: RevisionFacts): boolean {
  const sight = sightOf(actor);
  return (
    !UNAPPROVED.includes(revision.standing) ||
    sight.everything ||
    sight.originators.includes(revision.originatorId)
  );
}

/** The same for the database, which leaves out what somebody may not see. */
export function sightOf(actor: Actor): Sight {
  return { everything: seesUnapproved(actor), originators: originatorsOf(actor) };
}

export function mayEdit(actor: Actor, revision: RevisionFacts): Decision {
  return first(
    holds(actor, 'correlation.draft'),
    asOriginator(actor, revision, 'edits it'),
    inStanding(revision, ['draft', 'in review'], 'Only a draft, or a revision in review, can be edited.'),
  );
}

export function maySubmit(actor: Actor, revision: RevisionFacts): Decision {
  return first(
    holds(actor, 'correlation.submit'),
    asOriginator(actor, revision, 'submits it'),
    inStanding(revision, ['draft'], 'Only a draft can be submitted for review.'),
  );
}

export function mayReview(actor: Actor, revision: RevisionFacts): Decision {
  return first(
    holds(actor, 'correlation.review'),
    unless(isOriginator(actor, revision), 'Nobody reviews a revision that they originated.'),
    inStanding(revision, ['in review'], 'Only a revision in review takes a verdict.'),
  );
}

/** Whether somebody may sign, whoever else did: the approval's rules on the person and on what must be there. */
export function mayApprove(
  actor: Actor,
  revision: RevisionFacts,
  verdicts: readonly VerdictFact[],
): Decision {
  return first(
    holds(actor, 'correlation.approve'),
    unless(isOriginator(actor, revision), 'Nobody approves a revision that they originated.'),
    unless(
      verdicts.some(({ reviewerId }) => reviewerId === actor.id),
      'Nobody approves a revision that they reviewed.',
    ),
    inStanding(revision, ['in review'], 'Only a revision in review can be approved.'),
    reviewed(revision, verdicts),
  );
}

/** What an approval does to the revision approved before. */
export function maySupersede(actor: Actor, revision: RevisionFacts): Decision {
  return first(
    holds(actor, 'correlation.approve'),
    inStanding(revision, ['approved'], 'Only an approved revision can be superseded.'),
  );
}

export function maySuspend(actor: Actor, revision: RevisionFacts): Decision {
  return first(
    holds(actor, 'correlation.suspend'),
    inStanding(
      revision,
      ['approved', 'superseded'],
      'Only an approved or superseded revision can be suspended.',
    ),
  );
}

export function mayReinstate(actor: Actor, revision: RevisionFacts): Decision {
  return first(
    holds(actor, 'correlation.suspend'),
    inStanding(revision, ['suspended'], 'Only a suspended revision can be reinstated.'),
  );
}

export function mayWithdraw(actor: Actor, revision: RevisionFacts): Decision {
  return first(
    holds(actor, 'correlation.withdraw'),
    inStanding(
      revision,
      ['approved', 'suspended', 'superseded'],
      'Only a revision that was approved once can be withdrawn.',
    ),
  );
}

export function mayComment(actor: Actor): Decision {
  return holds(actor, 'correlation.comment');
}

/** Drafts and revisions in review serve those who work on them; what was taken out of use serves comparison only. */
export function mayEvaluate(actor: Actor, revision: RevisionFacts): Decision {
  const permitted = holds(actor, 'correlation.evaluate');
  if (!permitted.allowed) return permitted;
  switch (revision.standing) {
    case 'approved':
    case 'superseded':
      return ALLOWED;
    case 'draft':
    case 'in review':
      return isOriginator(actor, revision) || seesUnapproved(actor)
        ? ALLOWED
        : denied(
            'This revision is not approved yet: it evaluates for its originator, reviewers and authorities only.',
            'not-in-use',
          );
    case 'suspended':
    case 'withdrawn':
    case 'declined':
      return denied(
        `This revision is ${revision.standing} and not in use: it serves comparison only.`,
        'not-in-use',
      );
  }
}

/** Distinct reviewers whose last word on this very content is favourable, and those whose last word is not. */
export function tally(hash: string, verdicts: readonly VerdictFact[]): { favourable: number; open: number } {
  const last = new Map<string, Verdict>();
  for (const fact of verdicts) if (fact.hash === hash) last.set(fact.reviewerId, fact.verdict);
  const words = [...last.values()];
  const favourable = words.filter((verdict) => verdict === 'recommend').length;
  return { favourable, open: words.length - favourable };
}

/** What a verdict does to the standing; undefined leaves it. */
export function standingAfter(verdict: Verdict): Standing | undefined {
  switch (verdict) {
    case 'recommend':
      return undefined;
    case 'ask-for-changes':
      return 'draft';
    case 'decline':
      return 'declined';
  }
}

function isOriginator(actor: Actor, revision: RevisionFacts): boolean {
  return originatorsOf(actor).includes(revision.originatorId);
}

function reviewed(revision: RevisionFacts, verdicts: readonly VerdictFact[]): Decision {
  const { favourable, open } = tally(revision.hash, verdicts);
  if (open > 0)
    return denied(
      'A reviewer has not recommended this content; the matter must be settled first.',
      'conflict',
    );
  if (favourable >= REVIEWS_NEEDED) return ALLOWED;
  return denied(
    `An approval rests on ${REVIEWS_NEEDED} favourable reviews of the present content; there ${favourable === 1 ? 'is 1' : `are ${favourable}`}.`,
    'conflict',
  );
}

function holds(actor: Actor, permission: Permission): Decision {
  return hasPermission(actor.roles, permission)
    ? ALLOWED
    : denied(`This needs the permission ${permission}.`);
}

function asOriginator(actor: Actor, revision: RevisionFacts, does: string): Decision {
  return isOriginator(actor, revision) ? ALLOWED : denied(`Only the originator of a revision ${does}.`);
}

function unless(condition: boolean, reason: string): Decision {
  return condition ? denied(reason) : ALLOWED;
}

function inStanding(revision: RevisionFacts, standings: readonly Standing[], reason: string): Decision {
  return standings.includes(revision.standing)
    ? ALLOWED
    : denied(`${reason} This one is ${revision.standing}.`, 'conflict');
}

function first(...decisions: Decision[]): Decision {
  return decisions.find(({ allowed }) => !allowed) ?? ALLOWED;
}
