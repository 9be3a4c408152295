import useSWR from 'swr';
import type { ApiProblem } from '../../../shared/api/api-problem';
import { api, ask } from '../../../shared/api/client';
import type { Appointment, AppointmentProposal } from '../../../shared/api/types';

const APPOINTMENTS = '/api/appointments';

/** Who was appointed technical authority and how, the latest proposal first. */
export function useAppointments() {
  const { data, error, mutate } = useSWR<{ items: Appointment[] }, ApiProblem>(APPOINTMENTS, () =>
    ask(api.GET(APPOINTMENTS)),
  );
  return { appointments: data?.items, problem: error, refetch: () => mutate() };
}

export function proposeAppointment(proposal: AppointmentProposal): Promise<Appointment> {
  return ask(api.POST(APPOINTMENTS, { body: proposal }));
}

/** The second person's signature. */
export function confirmAppointment(id: string, password: string): Promise<Appointment> {
  return ask(
    api.POST('/api/appointments/{id}/confirmation', { params: { path: { id } }, body: { password } }),
  );
}

/** Ends an appointment, or takes a proposal back. */
export function endAppointment(id: string, reason: string): Promise<Appointment> {
  return ask(api.POST('/api/appointments/{id}/end', { params: { path: { id } }, body: { reason } }));
}
