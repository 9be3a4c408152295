import type { Actor } from '../common/actor.js';
import { hasPermission } from '../common/permissions.js';
import { mayConfirm, mayEnd, stateAt, type Confirming } from './appointment.policy.js';
import type { AppointmentRow } from './appointment.repository.js';
import type { AppointmentItem } from './dto/appointments-response.dto.js';

export interface AppointmentParts {
  readonly actor: Actor;
  readonly row: AppointmentRow;
  readonly personName: string;
  readonly confirming: Confirming;
}

export function appointmentItem({ actor, row, personName, confirming }: AppointmentParts): AppointmentItem {
  const { at } = confirming;
  return {
    id: row.id,
    person: { id: row.personId, name: personName },
    geometries: row.geometries ?? 'all',
    until: row.until,
    state: stateAt(row, at),
    proposed: { at: row.proposedAt, by: { id: row.proposedById, name: row.proposedByName } },
    confirmed: step(row.confirmedAt, row.confirmedById, row.confirmedByName),
    ended: step(row.endedAt, row.endedById, row.endedByName),
    endReason: row.endReason,
    abilities: {
      confirm: mayConfirm(row, confirming).allowed,
      end: hasPermission(actor.roles, 'appointment.end') && mayEnd(row, at).allowed,
    },
  };
}

function step(at: string | null, id: string | null, name: string | null): AppointmentItem['confirmed'] {
  return at === null ? null : { at, by: { id: id ?? '', name: name ?? '' } };
}
