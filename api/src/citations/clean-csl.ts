import { readDoi, type CslItem } from '@merestone/engine';
import { CSL_TYPES } from './csl-types.js';
import { plainText } from './plain-text.js';
import { READING_LIMITS } from './reading-limits.js';

type Name = NonNullable<CslItem['author']>[number];
type NameField = 'author' | 'editor';
type TextField = (typeof TEXT_FIELDS)[number][0];

/** A citation as a sheet keeps it: the members that the sheet's schema names, and these besides. */
export type CleanCsl = CslItem & { [field in TextField]?: string } & { editor?: Name[]; URL?: string };

type Unknown = Readonly<Record<string, unknown>>;
/** Told of everything that was left out or changed in meaning, by field. */
export type Tell = (field: string, message: string) => void;

const LONG_TEXT = 1000;
const SHORT_TEXT = 200;
const TEXT_FIELDS = [
  ['title', LONG_TEXT],
  ['container-title', LONG_TEXT],
  ['collection-title', LONG_TEXT],
  ['publisher', SHORT_TEXT],
  ['publisher-place', SHORT_TEXT],
  ['genre', SHORT_TEXT],
  ['number', SHORT_TEXT],
  ['ISBN', SHORT_TEXT],
] as const;
const NUMBER_FIELDS = ['edition', 'volume', 'issue'] as const;

/**
 * A citation item with the fields that a sheet keeps, as plain text; undefined where it names no work. Takes anything:
 * what is not of the form is left out and told.
 */
export function cleanCsl(value: unknown, tell: Tell): CleanCsl | undefined {
  if (!isRecord(value)) return undefined;
  const item: CleanCsl = { type: typeOf(value.type, tell) };
  for (const [field, longest] of TEXT_FIELDS) {
    const text = textOf(value[field], longest, (message) => tell(field, message));
    if (text !== '') item[field] = text;
  }
  for (const field of NUMBER_FIELDS) {
    const given = value[field];
    const text = textOf(given, SHORT_TEXT, (message) => tell(field, message));
    if (text !== '') item[field] = Number.isSafeInteger(given) ? (given as number) : text;
  }
  const page = textOf(value.page, SHORT_TEXT, (message) => tell('page', message)).replace(
    /\s*[-‐‑–—]+\s*/g,
    '-',
  );
  if (page !== '') item.page = page;
  const author = namesOf('author', value.author, tell);
  if (author.length > 0) item.author = author;
  const editor = namesOf('editor', value.editor, tell);
  if (editor.length > 0) item.editor = editor;
  const issued = dateOf(value.issued, tell);
  if (issued !== undefined) item.issued = issued;
  addAddress(item, value, tell);
  return item.title === undefined && item['container-title'] === undefined ? undefined : item;
}

function typeOf(value: unknown, tell: Tell): string {
  if (typeof value === 'string' && CSL_TYPES.has(value)) return value;
  tell('type', 'The kind of work is not known; it was taken as a document.');
  return 'document';
}

function textOf(value: unknown, longest: number, tell: (message: string) => void): string {
  const first: unknown = Array.isArray(value) ? value[0] : value;
  const given = typeof first === 'number' && Number.isFinite(first) ? String(first) : first;
  if (typeof given !== 'string') return '';
  const text = plainText(given.slice(0, READING_LIMITS.fieldText));
  if (given.length <= READING_LIMITS.fieldText && text.length <= longest) return text;
  tell(`This is longer than ${longest} characters and was cut there.`);
  return text.slice(0, longest).trim();
}

function namesOf(field: NameField, value: unknown, tell: Tell): Name[] {
  if (!Array.isArray(value)) return [];
  const given = value.slice(0, READING_LIMITS.authors) as unknown[];
  if (value.length > given.length) tell(field, `Names after the ${READING_LIMITS.authors}th were left out.`);
  const names = given.map(nameOf).filter((name) => name !== undefined);
  const known = names.filter(({ family, given: first }) => family !== 'others' || first !== undefined);
  if (known.length < names.length) tell(field, 'Further authors are not named here.');
  return known;
}

/** Particles go with the family name, a suffix with the given names, as the house style writes them. */
function nameOf(value: unknown): Name | undefined {
  if (!isRecord(value)) return undefined;
  const part = (key: string): string => textOf(value[key], SHORT_TEXT, () => undefined);
  const literal = part('literal');
  const particle = part('non-dropping-particle') || part('dropping-particle');
  const family = [particle, part('family')].filter(Boolean).join(' ');
  // `Bird, R. Byron, Jr.` is not the order of BibTeX, but is met often.
  const given = [part('given'), part('suffix')]
    .filter(Boolean)
    .sort((a, b) => rank(a) - rank(b))
    .join(' ');
  if (family !== '') return given === '' ? { family } : { family, given };
  if (literal !== '' || given !== '') return { literal: literal || given };
  return undefined;
}

function rank(name: string): number {
  return /^(?:Jr|Sr|II|III|IV)\.?$/.test(name) ? 1 : 0;
}

function dateOf(value: unknown, tell: Tell): CslItem['issued'] {
  if (!isRecord(value)) return undefined;
  const parts: unknown = value['date-parts'];
  const dates = (Array.isArray(parts) ? (parts as unknown[]) : [])
    .slice(0, 2)
    .map(datePart)
    .filter((date) => date.length > 0);
  if (dates.length > 0) return { 'date-parts': dates };
  const words = [value.literal, value.raw].find((text) => typeof text === 'string');
  if (typeof words !== 'string') return undefined;
  const year = /(?:^|\D)(1[5-9]\d\d|20\d\d)(?:\D|$)/.exec(words.slice(0, SHORT_TEXT))?.[1];
  tell(
    'issued',
    year === undefined ? 'The year could not be read.' : `Of the date given only the year ${year} was read.`,
  );
  return year === undefined ? undefined : { 'date-parts': [[Number(year)]] };
}

function datePart(value: unknown): number[] {
  const [year, month, day] = (Array.isArray(value) ? (value as unknown[]) : []).map(Number);
  if (!within(year, 1000, 2200)) return [];
  if (!within(month, 1, 12)) return [year];
  return within(day, 1, 31) ? [year, month, day] : [year, month];
}

function within(value: number | undefined, lo: number, hi: number): value is number {
  return value !== undefined && Number.isInteger(value) && value >= lo && value <= hi;
}

function addAddress(item: CleanCsl, value: Unknown, tell: Tell): void {
  const address = textOf(value.URL, LONG_TEXT, () => undefined);
  const doi = textOf(value.DOI, LONG_TEXT, () => undefined);
  const read = readDoi(doi) ?? (doi === '' ? readDoi(address) : undefined);
  if (read !== undefined) item.DOI = read.name;
  else if (doi !== '') tell('DOI', `"${doi.slice(0, 80)}" is not a DOI and was left out.`);
  if (address === '' || readDoi(address) !== undefined) return;
  if (/^https?:\/\/[^\s"<>\\]+$/i.test(address)) item.URL = address;
  else tell('URL', 'This is not an address of the web and was left out.');
}

function isRecord(value: unknown): value is Unknown {
  return typeof value === 'object' && value !== null && !Array.isArray(value);
}
