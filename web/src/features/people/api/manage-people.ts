import { api, ask } from '../../../shared/api/client';
import type { ManagedPerson, Role } from '../../../shared/api/types';

export interface Invitee {
  name: string;
  email: string;
  roles: Role[];
}

/** Sends an invitation; asked again for somebody who has not joined yet, the former link is void. */
export function invitePerson(invitee: Invitee): Promise<ManagedPerson> {
  return ask(api.POST('/api/people/invitations', { body: invitee }));
}

export function changePerson(id: string, change: { name: string; roles: Role[] }): Promise<ManagedPerson> {
  return ask(api.PATCH('/api/people/{id}', { params: { path: { id } }, body: change }));
}

/** Shuts a person out at once; nothing is deleted. */
export function deactivatePerson(id: string, reason: string): Promise<ManagedPerson> {
  return ask(api.POST('/api/people/{id}/deactivation', { params: { path: { id } }, body: { reason } }));
}

export function reactivatePerson(id: string, reason: string): Promise<ManagedPerson> {
  return ask(api.POST('/api/people/{id}/reactivation', { params: { path: { id } }, body: { reason } }));
}
