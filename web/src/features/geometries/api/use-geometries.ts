import useSWR from 'swr';
import type { ApiProblem } from '../../../shared/api/api-problem';
import { getJson } from '../../../shared/api/http';
import type { Geometry } from '../../../shared/api/types';

/** Every geometry of the office, with the number of its correlations. */
export function useGeometries() {
  const { data, error, mutate } = useSWR<{ items: Geometry[] }, ApiProblem>('/api/geometries', getJson);
  return { geometries: data?.items, problem: error, retry: () => void mutate() };
}
