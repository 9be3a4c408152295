import { ROLES } from '../common/roles.js';
import type { Person } from './person.js';

/** All invented people of the demo office sign in with this; the sign-in page says so. */
export const DEMO_PASSWORD = 'merestone-demo';

/** Addresses of the demo office end so; `.example` never leads anywhere (RFC 2606). */
const DEMO_EMAIL_ENDING = '@merestone.example';

/** The invented ones among these people, by their first role. */
export function demoPeople(people: readonly Person[]): Person[] {
  return people
    .filter(({ email }) => email.endsWith(DEMO_EMAIL_ENDING))
    .toSorted((a, b) => rank(a) - rank(b) || a.email.localeCompare(b.email));
}

function rank({ roles }: Person): number {
  const [first] = roles;
  return first === undefined ? ROLES.length : ROLES.indexOf(first) * ROLES.length + roles.length;
}
