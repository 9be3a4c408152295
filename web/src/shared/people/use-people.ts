import { useMemo } from 'react';
import useSWR from 'swr';
import type { ApiProblem } from '../api/api-problem';
import { api, ask } from '../api/client';
import type { ListedPerson } from '../api/types';

const PEOPLE = '/api/people';

/** Everybody of the office; administrators see those who are invited or inactive, too. */
export function usePeople() {
  const { data, error, mutate } = useSWR<{ items: ListedPerson[] }, ApiProblem>(PEOPLE, () =>
    ask(api.GET(PEOPLE)),
  );
  const people = data?.items;
  /** Those who can be asked to do something now. */
  const present = useMemo(
    () => people?.filter(({ active = true, invited = false }) => active && !invited),
    [people],
  );
  return { people, present, problem: error, refetch: () => mutate() };
}
