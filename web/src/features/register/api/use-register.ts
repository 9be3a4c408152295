import { useCallback } from 'react';
import useSWRInfinite from 'swr/infinite';
import type { ApiProblem } from '../../../shared/api/api-problem';
import { api, ask } from '../../../shared/api/client';
import type { CorrelationPage } from '../../../shared/api/types';
import { registerQuery, type RegisterFilters, type RegisterQuery } from '../model/register-filters';

const REGISTER = '/api/correlations';
const PAGE_LENGTH = 25;

/** The correlations that the filters leave, page by page; while new filters load the old list stays. */
export function useRegister(filters: RegisterFilters) {
  const keyOf = (index: number, before: CorrelationPage | null) => {
    if (index > 0 && !before?.nextCursor) return null;
    return [REGISTER, registerQuery(filters, before?.nextCursor ?? null, PAGE_LENGTH)] as const;
  };
  const { data, error, isValidating, size, setSize, mutate } = useSWRInfinite<CorrelationPage, ApiProblem>(
    keyOf,
    ([, query]: readonly [string, RegisterQuery]) => ask(api.GET(REGISTER, { params: { query } })),
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
