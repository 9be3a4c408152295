import { SYSTEM_ACTOR, type Actor } from '../common/actor.js';
import { ALLOWED, denied, type Decision } from '../common/authorized.js';
import { hasPermission, type Permission } from '../common/permissions.js';
import type { Standing } from '../common/standing.js';
import type { RevisionFacts } from './revision-facts.js';

/** Whose drafts somebody sees and may take up: their own and, for whoever may draft, those the library came with. */
export function originatorsOf(actor: Actor): string[] {
  return hasPermission(actor.roles, 'correlation.draft') ? [actor.id, SYSTEM_ACTOR.id] : [actor.id];
}

export function isOriginator(actor: Actor, revision: RevisionFacts): boolean {
  return originatorsOf(actor).includes(revision.originatorId);
}

export function holds(actor: Actor, permission: Permission): Decision {
  return hasPermission(actor.roles, permission)
    ? ALLOWED
    : denied(`This needs the permission ${permission}.`);
}

export function asOriginator(actor: Actor, revision: RevisionFacts, does: string): Decision {
  return isOriginator(actor, revision) ? ALLOWED : denied(`Only the originator of a revision ${does}.`);
}

export function unless(condition: boolean, reason: string): Decision {
  return condition ? denied(reason) : ALLOWED;
}

export function inStanding(
  revision: RevisionFacts,
  standings: readonly Standing[],
  reason: string,
): Decision {
  return standings.includes(revision.standing)
    ? ALLOWED
    : denied(`${reason} This one is ${revision.standing}.`, 'conflict');
}

export function first(...decisions: Decision[]): Decision {
  return decisions.find(({ allowed }) => !allowed) ?? ALLOWED;
}
