import type { Actor } from '../common/actor.js';
import { ALLOWED, denied, type Decision } from '../common/authorized.js';
import { hasPermission } from '../common/permissions.js';
import { UNAPPROVED } from '../common/standing.js';
import { tally } from './reviewing.policy.js';
import type { RevisionFacts, VerdictFact } from './revision-facts.js';
import { asOriginator, first, holds, inStanding, isOriginator, originatorsOf, unless } from './rule-terms.js';

/** What the office says on an approval besides the revision itself. */
export interface ApprovalGround {
  /** How many favourable reviews an approval rests on. */
  readonly reviewsNeeded: number;
  /** Whether an appointment as technical authority holds now for the one who signs, and for the geometry. */
  readonly appointed: boolean;
}

/** What somebody sees of the register. */
export interface Sight {
  /** Drafts, reviews in progress and declined revisions of everybody. */
  readonly everything: boolean;
  /** Else those of these people. */
  readonly originators: readonly string[];
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

/** Whether somebody may sign, whoever else did: the approval's rules on the person and on what must be there. */
export function mayApprove(
  actor: Actor,
  revision: RevisionFacts,
  verdicts: readonly VerdictFact[],
  { appointed, reviewsNeeded }: ApprovalGround,
): Decision {
  return first(
    holds(actor, 'correlation.approve'),
    unless(isOriginator(actor, revision), 'Nobody approves a revision that they originated.'),
    unless(
      verdicts.some(({ reviewerId }) => reviewerId === actor.id),
      'Nobody approves a revision that they reviewed.',
    ),
    unless(!appointed, 'No appointment as technical authority holds for this now.'),
    inStanding(revision, ['in review'], 'Only a revision in review can be approved.'),
    reviewed(revision, verdicts, reviewsNeeded),
  );
}

/** The authority's no. Whoever may not sign for it may not turn it down either, but no review has to be waited for. */
export function mayDecline(
  actor: Actor,
  revision: RevisionFacts,
  { appointed }: Pick<ApprovalGround, 'appointed'>,
): Decision {
  return first(
    holds(actor, 'correlation.approve'),
    unless(isOriginator(actor, revision), 'Nobody decides on a revision that they originated.'),
    unless(!appointed, 'No appointment as technical authority holds for this now.'),
    inStanding(revision, ['in review'], 'Only a revision in review can be declined.'),
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

/** Drafts and revisions in review serve those who work on them; what was taken out of use serves comparison only. */
export function mayEvaluate(actor: Actor, revision: RevisionFacts): Decision {
  const permitted = holds(actor, 'correlation.evaluate');
  if (!permitted.allowed) return permitted;
  const concerned = isOriginator(actor, revision) || seesUnapproved(actor);
  switch (revision.standing) {
    case 'superseded':
      return ALLOWED;
    case 'approved':
      return revision.inForce || concerned
        ? ALLOWED
        : denied('This revision is approved from a later date on and not in use until then.', 'not-in-use');
    case 'draft':
    case 'in review':
      return concerned
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

function reviewed(revision: RevisionFacts, verdicts: readonly VerdictFact[], needed: number): Decision {
  const { favourable, open } = tally(revision.iteration, verdicts);
  if (open > 0)
    return denied(
      'A reviewer has not recommended this content; the matter must be settled first.',
      'conflict',
    );
  if (favourable >= needed) return ALLOWED;
  return denied(
    `An approval rests on ${needed} favourable ${needed === 1 ? 'review' : 'reviews'} of the present content; there ${favourable === 1 ? 'is 1' : `are ${favourable}`}.`,
    'conflict',
  );
}
