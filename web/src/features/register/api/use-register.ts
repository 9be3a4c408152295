import { useCallback } from 'react';
import useSWRInfinite from 'swr/infinite';
import type { ApiProblem } from '../../../shared/api/api-problem';
import { getJson } from '../../../shared/api/http';
import type { CorrelationPage } from '../../../shared/api/types';
import { registerKey, type RegisterFilters } from '../model/register-filters';

export const PAGE_LENGTH = 25;

/** The correlations that the filters leave, page by page; while new filters load the old list stays. */
export function useRegister(filters: RegisterFilters) {
  const keyOf = (index: number, before: CorrelationPage | null) => {
    if (index > 0 && !before?.nextCursor) return null;
    return registerKey(filters, before?.nextCursor ?? null, PAGE_LENGTH);
  };
  const { data, error, isValidating, size, setSize, mutate } = useSWRInfinite<CorrelationPage, ApiProblem>(
    keyOf,
    getJson,
    { keepPreviousData: true, revalidateFirstPage: false, revalidateOnFocus: false },
  );
  const showMore = useCallback(() => void setSize((pages) => pages + 1), [setSize]);
  const retry = useCallback(() => void mutate(), [mutate]);
  const last = data?.at(-1);
  return {
    items: data?.flatMap((page) => page.items),
    total: last?.total ?? 0,
    facets: data?.[0]?.facets,
    hasMore: Boolean(last?.nextCursor),
    fetching: isValidating,
    fetchingMore: isValidating && size > (data?.length ?? 0),
    problem: error,
    showMore,
    retry,
  };
}

export type Register = ReturnType<typeof useRegister>;
