import useSWR from 'swr';
import type { ApiProblem } from '../../../shared/api/api-problem';
import { api, ask } from '../../../shared/api/client';
import type { Geometry } from '../../../shared/api/types';

const GEOMETRIES = '/api/geometries';

/** Every geometry of the office, with the number of its correlations. */
export function useGeometries() {
  const { data, error, mutate } = useSWR<{ items: Geometry[] }, ApiProblem>(GEOMETRIES, () =>
    ask(api.GET(GEOMETRIES)),
  );
  return { geometries: data?.items, problem: error, retry: () => void mutate() };
}
