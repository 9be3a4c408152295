import { risFromCsl } from '../citation-library.js';
import type { CleanCsl } from '../clean-csl.js';

/** RIS of one item, with the line ends that the format asks for. The item must be clean. */
export function risRecord(item: CleanCsl, key: string): string {
  const record = risFromCsl(item);
  const tags = new Map<string, readonly string[]>([['TY', [String(record.TY ?? 'GEN')]]]);
  tags.set('ID', [key]);
  for (const [tag, value] of Object.entries(record)) {
    const values = [value].flat().map(String).filter(Boolean);
    if (!tags.has(tag) && values.length > 0) tags.set(tag, values);
  }
  keepRest(tags, item);
  const lines = [...tags].flatMap(([tag, values]) => values.map((value) => `${tag}  - ${value}`));
  return [...lines, 'ER  - ', ''].join('\r\n');
}

/** What the library leaves out of some kinds of work. */
function keepRest(tags: Map<string, readonly string[]>, item: CleanCsl): void {
  const { number, editor } = item;
  const keep = (tag: string, value: string | number | undefined, ...instead: string[]): void => {
    if (value === undefined || [tag, ...instead].some((other) => tags.has(other))) return;
    tags.set(tag, [String(value)]);
  };
  const year = item.issued?.['date-parts'][0]?.[0];
  keep('PY', year);
  // A date that is but a year says nothing more, and programs differ in how they read it.
  if (tags.get('DA')?.[0]?.endsWith('///') === true) tags.delete('DA');
  const pages = /^([^\s-]+)-([^\s-]+)$/.exec(item.page ?? '');
  if (pages !== null) {
    tags.set('SP', [pages[1] ?? '']);
    tags.set('EP', [pages[2] ?? '']);
  }
  keep('T2', item['container-title'], 'JF', 'JO', 'BT');
  keep('IS', item.issue, 'CP');
  keep('ET', item.edition);
  keep('PB', item.publisher);
  keep('VL', item.volume);
  keep('M1', number, 'IS');
  if (editor !== undefined && !tags.has('ED') && !tags.has('A2')) {
    tags.set(
      'ED',
      editor.map(({ family, given, literal }) => literal ?? [family, given].filter(Boolean).join(', ')),
    );
  }
}
