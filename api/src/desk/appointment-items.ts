import type { AppointmentItem } from '../appointments/dto/appointments-response.dto.js';
import type { Actor } from '../common/actor.js';
import { hasPermission } from '../common/permissions.js';
import type { DeskItem } from './dto/desk.dto.js';

const HREF = '/office/appointments';

/** Appointments that wait for this person's signature, those they look after, and the end of their own. */
export function appointmentItems(
  actor: Actor,
  appointments: readonly AppointmentItem[],
  soon: string,
): DeskItem[] {
  const looksAfter = hasPermission(actor.roles, 'appointment.propose');
  return appointments.flatMap(({ person, state, until, proposed, abilities }): DeskItem[] => {
    if (abilities.confirm) {
      return [{ title: person.name, line: 'waits for your signature', href: HREF, at: proposed.at }];
    }
    if (state === 'proposed' && looksAfter) {
      return [{ title: person.name, line: 'waits for the second signature', href: HREF, at: proposed.at }];
    }
    const ends = state === 'current' && until <= soon.slice(0, 10);
    if (!ends || !(looksAfter || person.id === actor.id)) return [];
    return [{ title: person.name, line: `ends with ${until}`, href: HREF, at: `${until}T00:00:00.000Z` }];
  });
}
