import type { Actor } from '../common/actor.js';
import { ALLOWED, denied, type Decision } from '../common/authorized.js';
import { roleConflict, type Role } from '../common/roles.js';

/** What the rules on appointments look at. */
export interface AppointmentFacts {
  readonly personId: string;
  /** Slugs; null for every geometry and for property equations. */
  readonly geometries: readonly string[] | null;
  /** Last day, UTC, as YYYY-MM-DD. */
  readonly until: string;
  readonly proposedById: string;
  readonly confirmedAt: string | null;
  readonly endedAt: string | null;
}

export const APPOINTMENT_STATES = ['proposed', 'current', 'ended'] as const;
export type AppointmentState = (typeof APPOINTMENT_STATES)[number];

const LONGEST_YEARS = 10;

/** How an appointment stands at a moment; past its last day it has ended, whether or not that was written down. */
export function stateAt({ until, confirmedAt, endedAt }: AppointmentFacts, at: string): AppointmentState {
  if (endedAt !== null || until < dayOf(at)) return 'ended';
  return confirmedAt === null ? 'proposed' : 'current';
}

/** Whether one of somebody's appointments holds for a geometry at a moment; null: a property equation. */
export function coveredBy(
  appointments: readonly AppointmentFacts[],
  geometry: string | null,
  at: string,
): boolean {
  return appointments.some(
    (one) =>
      stateAt(one, at) === 'current' &&
      (one.geometries === null || (geometry !== null && one.geometries.includes(geometry))),
  );
}

/** Whether somebody can be proposed, whatever for. */
export function mayBeProposed(by: Actor, person: Actor | undefined): Decision {
  if (person === undefined) return denied('This is nobody who is here and active.', 'conflict');
  if (person.id === by.id) return denied('Nobody proposes themselves.');
  return mayHold(person.roles);
}

/** Whether the last day can be one: after today, and not so far off that nobody will think of it again. */
export function mayLastUntil(until: string, at: string): Decision {
  const furthest = `${Number(at.slice(0, 4)) + LONGEST_YEARS}${dayOf(at).slice(4)}`;
  if (until <= dayOf(at)) return denied('The last day must be after today.', 'malformed');
  if (until > furthest) return denied(`An appointment is for ${LONGEST_YEARS} years at most.`, 'malformed');
  return ALLOWED;
}

export interface Confirming {
  readonly actor: Actor;
  readonly person: Actor | undefined;
  /** Whether the one who confirms holds an appointment now, or is the office's principal. */
  readonly isAuthority: boolean;
  readonly isPrincipal: boolean;
  readonly at: string;
}

/** Whether somebody may be the second of the two who appoint. */
export function mayConfirm(
  appointment: AppointmentFacts,
  { actor, person, isAuthority, isPrincipal, at }: Confirming,
): Decision {
  const entitled = (isAuthority || isPrincipal) && !actor.roles.includes('administrator');
  if (!entitled) {
    return denied("Another technical authority or the office's named principal confirms an appointment.");
  }
  if (actor.id === appointment.personId) return denied('Nobody confirms their own appointment.');
  if (actor.id === appointment.proposedById)
    return denied('Whoever proposed an appointment does not confirm it.');
  const state = stateAt(appointment, at);
  if (state === 'current') return denied('This appointment was confirmed already.', 'conflict');
  if (state === 'ended') return denied('This appointment has ended.', 'conflict');
  if (person === undefined) return denied('The person is not active any more.', 'conflict');
  return mayHold(person.roles);
}

export function mayEnd(appointment: AppointmentFacts, at: string): Decision {
  return stateAt(appointment, at) === 'ended' ? denied('This appointment has ended.', 'conflict') : ALLOWED;
}

function mayHold(roles: readonly Role[]): Decision {
  const conflict = roleConflict([...roles, 'authority']);
  return conflict === undefined ? ALLOWED : denied(conflict, 'conflict');
}

export function dayOf(at: string): string {
  return at.slice(0, 10);
}
