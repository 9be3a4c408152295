import useSWR from 'swr';
import type { ApiProblem } from '../../../shared/api/api-problem';
import { api, ask } from '../../../shared/api/client';
import type { DemoPeople } from '../../../shared/api/types';

const PEOPLE = '/api/session/demo-people';

/** The invented people of a demo office; undefined in every other office, where the server knows no such list. */
export function useDemoPeople(): DemoPeople | undefined {
  const { data } = useSWR<DemoPeople, ApiProblem>(PEOPLE, () => ask(api.GET(PEOPLE)), {
    shouldRetryOnError: false,
    revalidateIfStale: false,
  });
  return data;
}
