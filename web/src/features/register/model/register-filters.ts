import type { Phase, Standing } from '../../../shared/api/types';
import { withQuery } from '../../../shared/api/http';

/** What the register is narrowed to. Empty texts narrow nothing. */
export interface RegisterFilters {
  q: string;
  geometry: string;
  phase: Phase | '';
  standing: Standing | '';
}

export const NO_FILTERS: RegisterFilters = { q: '', geometry: '', phase: '', standing: '' };

const NAMES = ['q', 'geometry', 'phase', 'standing'] as const;
const PHASES: readonly Phase[] = ['gas', 'liquid', 'gas-or-liquid', 'gas-and-liquid'];
export const STANDINGS: readonly Standing[] = [
  'approved',
  'in review',
  'draft',
  'suspended',
  'superseded',
  'withdrawn',
  'declined',
];

const LONGEST_SEARCH = 200;

/** Filters from the address bar; a value that is no phase or standing counts as none. */
export function readFilters(search: URLSearchParams): RegisterFilters {
  const geometry = search.get('geometry') ?? '';
  return {
    q: (search.get('q') ?? '').slice(0, LONGEST_SEARCH),
    geometry: /^[a-z0-9-]{1,80}$/.test(geometry) ? geometry : '',
    phase: PHASES.find((phase) => phase === search.get('phase')) ?? '',
    standing: STANDINGS.find((standing) => standing === search.get('standing')) ?? '',
  };
}

/** The query of the address bar, without what is empty: an unfiltered register has a clean address. */
export function writeFilters(filters: RegisterFilters): URLSearchParams {
  const search = new URLSearchParams();
  for (const name of NAMES) if (filters[name].trim() !== '') search.set(name, filters[name]);
  return search;
}

export function isFiltered(filters: RegisterFilters): boolean {
  return NAMES.some((name) => filters[name].trim() !== '');
}

/** Address of one page of the list. */
export function registerKey(filters: RegisterFilters, cursor: string | null, limit: number): string {
  return withQuery('/api/correlations', {
    q: filters.q.trim(),
    geometry: filters.geometry,
    phase: filters.phase,
    standing: filters.standing,
    cursor,
    limit,
  });
}
