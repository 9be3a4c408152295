import { useCallback } from 'react';
import { useSWRConfig } from 'swr';

const DESK = '/api/desk';

/** Has everything fetched anew that an act on a correlation's revision may have changed: its pages and the desk. */
export function useRefreshRevision(slug: string): () => Promise<void> {
  const { mutate } = useSWRConfig();
  return useCallback(async () => {
    await mutate((key) => key === DESK || (Array.isArray(key) && key[1] === slug));
  }, [mutate, slug]);
}
