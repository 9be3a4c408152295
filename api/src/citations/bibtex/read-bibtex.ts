import { CitationFault } from '../citation-fault.js';
import { cslFromBibtex } from '../citation-library.js';
import type { RawItem } from '../raw-item.js';
import { readableTex } from './read-tex.js';
import { scanBibtex, type ScannedEntry } from './scan-bibtex.js';

/** Fields that a citation is made of; what else a file keeps (abstracts, keywords, file paths) is left alone. */
const FIELDS = new Set(
  (
    'author editor title booktitle journal year month day date volume number issue pages publisher school ' +
    'institution organization address location edition chapter series type doi url isbn howpublished eid'
  ).split(' '),
);
/** As the library takes them: not decoded as TeX. */
const VERBATIM = new Set(['doi', 'url']);

/** Names that other programs write, and BibTeX's own. */
const SAME: readonly (readonly [string, string])[] = [
  ['journaltitle', 'journal'],
  ['location', 'address'],
];
const TYPES: ReadonlyMap<string, string> = new Map([
  ['thesis', 'phdthesis'],
  ['report', 'techreport'],
  ['online', 'misc'],
  ['collection', 'book'],
  ['mvbook', 'book'],
  ['electronic', 'misc'],
  ['www', 'misc'],
]);

/** Reads BibTeX. One entry that cannot be read does not keep the others from being read. */
export function readBibtex(text: string): RawItem[] {
  return scanBibtex(text).map(readEntry);
}

function readEntry(entry: ScannedEntry): RawItem {
  const name = `the entry ${entry.key === '' ? '' : `"${entry.key}" `}of line ${entry.line}`;
  const problems: string[] = [];
  const properties: Record<string, string> = {};
  for (const [field, value] of withCommonNames(entry.fields)) {
    if (!FIELDS.has(field) || value.trim() === '') continue;
    const tex = VERBATIM.has(field)
      ? value
      : readableTex(value, `Line ${entry.line}, ${field}`, (m) => problems.push(m));
    properties[field] = tex.replace(/\s+/g, ' ').trim();
  }
  if (entry.fields.has('crossref') || entry.fields.has('xdata')) {
    problems.push('What this entry takes from another one is not filled in.');
  }
  if (properties.year === undefined && properties.date !== undefined) spreadDate(properties);
  try {
    const type = TYPES.get(entry.type) ?? entry.type;
    return {
      name,
      value: withYear(cslFromBibtex({ type, label: 'item', properties }), properties),
      problems,
    };
  } catch (error) {
    if (error instanceof CitationFault) throw error;
    return { name, value: undefined, problems: ['Its TeX could not be read.'] };
  }
}

function withCommonNames(fields: ReadonlyMap<string, string>): Map<string, string> {
  const common = new Map(fields);
  for (const [other, own] of SAME) {
    const value = common.get(other);
    if (value !== undefined && !common.has(own)) common.set(own, value);
    common.delete(other);
  }
  return common;
}

/** `date = {1966-02}` of newer files, as year and month. */
function spreadDate(properties: Record<string, string>): void {
  const [, year, month, day] = /^(\d{4})(?:-(\d{2})(?:-(\d{2}))?)?/.exec(properties.date ?? '') ?? [];
  properties.year = year ?? properties.date ?? '';
  if (month !== undefined) properties.month = month;
  if (day !== undefined) properties.day = day;
  delete properties.date;
}

/** The library wants a number for a year; what else stands there is for the cleaning to make sense of. */
function withYear(value: unknown, { year }: Readonly<Record<string, string>>): unknown {
  if (year === undefined || typeof value !== 'object' || value === null || 'issued' in value) return value;
  return { ...value, issued: { literal: year } };
}
