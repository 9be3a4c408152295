import useSWR from 'swr';
import type { ApiProblem } from '../../../shared/api/api-problem';
import { getJson } from '../../../shared/api/http';
import type { ListedPropertyEquation, PropertyEquationSheet } from '../../../shared/api/types';

export function usePropertyEquations() {
  const { data, error, mutate } = useSWR<{ items: ListedPropertyEquation[] }, ApiProblem>(
    '/api/property-equations',
    getJson,
  );
  return { equations: data?.items, problem: error, retry: () => void mutate() };
}

export function usePropertyEquation(slug: string) {
  const { data, error, mutate } = useSWR<PropertyEquationSheet, ApiProblem>(
    `/api/property-equations/${encodeURIComponent(slug)}`,
    getJson,
  );
  return { equation: data, problem: error, retry: () => void mutate() };
}
