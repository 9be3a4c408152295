import useSWR from 'swr';
import type { ApiProblem } from '../../../shared/api/api-problem';
import { api, ask } from '../../../shared/api/client';
import type { Geometry, ListedPropertyEquation } from '../../../shared/api/types';

const GEOMETRIES = '/api/geometries';
const EQUATIONS = '/api/property-equations';

/** What a draft may refer to in the register: geometries, and property equations with what each one gives. */
export function useChoices() {
  const geometries = useSWR<{ items: Geometry[] }, ApiProblem>(GEOMETRIES, () => ask(api.GET(GEOMETRIES)));
  const equations = useSWR<{ items: ListedPropertyEquation[] }, ApiProblem>(EQUATIONS, () =>
    ask(api.GET(EQUATIONS)),
  );
  return {
    geometries: geometries.data?.items ?? [],
    equations: equations.data?.items ?? [],
    problem: geometries.error ?? equations.error,
    retry: () => {
      void geometries.mutate();
      void equations.mutate();
    },
  };
}
