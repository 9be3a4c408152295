import type { Role } from '../api/types';

/** A role as it stands in a sentence. */
export function roleWords(role: Role): string {
  return role === 'authority' ? 'technical authority' : role;
}
