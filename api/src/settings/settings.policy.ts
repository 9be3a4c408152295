import { ALLOWED, denied, type Decision } from '../common/authorized.js';
import type { Role } from '../common/roles.js';

/** Whether somebody may be the office's named principal. An administrator has no say on who decides on content. */
export function mayBePrincipal(person: { readonly roles: readonly Role[] } | undefined): Decision {
  if (person === undefined) return denied('This is nobody who is here and active.', 'conflict');
  if (person.roles.includes('administrator')) {
    return denied('An administrator has no say on content and cannot be the principal.', 'conflict');
  }
  return ALLOWED;
}
