import useSWR from 'swr';
import type { ApiProblem } from '../../../shared/api/api-problem';
import { api, ask } from '../../../shared/api/client';
import type { PersonName } from '../../../shared/api/types';

const PEOPLE = '/api/people';

/** Everybody who can be asked to review, without the one who asks. */
export function useReviewers(personId: string): { reviewers: PersonName[]; problem: ApiProblem | undefined } {
  const { data, error } = useSWR<Awaited<ReturnType<typeof fetchPeople>>, ApiProblem>(PEOPLE, fetchPeople);
  const reviewers = (data?.items ?? [])
    .filter(({ id, roles }) => id !== personId && roles.includes('reviewer'))
    .map(({ id, name }) => ({ id, name }));
  return { reviewers, problem: error };
}

function fetchPeople() {
  return ask(api.GET(PEOPLE));
}
