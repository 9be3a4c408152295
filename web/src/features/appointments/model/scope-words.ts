import type { Appointment } from '../../../shared/api/types';
import { inWords } from '../../../shared/format/in-words';

/** Slug and name of a geometry. */
export interface GeometryName {
  slug: string;
  name: string;
}

/** What an appointment is for, as it goes on in a sentence. */
export function scopeWords(
  scope: Appointment['geometries'],
  geometries: readonly GeometryName[] | undefined,
): string {
  if (scope === 'all') return 'all geometries, and property equations';
  const nameOf = (slug: string) =>
    geometries?.find((geometry) => geometry.slug === slug)?.name ?? slug.replaceAll('-', ' ');
  return inWords(scope.map(nameOf));
}
