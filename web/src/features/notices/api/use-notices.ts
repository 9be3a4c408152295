import useSWR, { useSWRConfig } from 'swr';
import useSWRInfinite from 'swr/infinite';
import type { ApiProblem } from '../../../shared/api/api-problem';
import { api, ask } from '../../../shared/api/client';
import type { Notice, NoticePage } from '../../../shared/api/types';

const NOTICES = '/api/notices';
/** Key of the masthead's few, asked for again every minute. */
const LATEST = 'notices:latest';
const IN_MASTHEAD = '8';
const MINUTE = 60_000;

/** The latest notices and how many wait to be read, kept up to date while a page is open. */
export function useLatestNotices() {
  const { data, error, mutate } = useSWR<NoticePage, ApiProblem>(
    LATEST,
    () => ask(api.GET(NOTICES, { params: { query: { limit: IN_MASTHEAD } } })),
    { refreshInterval: MINUTE, revalidateOnFocus: true },
  );
  return { notices: data?.items, unread: data?.unread ?? 0, problem: error, retry: () => void mutate() };
}

/** All notices, the latest first, page by page. */
export function useNotices() {
  const { data, error, isValidating, size, setSize, mutate } = useSWRInfinite<NoticePage, ApiProblem>(
    (index: number, before: NoticePage | null) =>
      index > 0 && !before?.nextCursor ? null : ([NOTICES, before?.nextCursor ?? null] as const),
    ([, cursor]: readonly [string, string | null]) =>
      ask(api.GET(NOTICES, { params: { query: cursor === null ? {} : { cursor } } })),
  );
  return {
    notices: data?.flatMap((page) => page.items),
    unread: data?.[0]?.unread ?? 0,
    hasMore: Boolean(data?.at(-1)?.nextCursor),
    fetchingMore: isValidating && size > (data?.length ?? 0),
    problem: error,
    showMore: () => void setSize((pages) => pages + 1),
    refetch: () => mutate(),
  };
}

/** Says of notices that they were read; the masthead's count follows. */
export function useReading() {
  const { mutate } = useSWRConfig();
  return async (notices: readonly Notice[]): Promise<void> => {
    const unread = notices.filter(({ read }) => !read);
    for (const { id } of unread)
      await ask(api.POST('/api/notices/{id}/reading', { params: { path: { id: String(id) } } }));
    if (unread.length > 0) await mutate(LATEST);
  };
}
