import useSWR from 'swr';
import type { ApiProblem } from '../../../shared/api/api-problem';
import { api, ask } from '../../../shared/api/client';
import type { Differences } from '../../../shared/api/types';

/** What differs between two revisions of a correlation. */
export function useDifferences(slug: string, from: number, to: number) {
  const { data, error, mutate } = useSWR<Differences, ApiProblem>(['differences', slug, from, to], () =>
    readDifferences(slug, from, to),
  );
  return { answer: data, problem: error, retry: () => void mutate() };
}

function readDifferences(slug: string, from: number, to: number): Promise<Differences> {
  const params = { path: { slug }, query: { from, to } };
  // The contract leaves a difference's section open; it is a field of the engine's definition.
  return ask(api.GET('/api/correlations/{slug}/differences', { params })) as Promise<Differences>;
}
