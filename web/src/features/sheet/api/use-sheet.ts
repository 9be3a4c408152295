import useSWR from 'swr';
import type { ApiProblem } from '../../../shared/api/api-problem';
import { api, ask } from '../../../shared/api/client';
import type { Sheet } from '../../../shared/api/types';

/** The sheet of a correlation: the revision asked for, else the one in use. */
export function useSheet(slug: string, revision: number | null) {
  const { data, error, isLoading, mutate } = useSWR<Sheet, ApiProblem>(['sheet', slug, revision], () =>
    readSheet(slug, revision),
  );
  return { sheet: data, problem: error, loading: isLoading, refetch: () => void mutate() };
}

function readSheet(slug: string, revision: number | null): Promise<Sheet> {
  if (revision === null) return ask(api.GET('/api/correlations/{slug}', { params: { path: { slug } } }));
  const path = { slug, number: revision };
  return ask(api.GET('/api/correlations/{slug}/revisions/{number}', { params: { path } }));
}
