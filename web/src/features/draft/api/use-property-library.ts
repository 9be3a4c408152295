import { compilePropertyEquation, type CompiledEquation, type PropertyLibrary } from '@merestone/engine';
import { useMemo } from 'react';
import useSWR from 'swr';
import { api, ask } from '../../../shared/api/client';
import type { PropertyEquationSheet } from '../../../shared/api/types';

const SHEET = '/api/property-equations/{slug}';

export interface LoadedLibrary {
  library: PropertyLibrary;
  /** False while some that are asked for are on their way: a finding that one is missing would be too early. */
  complete: boolean;
}

/** The property equations of the given names, compiled, for worked checks and the machine's report. */
export function usePropertyLibrary(slugs: readonly string[]): LoadedLibrary {
  const wanted = useMemo(() => [...new Set(slugs)].sort(), [slugs]);
  const { data, isLoading } = useSWR([SHEET, 'library', ...wanted], () => fetchAll(wanted), {
    keepPreviousData: true,
  });
  return useMemo(() => {
    const compiled = new Map<string, CompiledEquation>();
    for (const { slug, definition } of data ?? []) {
      const result = compilePropertyEquation(slug, definition);
      if (result.ok) compiled.set(slug, result.compiled);
    }
    return { library: (slug) => compiled.get(slug), complete: data !== undefined && !isLoading };
  }, [data, isLoading]);
}

/** One that is not there, or may not be seen, is left out: the report then says so at its place. */
async function fetchAll(slugs: readonly string[]): Promise<PropertyEquationSheet[]> {
  const answers = await Promise.allSettled(
    slugs.map((slug): Promise<PropertyEquationSheet> => ask(api.GET(SHEET, { params: { path: { slug } } }))),
  );
  return answers.flatMap((answer) => (answer.status === 'fulfilled' ? [answer.value] : []));
}
