import { CitationFault } from '../citation-fault.js';
import { READING_LIMITS } from '../reading-limits.js';
import { TextCursor } from './text-cursor.js';

/** An entry as it stands in the file: the text of its fields still TeX, strings put in. */
export interface ScannedEntry {
  readonly type: string;
  readonly key: string;
  /** By lower-case name, in the order of the file. */
  readonly fields: ReadonlyMap<string, string>;
  readonly line: number;
}

/** Abbreviations that BibTeX's styles define. */
const MONTHS = ['jan', 'feb', 'mar', 'apr', 'may', 'jun', 'jul', 'aug', 'sep', 'oct', 'nov', 'dec'];

/**
 * Takes a BibTeX file apart, in one pass over the text. Nothing is ever defined or included by what it holds: a
 * `@string` is a plain text, so that no definition can grow out of others. Throws a fault with its line.
 */
export function scanBibtex(text: string): ScannedEntry[] {
  const cursor = new TextCursor(text);
  const strings = new Map(MONTHS.map((month, i) => [month, String(i + 1)]));
  const entries: ScannedEntry[] = [];
  while (cursor.skipPast('@')) {
    const line = cursor.line;
    const type = cursor.take(/[A-Za-z]{1,40}/y).toLowerCase();
    cursor.skipSpace();
    // An @ that opens nothing is ordinary text between entries, such as a mail address.
    if (type === '' || !'{('.includes(cursor.next || ' ')) continue;
    const close = cursor.step() === '{' ? '}' : ')';
    switch (type) {
      case 'comment':
      case 'preamble':
        cursor.skipGroup(close);
        break;
      case 'string':
        readString(cursor, close, strings);
        break;
      default:
        if (entries.length === READING_LIMITS.entries) {
          throw new CitationFault(
            `There are more than ${READING_LIMITS.entries} entries. Give fewer at a time.`,
          );
        }
        entries.push(readEntry(cursor, type, close, strings, line));
    }
  }
  return entries;
}

function readString(cursor: TextCursor, close: string, strings: Map<string, string>): void {
  cursor.skipSpace();
  const name = cursor.take(NAME).toLowerCase();
  cursor.skipSpace();
  cursor.expect('=', 'a @string');
  cursor.skipSpace();
  const value = readPiece(cursor, strings);
  cursor.skipSpace();
  if (cursor.next === '#') cursor.fail('A @string put together from others is not read. Write its text out.');
  cursor.expect(close, 'a @string');
  if (value.length > READING_LIMITS.stringText) {
    cursor.fail(`A @string may have ${READING_LIMITS.stringText} characters at most.`);
  }
  if (strings.size >= READING_LIMITS.strings + MONTHS.length) {
    cursor.fail(`There are more than ${READING_LIMITS.strings} @string definitions.`);
  }
  strings.set(name, value);
}

function readEntry(
  cursor: TextCursor,
  type: string,
  close: string,
  strings: ReadonlyMap<string, string>,
  line: number,
): ScannedEntry {
  cursor.skipSpace();
  const key = cursor.take(/[^\s,{}()"=#%]{0,200}/y);
  cursor.skipSpace();
  const fields = new Map<string, string>();
  while (cursor.next === ',') {
    cursor.step();
    cursor.skipSpace();
    if (cursor.next === close) break;
    const name = cursor.take(NAME).toLowerCase();
    if (name === '') cursor.fail(`The entry "${key}" has something where the name of a field must stand.`);
    cursor.skipSpace();
    cursor.expect('=', `the field ${name} of "${key}"`);
    const value = readValue(cursor, strings);
    // The first of two is what BibTeX itself takes.
    if (!fields.has(name)) fields.set(name, value);
    if (fields.size > READING_LIMITS.fieldsPerEntry) {
      cursor.fail(`The entry "${key}" has more than ${READING_LIMITS.fieldsPerEntry} fields.`);
    }
    cursor.skipSpace();
  }
  cursor.expect(close, `the entry "${key}" of line ${line}`);
  return { type, key, fields, line };
}

const NAME = /[A-Za-z_][A-Za-z0-9_:+.-]{0,60}/y;

function readValue(cursor: TextCursor, strings: ReadonlyMap<string, string>): string {
  let value = '';
  for (let pieces = 1; ; pieces += 1) {
    cursor.skipSpace();
    value += readPiece(cursor, strings);
    if (value.length > READING_LIMITS.fieldText) {
      cursor.fail(`A field may have ${READING_LIMITS.fieldText} characters at most.`);
    }
    cursor.skipSpace();
    if (cursor.next !== '#') return value;
    if (pieces === READING_LIMITS.joined)
      cursor.fail(`A field may be joined from ${READING_LIMITS.joined} pieces at most.`);
    cursor.step();
  }
}

function readPiece(cursor: TextCursor, strings: ReadonlyMap<string, string>): string {
  if (cursor.next === '{') {
    cursor.step();
    return cursor.takeGroup('}');
  }
  if (cursor.next === '"') {
    cursor.step();
    return cursor.takeGroup('"');
  }
  const number = cursor.take(/\d{1,20}/y);
  if (number !== '') return number;
  const name = cursor.take(NAME).toLowerCase();
  if (name === '') cursor.fail('A value must stand between braces or quotation marks.');
  const value = strings.get(name);
  return value ?? cursor.fail(`The string "${name}" is not defined.`);
}
