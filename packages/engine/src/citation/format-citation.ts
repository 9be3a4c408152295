import type { CslItem } from '../sheet/common-schema.js';
import { readDoi, type DoiName } from './doi.js';

/** The parts of a citation as the house style writes them; empty where the item has none. */
export interface CitationParts {
  /** `Gilliland, E. R. and Sherwood, T. K.`; of more than six the first three, et al. */
  readonly authors: string;
  readonly year: string;
  readonly title: string;
  /** Journal, or the book that a chapter stands in. */
  readonly container: string;
  /** Volume with the issue: `26 (5)`. */
  readonly volume: string;
  /** `516–523`. */
  readonly pages: string;
  readonly edition: string;
  /** What kind of thesis or report it is, with the report's number. */
  readonly kind: string;
  readonly publisher: string;
}

/** A citation in the order of a reference list; the work apart, because it is set in italics. */
export interface Citation {
  readonly before: string;
  /** Journal or book. */
  readonly work: string;
  /** Volume, pages, edition, publisher as they follow the work, the space or comma before them included. */
  readonly after: string;
  /** Null where there is none, or where what the item has is no DOI. */
  readonly doi: DoiName | null;
  readonly parts: CitationParts;
  /** The whole in one line, the DOI included. */
  readonly text: string;
}

const MOST_AUTHORS = 6;
const NAMED_OF_MANY = 3;

/** Formats a CSL-JSON item: `Gilliland, E. R. and Sherwood, T. K. (1934). Diffusion …. Ind. Eng. Chem. 26 (5), 516–523.` */
export function formatCitation(item: CslItem): Citation {
  const parts = partsOf(item);
  const lead = [parts.authors, parts.year && `(${parts.year})`].filter(Boolean).join(' ');
  const before = sentences(lead, parts.container === '' ? '' : parts.title);
  const work = parts.container || parts.title;
  const after = tail(parts);
  const doi = readDoi(item.DOI ?? '') ?? null;
  const text = [before, sentences(work + after), doi && `doi:${doi.name}`].filter(Boolean).join(' ');
  return { before, work, after, doi, parts, text };
}

function partsOf(item: CslItem): CitationParts {
  const { volume, issue } = item;
  const { genre, number }: Record<string, unknown> = item;
  return {
    authors: names(item.author ?? []),
    year: String(item.issued?.['date-parts'][0]?.[0] ?? ''),
    title: item.title ?? '',
    container: item['container-title'] ?? '',
    volume: [volume, issue === undefined || issue === '' ? '' : `(${issue})`].filter(Boolean).join(' '),
    pages: (item.page ?? '').replace(/\s*[-‐‑–—]+\s*/g, '–'),
    edition: editionText(item.edition),
    kind: [plainText(genre), plainText(number)].filter(Boolean).join(' '),
    publisher: item.publisher ?? '',
  };
}

function names(people: NonNullable<CslItem['author']>): string {
  const all = people
    .map(({ family, given, literal }) => literal ?? [family, given].filter(Boolean).join(', '))
    .filter((name) => name !== '');
  if (all.length > MOST_AUTHORS) return `${all.slice(0, NAMED_OF_MANY).join('; ')} et al.`;
  const last = all.at(-1) ?? '';
  return all.length < 2 ? last : `${all.slice(0, -1).join('; ')} and ${last}`;
}

function tail({ volume, pages, edition, kind, publisher }: CitationParts): string {
  const rest = [pages, edition, kind, publisher].filter(Boolean);
  return (volume && ` ${volume}`) + rest.map((part) => `, ${part}`).join('');
}

function editionText(edition: string | number | undefined): string {
  if (edition === undefined || edition === '') return '';
  return /^\d+$/.test(String(edition)) ? `ed. ${edition}` : String(edition);
}

function plainText(value: unknown): string {
  return typeof value === 'string' || typeof value === 'number' ? String(value) : '';
}

function sentences(...parts: string[]): string {
  return parts
    .filter(Boolean)
    .map((part) => (/[.?!]$/.test(part) ? part : `${part}.`))
    .join(' ');
}
