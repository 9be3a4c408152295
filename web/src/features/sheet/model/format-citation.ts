import type { CslItem } from '@merestone/engine';

/** A citation in the order of a reference list; the work's title apart, because it is set in italics. */
export interface Citation {
  before: string;
  /** Journal or book. */
  work: string;
  after: string;
  doi: string | null;
}

/** Formats a CSL-JSON item: `Gilliland, E. R. and Sherwood, T. K. (1934). Diffusion …. *Ind. Eng. Chem.* 26 (5), 516–523.` */
export function formatCitation(item: CslItem): Citation {
  const year = item.issued?.['date-parts'][0]?.[0];
  const container = item['container-title'];
  const lead = [authors(item.author ?? []), year === undefined ? '' : `(${year})`].filter(Boolean).join(' ');
  const title = item.title ?? '';
  return {
    before: sentences(lead, container === undefined ? '' : title),
    work: container ?? title,
    after: tail(item),
    doi: item.DOI ?? null,
  };
}

/** The same as one line of text. */
export function citationText(item: CslItem): string {
  const { before, work, after } = formatCitation(item);
  return [before, work + (after.startsWith(',') ? '' : ' ') + after]
    .filter((part) => part.trim() !== '')
    .join(' ');
}

function authors(people: NonNullable<CslItem['author']>): string {
  const names = people.map(
    ({ family, given, literal }) => literal ?? [family, given].filter(Boolean).join(', '),
  );
  const last = names.at(-1) ?? '';
  return names.length < 2 ? last : `${names.slice(0, -1).join('; ')} and ${last}`;
}

function tail({ volume, issue, page, edition, publisher }: CslItem): string {
  const place = [
    volume === undefined ? '' : `${volume}${issue === undefined ? '' : ` (${issue})`}`,
    page === undefined ? '' : page.replace(/-+/g, '–'),
    edition === undefined ? '' : editionText(edition),
    publisher ?? '',
  ].filter(Boolean);
  return place.length === 0
    ? '.'
    : `${volume === undefined ? ',' : ''} ${place.join(', ')}.`.replace(/^ /, '');
}

function editionText(edition: string | number): string {
  return /^\d+$/.test(String(edition)) ? `ed. ${edition}` : String(edition);
}

function sentences(...parts: string[]): string {
  return parts
    .filter(Boolean)
    .map((part) => (/[.?!]$/.test(part) ? part : `${part}.`))
    .join(' ');
}
