import { CitationFault } from '../citation-fault.js';
import { cslFromRis } from '../citation-library.js';
import type { RawItem } from '../raw-item.js';
import { READING_LIMITS } from '../reading-limits.js';

/** Tags of the RIS format that a citation is made of. */
const TAGS = new Set(
  'TY AU A1 A2 A3 ED TI T1 T2 T3 BT CT JO JF JA J1 J2 PY Y1 DA VL IS CP SP EP PB CY PP DO UR SN ET M1 M3'.split(
    ' ',
  ),
);
const LISTED = new Set(['AU', 'A1', 'A2', 'A3', 'ED']);
const LINE = /^([A-Z][A-Z0-9]) {1,2}- ?(.*)$/;

interface Scanned {
  readonly line: number;
  readonly tags: Map<string, string[]>;
}

/** Reads RIS. One record that cannot be read does not keep the others from being read. */
export function readRis(text: string): RawItem[] {
  return scan(text).map(({ line, tags }) => {
    const name = `the record of line ${line}`;
    const record = Object.fromEntries(
      [...tags].map(([tag, values]) => [tag, LISTED.has(tag) ? values : (values[0] ?? '')]),
    );
    try {
      return { name, value: completed(cslFromRis(record), tags), problems: [] };
    } catch {
      return { name, value: undefined, problems: ['Its lines could not be read.'] };
    }
  });
}

/** What the library passes over because its kind of work has no such tag in one of the format's two versions. */
function completed(value: unknown, tags: ReadonlyMap<string, readonly string[]>): unknown {
  if (typeof value !== 'object' || value === null) return value;
  const first = (...names: string[]): string | undefined =>
    names.map((tag) => tags.get(tag)?.[0]).find(Boolean);
  const type = 'type' in value ? value.type : undefined;
  const container = type === 'book' ? undefined : first('T2', 'BT', 'JF', 'JO', 'JA', 'J2');
  return {
    ...(container === undefined ? {} : { 'container-title': container }),
    ...(type === 'report' ? { number: first('M1', 'IS') } : {}),
    ...(tags.has('ED') ? { editor: tags.get('ED')?.map(nameFrom) } : {}),
    ...value,
    // As it stands, so that a wrong one is told rather than passed over.
    DOI: first('DO'),
  };
}

function nameFrom(text: string): object {
  const [family, ...given] = text.split(/,\s*/);
  return { family, given: given.join(' ') };
}

function scan(text: string): Scanned[] {
  const records: Scanned[] = [];
  let open: Scanned | undefined;
  let values: string[] | undefined;
  for (const [i, whole] of text.split(/\r\n?|\n/).entries()) {
    const [, tag, value = ''] = LINE.exec(whole.trim()) ?? [];
    if (tag === undefined) {
      continueLast(values, whole.trim(), i + 1);
      continue;
    }
    if (tag === 'TY') {
      if (records.length === READING_LIMITS.entries) {
        throw new CitationFault(
          `There are more than ${READING_LIMITS.entries} records. Give fewer at a time.`,
        );
      }
      open = { line: i + 1, tags: new Map() };
      records.push(open);
    } else if (tag === 'ER') {
      open = undefined;
    } else if (open === undefined) {
      throw new CitationFault(
        `Line ${i + 1}: the tag ${tag} stands outside a record; a record begins with TY.`,
      );
    }
    values =
      open === undefined || !TAGS.has(tag) || value.trim() === '' ? undefined : add(open, tag, value.trim());
    if (values !== undefined) checkLength(values, i + 1);
  }
  return records;
}

function add({ tags }: Scanned, tag: string, value: string): string[] {
  const values = tags.get(tag) ?? [];
  // Kinds of work are in capitals by the format; some programs do not keep to it.
  values.push(tag === 'TY' ? value.toUpperCase() : value);
  tags.set(tag, values);
  return values;
}

/** A line without a tag goes on with the value before. */
function continueLast(values: string[] | undefined, line: string, number: number): void {
  const last = values?.pop();
  if (values === undefined || last === undefined) return;
  values.push(line === '' ? last : `${last} ${line}`);
  checkLength(values, number);
}

function checkLength(values: readonly string[], line: number): void {
  if ((values.at(-1)?.length ?? 0) > READING_LIMITS.fieldText) {
    throw new CitationFault(`Line ${line}: a value may have ${READING_LIMITS.fieldText} characters at most.`);
  }
  if (values.length > READING_LIMITS.authors) {
    throw new CitationFault(`Line ${line}: there are more than ${READING_LIMITS.authors} lines of one tag.`);
  }
}
