import useSWR from 'swr';
import type { ApiProblem } from '../../../shared/api/api-problem';
import { api, ask } from '../../../shared/api/client';
import type { Invitation } from '../../../shared/api/types';

const INVITATION = '/api/invitations/{token}';

/** Whom an invitation is for. */
export function useInvitation(token: string) {
  const { data, error, mutate } = useSWR<Invitation, ApiProblem>(
    [INVITATION, token],
    () => ask(api.GET(INVITATION, { params: { path: { token } } })),
    { revalidateIfStale: false },
  );
  return { invitation: data, problem: error, retry: () => void mutate() };
}

export interface Joining {
  password: string;
  /** Only the first administrator says who they are. */
  name?: string;
  email?: string;
}

/** Takes the invitation up; the link is used up. */
export function join(token: string, joining: Joining): Promise<{ name: string; email: string }> {
  return ask(api.POST(INVITATION, { params: { path: { token } }, body: joining }));
}
