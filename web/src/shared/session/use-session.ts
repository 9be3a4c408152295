import { useCallback } from 'react';
import useSWR, { useSWRConfig } from 'swr';
import { ApiProblem } from '../api/api-problem';
import { api, ask } from '../api/client';
import type { Permission, SessionAnswer } from '../api/types';

export const SESSION = '/api/session';

/** No session is an answer, not an error. */
async function readSession(): Promise<SessionAnswer | null> {
  try {
    return await ask(api.GET(SESSION));
  } catch (thrown) {
    if (thrown instanceof ApiProblem && thrown.status === 401) return null;
    throw thrown;
  }
}

/** Who is signed in, and the two acts on it. `session` is undefined while unknown, null when nobody is. */
export function useSession() {
  const { data, error, mutate } = useSWR<SessionAnswer | null, ApiProblem>(SESSION, readSession, {
    revalidateOnFocus: true,
  });
  const cache = useSWRConfig();

  const signIn = useCallback(
    async (email: string, password: string) => {
      const session = await ask(api.POST(SESSION, { body: { email, password } }));
      await mutate(session, { revalidate: false });
    },
    [mutate],
  );

  const signOut = useCallback(async () => {
    await ask(api.DELETE(SESSION));
    // What one person could read must not be shown to the next.
    await cache.mutate((key) => key !== SESSION, undefined, { revalidate: false });
    await mutate(null, { revalidate: false });
  }, [cache, mutate]);

  const may = useCallback(
    (permission: Permission) => data?.permissions.includes(permission) ?? false,
    [data],
  );

  return { session: data, problem: error, retry: () => void mutate(), signIn, signOut, may };
}
