import type { Actor } from '../common/actor.js';
import { ALLOWED, denied, type Decision } from '../common/authorized.js';
import { hasPermission } from '../common/permissions.js';
import type { RevisionFacts } from '../revisions/revision-facts.js';
import { mayEdit } from '../revisions/revision.policy.js';

/**
 * Documents are added to a revision by its originator while it can be edited, and by reviewers and authorities at any
 * time: the content that is reviewed and signed is not touched by them.
 */
export function mayAttach(actor: Actor, revision: RevisionFacts): Decision {
  const reviews = hasPermission(actor.roles, 'correlation.review');
  if (reviews || hasPermission(actor.roles, 'correlation.approve')) return ALLOWED;
  const edits = mayEdit(actor, revision);
  return edits.allowed
    ? ALLOWED
    : denied(
        'Documents are added by the originator of a draft, by reviewers and by technical authorities.',
        edits.code,
      );
}
