import type { DraftForm } from './draft-form';
import { formFromStore } from './form-from-store';

/** The revision in the register that a draft belongs to, and the content it was last known to have. */
export interface DraftBase {
  revision: number;
  hash: string;
}

/** A draft as this browser keeps it. */
export interface StoredDraft {
  form: DraftForm;
  /** The register's draft that it continues; null while it is in this browser only. */
  base: DraftBase | null;
  /** Whether the form holds anything that the register does not. */
  unsaved: boolean;
  /** ISO time of the last change. */
  at: string;
}

const VERSION = 1;
const MOST_CHARACTERS = 2_000_000;

/** Where a person's draft is kept in this browser: a new sheet, one after a pattern, or a revision of a sheet. */
export function draftKey(personId: string, what: string): string {
  return `merestone:draft:${VERSION}:${personId}:${what}`;
}

/** The draft kept under a key; null where there is none that can be read. */
export function readStoredDraft(store: Storage, key: string): StoredDraft | null {
  try {
    const text = store.getItem(key);
    if (text === null || text.length > MOST_CHARACTERS) return null;
    const value: unknown = JSON.parse(text);
    if (!isRecord(value) || !isRecord(value.form)) return null;
    return {
      form: formFromStore(value.form),
      base: baseFrom(value.base),
      unsaved: value.unsaved !== false,
      at: typeof value.at === 'string' ? value.at : '',
    };
  } catch {
    return null;
  }
}

/** Keeps the draft; false where this browser has no room for it or does not allow it. */
export function storeDraft(store: Storage, key: string, draft: StoredDraft): boolean {
  try {
    store.setItem(key, JSON.stringify(draft));
    return true;
  } catch {
    return false;
  }
}

export function dropStoredDraft(store: Storage, key: string): void {
  try {
    store.removeItem(key);
  } catch {
    return;
  }
}

function baseFrom(value: unknown): DraftBase | null {
  if (!isRecord(value)) return null;
  const { revision, hash } = value;
  return typeof revision === 'number' && typeof hash === 'string' ? { revision, hash } : null;
}

function isRecord(value: unknown): value is Record<string, unknown> {
  return typeof value === 'object' && value !== null && !Array.isArray(value);
}
