import type { Actor } from '../common/actor.js';
import { hasPermission } from '../common/permissions.js';

/** Whose evaluations somebody reads: their own; authorities and auditors read all. */
export function mayRead(actor: Actor, evaluation: { readonly personId: string }): boolean {
  return evaluation.personId === actor.id || hasPermission(actor.roles, 'evaluation.read-all');
}
