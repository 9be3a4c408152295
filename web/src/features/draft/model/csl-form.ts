import type { CslItem } from '@merestone/engine';
import type { SourceRow } from './draft-form';
import { compact } from './form-reading';

type Author = NonNullable<CslItem['author']>[number];
type CitationFields = Omit<SourceRow, 'id' | 'place' | 'gives' | 'read'>;

/** A citation as the form shows it. What the form has no field for stays in `kept`. */
export function citationFields(csl: CslItem): CitationFields {
  return {
    kept: csl,
    type: csl.type,
    title: csl.title ?? '',
    authors: (csl.author ?? []).map(authorText).join('\n'),
    issued: issuedText(csl.issued),
    container: csl['container-title'] ?? '',
    publisher: csl.publisher ?? '',
    edition: text(csl.edition),
    volume: text(csl.volume),
    issue: text(csl.issue),
    page: csl.page ?? '',
    doi: csl.DOI ?? '',
  };
}

/** The citation that the fields say. A member that reads as it came is handed on as it came. */
export function citationOf(row: CitationFields): CslItem {
  const { kept } = row;
  const members = {
    title: filled(row.title),
    author: authorsOf(row.authors, kept.author),
    issued: row.issued === issuedText(kept.issued) ? kept.issued : issuedOf(row.issued),
    'container-title': filled(row.container),
    publisher: filled(row.publisher),
    edition: asItCame(row.edition, kept.edition),
    volume: asItCame(row.volume, kept.volume),
    issue: asItCame(row.issue, kept.issue),
    page: filled(row.page),
    DOI: filled(row.doi),
  };
  return compact({ ...kept, ...members, type: row.type });
}

/** `Gilliland, E. R.`; a body, which has no given name, in braces as BibTeX writes it. */
function authorText({ family, given, literal }: Author): string {
  if (literal !== undefined) return `{${literal}}`;
  return given === undefined ? (family ?? '') : `${family ?? ''}, ${given}`;
}

function authorsOf(typed: string, kept: readonly Author[] = []): Author[] | undefined {
  const lines = typed.split('\n').filter((line) => line.trim() !== '');
  if (lines.length === 0) return undefined;
  const known = new Map(kept.map((author) => [authorText(author), author]));
  return lines.map((line) => known.get(line) ?? authorOf(line.trim()));
}

function authorOf(line: string): Author {
  const body = /^\{(.*)\}$/.exec(line)?.[1];
  if (body !== undefined) return { literal: body };
  const comma = line.indexOf(',');
  if (comma < 0) return { family: line };
  const [family, given] = [line.slice(0, comma).trim(), line.slice(comma + 1).trim()];
  return { ...(family ? { family } : {}), ...(given ? { given } : {}) };
}

function issuedText(issued: CslItem['issued']): string {
  return (issued?.['date-parts'][0] ?? []).join('-');
}

function issuedOf(typed: string): CslItem['issued'] {
  const parts = typed
    .split(/[-/ ]+/)
    .map((part) => part.trim())
    .filter(Boolean);
  if (parts.length === 0) return undefined;
  return { 'date-parts': [parts.map((part) => (/^\d{1,4}$/.test(part) ? Number(part) : part))] };
}

function asItCame(typed: string, kept: string | number | undefined): string | number | undefined {
  return typed === text(kept) ? kept : filled(typed);
}

function text(value: string | number | undefined): string {
  return value === undefined ? '' : String(value);
}

function filled(typed: string): string | undefined {
  return typed.trim() === '' ? undefined : typed;
}
