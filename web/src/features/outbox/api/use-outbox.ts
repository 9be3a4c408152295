import useSWR from 'swr';
import type { ApiProblem } from '../../../shared/api/api-problem';
import { api, ask } from '../../../shared/api/client';
import type { Letter } from '../../../shared/api/types';

const OUTBOX = '/api/mail/outbox';

/** The latest letters of the office, the latest first. */
export function useOutbox() {
  const { data, error, mutate } = useSWR<{ items: Letter[] }, ApiProblem>(OUTBOX, () => ask(api.GET(OUTBOX)));
  return { letters: data?.items, problem: error, retry: () => void mutate() };
}
