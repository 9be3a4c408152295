import type { CslItem } from '@merestone/engine';

/** A citation in the order of a reference list; the work's title apart, because it is set in italics. */
export interface Citation {
  before: string;
  /** Journal or book. */
  work: string;
  /** Volume, pages, edition, publisher; without a full stop. */
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

function authors(people: NonNullable<CslItem['author']>): string {
  const names = people.map(
    ({ family, given, literal }) => literal ?? [family, given].filter(Boolean).join(', '),
  );
  const last = names.at(-1) ?? '';
  return names.length < 2 ? last : `${names.slice(0, -1).join('; ')} and ${last}`;
}

/** What follows the work's title, without a full stop: ` 26 (5), 516–523` or `, ed. 3, Wiley`. */
function tail({ volume, issue, page, edition, publisher }: CslItem): string {
  const number = volume === undefined ? '' : ` ${volume}${issue === undefined ? '' : ` (${issue})`}`;
  const rest = [
    page === undefined ? '' : page.replace(/-+/g, '–'),
    edition === undefined ? '' : editionText(edition),
    publisher ?? '',
  ].filter(Boolean);
  return rest.length === 0 ? number : `${number}, ${rest.join(', ')}`;
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
