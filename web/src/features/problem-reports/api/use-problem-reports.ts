import useSWR from 'swr';
import type { ApiProblem } from '../../../shared/api/api-problem';
import { api, ask } from '../../../shared/api/client';
import type { ProblemReport } from '../../../shared/api/types';

/** The problem reports filed against a correlation. */
export function useProblemReports(slug: string) {
  const { data, error } = useSWR<{ items: ProblemReport[] }, ApiProblem>(['problem-reports', slug], () =>
    ask(api.GET('/api/correlations/{slug}/problem-reports', { params: { path: { slug } } })),
  );
  return { reports: data?.items, problem: error };
}
