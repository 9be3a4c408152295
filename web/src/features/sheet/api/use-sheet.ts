import useSWR from 'swr';
import type { ApiProblem } from '../../../shared/api/api-problem';
import type { Sheet } from '../../../shared/api/types';

/** The sheet of a correlation: the revision asked for, else the one in use. */
export function useSheet(slug: string, revision: number | null) {
  const base = `/api/correlations/${encodeURIComponent(slug)}`;
  const { data, error, isLoading, mutate } = useSWR<Sheet, ApiProblem>(
    revision === null ? base : `${base}/revisions/${revision}`,
  );
  return { sheet: data, problem: error, loading: isLoading, refetch: () => void mutate() };
}
