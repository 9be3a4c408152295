import { parseTypedNumber } from '../../../shared/ui/quantity-field/parse-typed-number';
import type { TableRowForm } from './draft-form';
import { newRowId } from './empty-rows';
import { suggestSlug } from './suggest-slug';

export interface PastedTable {
  rows: TableRowForm[];
  /** Symbols that the columns were read as. */
  symbols: string[];
  /** What was not taken over, or has to be looked at. */
  problems: string[];
}

const MOST_ROWS = 400;

/**
 * Reads rows pasted from a spreadsheet (tabs) or a CSV text (semicolons or commas). The first line names the columns:
 * `label`, `key`, `note`, and symbols of the sheet. Numbers are kept as they were written.
 */
export function pasteTable(text: string, symbols: readonly string[], taken: readonly string[]): PastedTable {
  const lines = text.split(/\r?\n/).filter((line) => line.trim() !== '');
  const [heading = '', ...body] = lines;
  const separator = separatorOf(heading);
  const names = cells(heading, separator).map((name) => columnOf(name, symbols));
  const problems: string[] = [];
  const read = names.filter((name) => symbols.includes(name));
  if (read.length === 0)
    return {
      rows: [],
      symbols: [],
      problems: [
        `The first line has to name the columns: label, and symbols of this sheet${symbols.length > 0 ? ` (${symbols.slice(0, 6).join(', ')})` : ''}.`,
      ],
    };
  for (const [i, name] of names.entries())
    if (!symbols.includes(name) && !FIXED.has(name))
      problems.push(
        `Column ${i + 1}, “${name || 'without a name'}”, is no symbol of the sheet and was left out.`,
      );
  if (body.length > MOST_ROWS) problems.push(`Only the first ${MOST_ROWS} rows were taken.`);
  const keys = new Set(taken);
  const rows = body.slice(0, MOST_ROWS).map((line, i) => {
    const found = cells(line, separator);
    const at = (name: string) => found[names.indexOf(name)]?.trim() ?? '';
    const label = at('label') || at('key') || `Row ${i + 1}`;
    const values = read.map((symbol) => ({ symbol, text: at(symbol) }));
    for (const { symbol, text: typed } of values)
      if (!['number', 'empty'].includes(parseTypedNumber(typed).kind))
        problems.push(`${label}, ${symbol}: “${typed}” is not read as a number.`);
    return {
      id: newRowId(),
      key: unlike(keys, at('key') || suggestSlug({ title: label }) || `row-${i + 1}`),
      label,
      values,
      note: at('note'),
    };
  });
  return { rows, symbols: read, problems };
}

const FIXED = new Set(['label', 'key', 'note']);

/** A heading may carry a unit behind the symbol: `a_t (1/m)`, `a_t [1/m]`. */
function columnOf(heading: string, symbols: readonly string[]): string {
  const bare = heading.trim().replace(/\s*[([].*$/, '');
  const lower = bare.toLowerCase();
  if (symbols.includes(bare)) return bare;
  return FIXED.has(lower) ? lower : bare;
}

function separatorOf(line: string): string {
  if (line.includes('\t')) return '\t';
  return line.includes(';') ? ';' : ',';
}

/** Cells of a line; in double quotes a separator is text, and two quotes are one. */
function cells(line: string, separator: string): string[] {
  const found: string[] = [''];
  let quoted = false;
  for (let i = 0; i < line.length; i += 1) {
    const char = line.charAt(i);
    const last = found.length - 1;
    if (char === '"' && quoted && line.charAt(i + 1) === '"') {
      found[last] = `${found[last] ?? ''}"`;
      i += 1;
    } else if (char === '"' && (quoted || found[last] === '')) quoted = !quoted;
    else if (char === separator && !quoted) found.push('');
    else found[last] = `${found[last] ?? ''}${char}`;
  }
  return found;
}

function unlike(keys: Set<string>, wanted: string): string {
  let key = wanted;
  for (let n = 2; keys.has(key); n += 1) key = `${wanted}-${n}`;
  keys.add(key);
  return key;
}
