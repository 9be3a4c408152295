import useSWR from 'swr';
import type { ApiProblem } from '../../../shared/api/api-problem';
import { api, ask } from '../../../shared/api/client';
import type { OwnSession } from '../../../shared/api/types';

const SESSIONS = '/api/session/sessions';

/** The sessions of whoever is signed in, the one used last first. */
export function useOwnSessions() {
  const { data, error, mutate } = useSWR<{ items: OwnSession[] }, ApiProblem>(SESSIONS, () =>
    ask(api.GET(SESSIONS)),
  );
  return { sessions: data?.items, problem: error, refetch: () => mutate() };
}

export async function endSession(id: string): Promise<void> {
  await ask(api.DELETE('/api/session/sessions/{id}', { params: { path: { id } } }));
}

/** The session in use goes on; all others end. */
export async function changePassword(current: string, password: string): Promise<void> {
  await ask(api.PUT('/api/session/password', { body: { current, password } }));
}
