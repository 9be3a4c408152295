import type { CslItem } from '@merestone/engine';
import { inspectJson } from '../common/http/inspect-json.js';
import { readBibtex } from './bibtex/read-bibtex.js';
import { CitationFault, type CitationProblem } from './citation-fault.js';
import { detectFormat, type CitationFormat } from './citation-format.js';
import { cleanCsl } from './clean-csl.js';
import type { RawItem } from './raw-item.js';
import { READING_LIMITS } from './reading-limits.js';
import { readRis } from './ris/read-ris.js';

export interface CitationReading {
  readonly format: CitationFormat;
  readonly items: readonly CslItem[];
  readonly problems: readonly CitationProblem[];
}

const READERS: Readonly<Record<CitationFormat, (text: string) => RawItem[]>> = {
  bibtex: readBibtex,
  ris: readRis,
  'csl-json': readCslJson,
};

/**
 * Reads pasted references into clean CSL-JSON. Throws a `CitationFault` where the text is not of the format, is too
 * much, or gives no reference at all; smaller matters are problems beside the items.
 */
export function readCitations(given: string, format?: CitationFormat): CitationReading {
  const text = given.replace(/^\uFEFF/, '');
  refuseWhatIsNoText(text);
  const found = format ?? detectFormat(text);
  if (found === undefined) {
    throw new CitationFault(
      'This is neither BibTeX nor RIS nor CSL-JSON as far as can be seen. Name the format.',
      'format',
    );
  }
  const items: CslItem[] = [];
  const problems: CitationProblem[] = [];
  for (const raw of READERS[found](text)) {
    const told = raw.problems.map((message): CitationProblem => ({ field: '', message }));
    const item = cleanCsl(raw.value, (field, message) => told.push({ field, message }));
    const place = item === undefined ? undefined : `items.${items.length}`;
    if (item === undefined) told.push({ field: '', message: 'It names no work: a title is missing.' });
    else items.push(item);
    problems.push(...told.map(({ field, message }) => problemOf(raw, place, field, message)));
  }
  if (items.length > 0) return { format: found, items, problems };
  throw new CitationFault(problems[0]?.message ?? 'There is no reference in this text.');
}

function problemOf(raw: RawItem, place: string | undefined, field: string, message: string): CitationProblem {
  if (place !== undefined) return { field: field === '' ? place : `${place}.${field}`, message };
  return { field: 'text', message: `In ${raw.name}: ${message}` };
}

function refuseWhatIsNoText(text: string): void {
  if (Buffer.byteLength(text) > READING_LIMITS.bytes) {
    throw new CitationFault(
      `The text is larger than ${READING_LIMITS.bytes / 1000} kB. Give fewer references at a time.`,
    );
  }
  if (/[^\P{Cc}\t\n\r\f]/u.test(text) || text.includes('\uFFFD')) {
    throw new CitationFault('This is not text: it holds characters that no text has.');
  }
}

function readCslJson(text: string): RawItem[] {
  const value = parse(text);
  const refused = inspectJson(value)[0];
  if (refused !== undefined) throw new CitationFault(`${refused.field}: ${refused.message}`);
  const list = Array.isArray(value) ? (value as unknown[]) : [value];
  if (list.length > READING_LIMITS.entries) {
    throw new CitationFault(`There are more than ${READING_LIMITS.entries} items. Give fewer at a time.`);
  }
  return list.map((item, i) => ({ name: `item ${i + 1}`, value: item, problems: [] }));
}

function parse(text: string): unknown {
  try {
    return JSON.parse(text) as unknown;
  } catch {
    throw new CitationFault('This is not valid JSON.');
  }
}
