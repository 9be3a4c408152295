import useSWR from 'swr';
import type { ApiProblem } from './api-problem';
import { api, ask } from './client';

/** The title of a sheet, for a link to it; closed where there is none that the reader may see. */
export function useSheetTitle(slug: string): { title: string | undefined; closed: boolean } {
  const { data, error } = useSWR<string, ApiProblem>(['sheet-title', slug], async () => {
    const sheet = await ask(api.GET('/api/correlations/{slug}', { params: { path: { slug } } }));
    return sheet.title;
  });
  return { title: data, closed: error?.status === 404 };
}
