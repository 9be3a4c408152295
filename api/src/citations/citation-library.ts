import { plugins } from '@citation-js/core';
import '@citation-js/plugin-bibtex';
import '@citation-js/plugin-ris';

// One of the library's input types is an address that it would fetch, others are pages and scripts: none is wanted.
for (const type of plugins.input.list()) if (type.startsWith('@else/')) plugins.input.remove(type);

const bibtex = plugins.config.get('@bibtex');
// Else it drops whatever has no TeX command; escaping is done before a text reaches it.
bibtex.format.asciiOnly = false;

/** A BibTeX entry with the raw text of its fields, TeX and all. */
export interface BibtexEntry {
  readonly type: string;
  readonly label: string;
  readonly properties: Readonly<Record<string, string>>;
}

/** A RIS record by tag; tags that repeat hold a list. */
export type RisRecord = Readonly<Record<string, string | readonly string[]>>;

const { constants } = bibtex;
/** The names of the TeX commands that the library turns into text. */
export const KNOWN_COMMANDS: ReadonlySet<string> = new Set(
  [
    constants.commands,
    constants.mathCommands,
    constants.diacritics,
    constants.formattingCommands,
    constants.formattingEnvs,
    constants.argumentCommands,
    constants.mathScriptFormatting,
  ].flatMap((table) => Object.keys(table)),
);

/** Decodes TeX and maps the fields. Throws what the library throws on text that it cannot read. */
export function cslFromBibtex(entry: BibtexEntry): unknown {
  return only(plugins.input.data([entry], '@bibtex/entries+list'));
}

export function cslFromRis(record: RisRecord): unknown {
  return plugins.input.data(record, '@ris/record');
}

/** Fields by BibTeX name, ready to be put between braces. */
export function bibtexFromCsl(item: object): BibtexEntry {
  return only(plugins.output.format('bibtex', [item], { format: 'object' })) as BibtexEntry;
}

export function risFromCsl(item: object): RisRecord {
  return only(plugins.output.format('ris', [item], { format: 'object' })) as RisRecord;
}

function only(list: unknown): unknown {
  if (!Array.isArray(list) || list.length !== 1) throw new Error('The citation library gave no single item.');
  return list[0] as unknown;
}
