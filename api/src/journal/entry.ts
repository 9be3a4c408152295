import { createRequire } from 'node:module';
import type { Actor } from '../common/actor.js';
import type { Act } from './acts.js';

// Required, since the package's declaration promises a default export and its code is the function itself.
const canonicalize = createRequire(import.meta.url)('canonicalize') as (value: unknown) => string | undefined;

export type JsonValue = string | number | boolean | null | readonly JsonValue[] | JsonObject;
export interface JsonObject {
  readonly [key: string]: JsonValue | undefined;
}

/** Version of the entry's form. The form cannot be migrated, so a reader must know which one it reads. */
export const ENTRY_FORMAT = 1;

export interface JournalEntry {
  readonly format: typeof ENTRY_FORMAT;
  /** Place in the journal, from 0. */
  readonly index: number;
  /** ISO 8601, UTC. */
  readonly at: string;
  readonly actor: { readonly id: string; readonly name: string };
  readonly act: Act;
  /** Path of what was acted on, as in the API, such as `correlations/some-slug/revisions/2`. */
  readonly subject: string;
  readonly detail: JsonObject;
}

export function journalEntry(
  index: number,
  at: string,
  actor: Actor,
  act: Act,
  subject: string,
  detail: JsonObject,
): JournalEntry {
  return { format: ENTRY_FORMAT, index, at, actor: { id: actor.id, name: actor.name }, act, subject, detail };
}

/** The RFC 8785 text of a JSON value. Throws where there is none, such as for NaN. */
export function canonicalText(value: unknown): string {
  const text = canonicalize(value);
  if (text === undefined) throw new TypeError('The value has no canonical JSON text.');
  return text;
}
