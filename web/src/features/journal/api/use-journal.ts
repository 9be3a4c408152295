import { useState } from 'react';
import useSWRInfinite from 'swr/infinite';
import { asApiProblem, type ApiProblem } from '../../../shared/api/api-problem';
import { api, ask } from '../../../shared/api/client';
import type { JournalPage, JournalVerification } from '../../../shared/api/types';

const JOURNAL = '/api/journal';
const PAGE_LENGTH = '50';

/** The journal, latest entry first, page by page. */
export function useJournal() {
  const { data, error, isValidating, size, setSize, mutate } = useSWRInfinite<JournalPage, ApiProblem>(
    (index: number, before: JournalPage | null) =>
      index > 0 && !before?.nextCursor ? null : ([JOURNAL, before?.nextCursor ?? null] as const),
    ([, cursor]: readonly [string, string | null]) =>
      ask(
        api.GET(JOURNAL, {
          params: { query: { limit: PAGE_LENGTH, ...(cursor === null ? {} : { cursor }) } },
        }),
      ),
    { revalidateFirstPage: false },
  );
  return {
    entries: data?.flatMap((page) => page.items),
    size: data?.[0]?.size,
    root: data?.[0]?.root ?? null,
    hasMore: Boolean(data?.at(-1)?.nextCursor),
    fetchingMore: isValidating && size > (data?.length ?? 0),
    problem: error,
    showMore: () => void setSize((pages) => pages + 1),
    retry: () => void mutate(),
  };
}

/** Recomputes the whole journal on the server, on request. */
export function useVerification() {
  const [verification, setVerification] = useState<JournalVerification | null>(null);
  const [problem, setProblem] = useState<ApiProblem | null>(null);
  const [working, setWorking] = useState(false);
  const verify = async () => {
    setWorking(true);
    setProblem(null);
    try {
      setVerification(await ask(api.POST('/api/journal/verification')));
    } catch (thrown) {
      setProblem(asApiProblem(thrown));
    }
    setWorking(false);
  };
  return { verification, problem, working, verify };
}
