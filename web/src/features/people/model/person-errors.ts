import type { Role } from '../../../shared/api/types';
import type { FieldErrors } from '../../../shared/form/use-form-act';

/** Who runs the office has no say on content: the two roles are never on one person. */
export function excludedRoles(roles: readonly Role[]): string | undefined {
  return roles.includes('administrator') && roles.includes('authority')
    ? 'An administrator has no say on technical content and cannot also be a technical authority. Take one of the two away.'
    : undefined;
}

export function personErrors({ name, roles }: { name: string; roles: readonly Role[] }): FieldErrors {
  return {
    name: name.trim() ? undefined : 'Write the name as it is to stand on record.',
    roles: roles.length === 0 ? 'Choose at least one role.' : excludedRoles(roles),
  };
}

export function emailError(email: string): string | undefined {
  if (/^\S+@\S+$/.test(email.trim())) return undefined;
  return email.trim() ? 'Write the whole e-mail address, with its @.' : 'Write the e-mail address.';
}
