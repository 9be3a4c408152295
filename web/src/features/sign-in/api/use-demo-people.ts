import useSWR from 'swr';
import type { ApiProblem } from '../../../shared/api/api-problem';
import { getJson } from '../../../shared/api/http';
import type { DemoPeople } from '../../../shared/api/types';

/** The invented people of a demo office; undefined in every other office, where the server knows no such list. */
export function useDemoPeople(): DemoPeople | undefined {
  const { data } = useSWR<DemoPeople, ApiProblem>('/api/session/demo-people', getJson, {
    shouldRetryOnError: false,
    revalidateIfStale: false,
  });
  return data;
}
