import type { Role } from './roles.js';

/** Whoever does something: handed on explicitly, from the route to the journal row. */
export interface Actor {
  readonly id: string;
  readonly name: string;
  readonly roles: readonly Role[];
}

/** The program itself: sets up the office and its demo people. It holds no role and so no say on content. */
export const SYSTEM_ACTOR: Actor = Object.freeze({ id: 'system', name: 'Merestone', roles: [] });

/** Somebody not signed in, such as at a refused sign-in. */
export const ANONYMOUS_ACTOR: Actor = Object.freeze({ id: 'anonymous', name: 'Not signed in', roles: [] });
