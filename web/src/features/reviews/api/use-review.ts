import useSWR from 'swr';
import type { ApiProblem } from '../../../shared/api/api-problem';
import { api, ask } from '../../../shared/api/client';
import type { Review } from '../../../shared/api/types';

/** All that belongs to the review of a revision. */
export function useReview(slug: string, revision: number) {
  const { data, error, mutate } = useSWR<Review, ApiProblem>(['review', slug, revision], () =>
    readReview(slug, revision),
  );
  return { review: data, problem: error, refetch: () => void mutate() };
}

function readReview(slug: string, number: number): Promise<Review> {
  const path = { slug, number };
  // The contract leaves a difference's section open; it is a field of the engine's definition.
  return ask(
    api.GET('/api/correlations/{slug}/revisions/{number}/review', { params: { path } }),
  ) as Promise<Review>;
}
