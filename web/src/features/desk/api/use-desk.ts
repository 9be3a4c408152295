import useSWR from 'swr';
import type { ApiProblem } from '../../../shared/api/api-problem';
import { api, ask } from '../../../shared/api/client';
import type { Desk } from '../../../shared/api/types';

const DESK = '/api/desk';

/** What waits for the person who is signed in. */
export function useDesk() {
  const { data, error, mutate } = useSWR<Desk, ApiProblem>(DESK, () => ask(api.GET(DESK)), {
    revalidateOnFocus: true,
  });
  return { sections: data?.sections, problem: error, retry: () => void mutate() };
}
