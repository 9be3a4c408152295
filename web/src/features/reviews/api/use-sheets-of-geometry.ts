import useSWR from 'swr';
import type { ApiProblem } from '../../../shared/api/api-problem';
import { api, ask } from '../../../shared/api/client';
import type { CorrelationPage, ListedCorrelation } from '../../../shared/api/types';

const MOST = 100;

/** The approved sheets of a geometry, from which a successor may be named. */
export function useSheetsOfGeometry(geometry: string): readonly ListedCorrelation[] {
  const query = { geometry, standing: 'approved' as const, limit: MOST };
  const { data } = useSWR<CorrelationPage, ApiProblem>(['approved-of', '*', geometry], () =>
    ask(api.GET('/api/correlations', { params: { query } })),
  );
  return data?.items ?? [];
}
