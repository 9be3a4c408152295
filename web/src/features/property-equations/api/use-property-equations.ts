import useSWR from 'swr';
import type { ApiProblem } from '../../../shared/api/api-problem';
import { api, ask } from '../../../shared/api/client';
import type { ListedPropertyEquation, PropertyEquationSheet } from '../../../shared/api/types';

const LIST = '/api/property-equations';
const SHEET = '/api/property-equations/{slug}';

export function usePropertyEquations() {
  const { data, error, mutate } = useSWR<{ items: ListedPropertyEquation[] }, ApiProblem>(LIST, () =>
    ask(api.GET(LIST)),
  );
  return { equations: data?.items, problem: error, retry: () => void mutate() };
}

export function usePropertyEquation(slug: string) {
  const { data, error, mutate } = useSWR<PropertyEquationSheet, ApiProblem>([SHEET, slug], () =>
    ask(api.GET(SHEET, { params: { path: { slug } } })),
  );
  return { equation: data, problem: error, retry: () => void mutate() };
}
