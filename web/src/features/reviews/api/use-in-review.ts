import useSWR from 'swr';
import type { ApiProblem } from '../../../shared/api/api-problem';
import { api, ask } from '../../../shared/api/client';
import type { CorrelationPage, ListedCorrelation } from '../../../shared/api/types';

const MOST = 100;

/** The revisions in review as the register lists them, for their strips; none while they are on their way. */
export function useInReview(): readonly ListedCorrelation[] {
  const query = { standing: 'in review' as const, limit: MOST };
  const { data } = useSWR<CorrelationPage, ApiProblem>(['in-review', '*', query.standing], () =>
    ask(api.GET('/api/correlations', { params: { query } })),
  );
  return data?.items ?? [];
}
