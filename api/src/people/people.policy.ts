import { ALLOWED, denied, type Decision } from '../common/authorized.js';
import { roleConflict, type Role } from '../common/roles.js';
import type { Person } from './person.js';

/** Whether an administrator may give somebody these roles in place of those they have. */
export function mayHaveRoles(before: readonly Role[], wanted: readonly Role[]): Decision {
  const conflict = roleConflict(wanted);
  if (conflict !== undefined) return denied(conflict, 'conflict');
  if (wanted.includes('authority') && !before.includes('authority')) {
    return denied(
      'A technical authority is appointed by two people, not made by giving the role: propose an appointment.',
      'conflict',
    );
  }
  return ALLOWED;
}

/** Whether the office can do without somebody as administrator. */
export function mayDoWithout(person: Person, administrators: readonly Person[]): Decision {
  if (administrators.some(({ id }) => id !== person.id)) return ALLOWED;
  return denied('This is the only administrator; the office cannot be left without one.', 'conflict');
}

export function mayDeactivate(byId: string, person: Person, administrators: readonly Person[]): Decision {
  if (byId === person.id) return denied('Nobody makes themselves inactive; another administrator can.');
  if (!person.active) return denied('This person is inactive already.', 'conflict');
  return person.roles.includes('administrator') ? mayDoWithout(person, administrators) : ALLOWED;
}

export function mayReactivate({ active }: Person): Decision {
  return active ? denied('This person is active.', 'conflict') : ALLOWED;
}
