import type { Phase, Standing } from '../../../shared/api/types';

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

export interface RegisterQuery {
  q?: string;
  geometry?: string;
  phase?: Phase;
  standing?: Standing;
  cursor?: string;
  limit: number;
}

/** What the server is asked for one page of the list: only what narrows it. */
export function registerQuery(filters: RegisterFilters, cursor: string | null, limit: number): RegisterQuery {
  const { geometry, phase, standing } = filters;
  const q = filters.q.trim();
  return {
    ...(q ? { q } : {}),
    ...(geometry ? { geometry } : {}),
    ...(phase ? { phase } : {}),
    ...(standing ? { standing } : {}),
    ...(cursor === null ? {} : { cursor }),
    limit,
  };
}
