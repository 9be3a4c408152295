import type { ApiProblem } from '../../../shared/api/api-problem';
import { lowerFirst } from '../../../shared/format/lower-first';
import type { FormProblem } from './form-reading';

/** Where the draft is kept at this moment. */
export type SaveState =
  | { kind: 'saved'; at: string | null }
  | { kind: 'saving' }
  /** In this browser; the register gets it in a moment. */
  | { kind: 'pending' }
  /** In this browser only, and why. */
  | { kind: 'local'; reason: string }
  /** Nowhere but on the page. */
  | { kind: 'unkept' }
  | { kind: 'conflict' };

export interface SaveFacts {
  /** Whether the register has a draft that this one continues. */
  entered: boolean;
  /** The revision that is still to be opened; null for a new sheet. */
  toOpen: number | null;
  /** Whether the register has everything that is in the form. */
  unsaved: boolean;
  /** Whether this browser keeps it. */
  kept: boolean;
  conflict: boolean;
  saving: boolean;
  /** When the register took it last, ISO. */
  savedAt: string | null;
  /** Of a revision in review: whether it was said that it is to be changed. */
  held: boolean;
  /** Whether the sheet is whole; and if not, what is in the way. */
  whole: boolean;
  empty: readonly FormProblem[];
  wrong: readonly FormProblem[];
  /** What the server said instead of taking it. */
  failure: Pick<ApiProblem, 'status' | 'title' | 'detail'> | null;
}

/** Tells one state from all the facts. */
export function saveStateOf(facts: SaveFacts): SaveState {
  if (facts.conflict) return { kind: 'conflict' };
  if (facts.saving) return { kind: 'saving' };
  if (!facts.unsaved) return { kind: 'saved', at: facts.savedAt };
  if (!facts.kept) return { kind: 'unkept' };
  const reason = reasonOf(facts);
  return reason === null ? { kind: 'pending' } : { kind: 'local', reason };
}

function reasonOf(facts: SaveFacts): string | null {
  if (facts.failure !== null) return failureWords(facts.failure);
  if (facts.wrong.length > 0)
    return `${count(facts.wrong.length, 'place')} to be put right before the register can take it`;
  if (facts.empty.length > 0) return `${count(facts.empty.length, 'place')} still to be filled in`;
  if (!facts.whole) return 'it is being checked';
  if (!facts.entered)
    return facts.toOpen === null
      ? 'it is not entered in the register yet'
      : `revision ${facts.toOpen} is not opened yet`;
  if (facts.held) return 'the revision is in review';
  return null;
}

function failureWords({ status, title, detail }: NonNullable<SaveFacts['failure']>): string {
  const words = lowerFirst((mayPass({ status }) ? title : detail || title).replace(/\.$/, ''));
  return mayPass({ status }) ? `${words}; it is asked again` : words;
}

/** The state in words. */
export function saveWords(state: SaveState): string {
  switch (state.kind) {
    case 'saved':
      return state.at === null ? 'As it is in the register' : `Saved ${timeOfDay(state.at)}`;
    case 'saving':
      return 'Saving …';
    case 'pending':
      return 'Kept in this browser; saved to the register in a moment';
    case 'local':
      return `Kept in this browser only: ${state.reason}`;
    case 'unkept':
      return 'Not kept: this browser has no room for it. Copy what matters before you leave the page';
    case 'conflict':
      return 'Kept in this browser only: somebody else has changed the draft';
  }
}

const TIME = new Intl.DateTimeFormat('en-GB', { hour: '2-digit', minute: '2-digit' });

function timeOfDay(iso: string): string {
  return TIME.format(new Date(iso));
}

function count(number: number, noun: string): string {
  return `${number} ${noun}${number === 1 ? '' : 's'}`;
}

/** A lost connection or a failing server is worth another try; a refusal is not. */
export function mayPass({ status }: Pick<ApiProblem, 'status'>): boolean {
  return status === 0 || status >= 500;
}
