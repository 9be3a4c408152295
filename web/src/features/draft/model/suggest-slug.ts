import type { DraftHead } from './draft-form';

const MOST = 80;
const SLUG = /^[a-z0-9]+(-[a-z0-9]+)*$/;

/** A name for the register made from the title; long titles lose whole words at the end. */
export function suggestSlug({ title }: Pick<DraftHead, 'title'>): string {
  const words = title
    .normalize('NFKD')
    .replace(/[\u0300-\u036f]/g, '')
    .toLowerCase()
    .split(/[^a-z0-9]+/)
    .filter(Boolean);
  let slug = '';
  for (const word of words) {
    const longer = slug ? `${slug}-${word}` : word.slice(0, MOST);
    if (longer.length > MOST) break;
    slug = longer;
  }
  return slug;
}

/** What keeps a text from being the name of a sheet; null where nothing does. */
export function slugProblem(slug: string): string | null {
  if (slug === '') return 'Give the sheet a name in the register.';
  if (!SLUG.test(slug))
    return 'A name is small letters and digits, in words joined by single hyphens: pipe-laminar-hausen.';
  return slug.length > MOST ? `A name has ${MOST} characters at most.` : null;
}
