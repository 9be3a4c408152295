import type { ListedCorrelation } from '../../../shared/api/types';

/** The title without authors in brackets at its end: in a row they stand right above it. */
export function titleBesideAuthors({ title, authors }: Pick<ListedCorrelation, 'title' | 'authors'>): string {
  const bracket = /^(.+?) \(([^()]*)\)$/.exec(title);
  const inside = bracket?.[2] ?? '';
  return bracket?.[1] && authors.some((author) => inside.includes(author)) ? bracket[1] : title;
}
