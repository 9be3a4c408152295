import type { ListedPerson, ManagedPerson } from '../../../shared/api/types';

export interface ManagedPeople {
  here: ManagedPerson[];
  invited: ManagedPerson[];
  inactive: ManagedPerson[];
}

/** People as an administrator looks after them, by how they stand; entries without what is needed for that are left out. */
export function managedPeople(people: readonly ListedPerson[]): ManagedPeople {
  const managed = people.flatMap(({ id, name, roles, email, active, invited, lastSignIn }) =>
    email === undefined || active === undefined || invited === undefined
      ? []
      : [{ id, name, roles, email, active, invited, lastSignIn: lastSignIn ?? null }],
  );
  return {
    here: managed.filter(({ active, invited }) => active && !invited),
    invited: managed.filter(({ active, invited }) => active && invited),
    inactive: managed.filter(({ active }) => !active),
  };
}
