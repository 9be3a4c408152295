import { bibtexFromCsl } from '../citation-library.js';
import type { CleanCsl } from '../clean-csl.js';

const ESCAPES: ReadonlyMap<string, string> = new Map([
  ['\\', '\\textbackslash{}'],
  // BibTeX counts even escaped braces when it looks for the end of a value.
  ['{', '\\textbraceleft{}'],
  ['}', '\\textbraceright{}'],
  ['~', '\\textasciitilde{}'],
  ['^', '\\textasciicircum{}'],
  ['&', '\\&'],
  ['%', '\\%'],
  ['$', '\\$'],
  ['#', '\\#'],
  ['_', '\\_'],
]);

/** Kinds of work that the library calls otherwise than BibTeX's styles do. */
const TYPES: ReadonlyMap<string, string> = new Map([
  ['thesis', 'phdthesis'],
  ['chapter', 'incollection'],
]);

/** Fields that the library leaves out of some kinds of work, under the name that BibTeX gives them. */
const KEPT: readonly (readonly [
  'container-title' | 'publisher' | 'issue' | 'number',
  string,
  readonly string[],
])[] = [
  ['container-title', 'booktitle', ['journal', 'booktitle']],
  ['publisher', 'publisher', ['publisher', 'school', 'institution', 'organization', 'howpublished']],
  ['issue', 'number', ['number']],
  ['number', 'number', ['number']],
];

/** BibTeX of one item, in UTF-8. The item must be clean. */
export function bibtexEntry(item: CleanCsl, key: string): string {
  const entry = bibtexFromCsl(escaped(item));
  const fields = new Map(Object.entries(entry.properties).filter(([, value]) => value !== ''));
  for (const field of ['author', 'editor'] as const) {
    const names = item[field]?.map(nameText) ?? [];
    if (names.length > 0) fields.set(field, names.join(' and '));
  }
  // The library writes an address twice where nothing else was published.
  if (fields.get('howpublished') === fields.get('url')) fields.delete('howpublished');
  for (const [field, name, instead] of KEPT) {
    const value = item[field];
    if (value === undefined || instead.some((other) => fields.has(other))) continue;
    fields.set(name, escapedText(String(value)));
  }
  const lines = [...fields].map(([field, value]) => `  ${field} = {${value}},\n`);
  const type = entry.type === 'mastersthesis' ? entry.type : (TYPES.get(item.type) ?? entry.type);
  return `@${type}{${key},\n${lines.join('')}}\n`;
}

/** The item with its texts escaped. Two are taken as they are, and braces in them would end the value. */
function escaped(item: CleanCsl): Record<string, unknown> {
  const verbatim = (text: string | undefined) => text?.replace(/[{}\\]/g, encodeURIComponent);
  const texts = Object.entries(item).map(([field, value]): [string, unknown] => [
    field,
    typeof value === 'string' ? escapedText(value) : value,
  ]);
  const { type, page, DOI, URL } = item;
  const kept = { type, page, DOI: verbatim(DOI), URL: verbatim(URL) };
  return { ...Object.fromEntries(texts), ...withoutGaps(kept) };
}

function withoutGaps(
  values: Readonly<Record<string, string | undefined>>,
): Record<string, string | undefined> {
  return Object.fromEntries(Object.entries(values).filter(([, value]) => value !== undefined));
}

type Name = NonNullable<CleanCsl['author']>[number];

/** `van 't Riet, K.`; in braces what must not be taken apart. */
function nameText({ family, given, literal }: Name): string {
  if (family === undefined || given === undefined)
    return `{${escapedText(literal ?? family ?? given ?? '')}}`;
  return [family, given].map(namePart).join(', ');
}

/** Braces keep whole what is no ordinary name: BibTeX would find words between names and labels in it. */
function namePart(text: string): string {
  const ordinary = ORDINARY_NAME.test(text) && !RARE_SCRIPT.test(text) && !/\band\b/i.test(text);
  return ordinary ? text : `{${escapedText(text)}}`;
}

/** Words, of which those joined by hyphens are capitals throughout: `al-` would be taken for a particle. */
const ORDINARY_NAME =
  /^(?:[\p{L}\p{M}'’.]+|\p{Lu}[\p{L}\p{M}'’.]*(?:-\p{Lu}[\p{L}\p{M}'’.]*)+)(?: [\p{L}\p{M}'’.]+)*$/u;
/** The library tells capitals by half a character here. */
const RARE_SCRIPT = /[\u{10000}-\u{10ffff}]/u;

function escapedText(text: string): string {
  return (
    text
      .replace(/[\\{}~^&%$#_]/g, (sign) => ESCAPES.get(sign) ?? sign)
      // Else read as dashes and quotation marks.
      .replace(/--+|''+|``+/g, (signs) => signs.split('').join('{}'))
  );
}
