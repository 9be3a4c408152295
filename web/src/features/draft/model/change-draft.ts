import type { AccuracyForm, DraftForm, DraftHead, DraftLists, ListName, Row } from './draft-form';
import { suggestSlug } from './suggest-slug';

/** One change of a list, the row it is about by its place. */
export type ListChange = {
  [L in ListName]:
    | { do: 'edit-row'; list: L; at: number; patch: Partial<DraftLists[L][number]> }
    | { do: 'add-row'; list: L; at?: number; row: DraftLists[L][number] };
}[ListName];

export type DraftChange =
  | ListChange
  | { do: 'remove-row'; list: ListName; at: number }
  | { do: 'move-row'; list: ListName; at: number; by: -1 | 1 }
  | { do: 'put-back' }
  | { do: 'edit-head'; patch: Partial<DraftHead> }
  | { do: 'name-slug'; slug: string }
  | { do: 'edit-accuracy'; patch: Partial<AccuracyForm> }
  | { do: 'edit-verification'; patch: Partial<DraftForm['verification']> }
  | { do: 'replace'; form: DraftForm };

/** The form, and the row that was removed last, so that it can be put back. */
export interface DraftState {
  form: DraftForm;
  removed: { list: ListName; at: number; row: Row } | null;
}

/** The draft after one act of the person at the form. */
export function changeDraft(state: DraftState, change: DraftChange): DraftState {
  const { form } = state;
  const withForm = (changed: Partial<DraftForm>): DraftState => ({ ...state, form: { ...form, ...changed } });
  switch (change.do) {
    case 'edit-row':
      return withList(state, change.list, (rows) =>
        rows.map((row, i) => (i === change.at ? { ...row, ...change.patch } : row)),
      );
    case 'add-row':
      return withList(state, change.list, (rows) => inserted(rows, change.at ?? rows.length, change.row));
    case 'remove-row': {
      const row = form[change.list][change.at];
      if (row === undefined) return state;
      const kept = withList(state, change.list, (rows) => rows.filter((_, i) => i !== change.at));
      return { ...kept, removed: { list: change.list, at: change.at, row } };
    }
    case 'move-row':
      return withList(state, change.list, (rows) => moved(rows, change.at, change.at + change.by));
    case 'put-back': {
      if (state.removed === null) return state;
      const { list, at, row } = state.removed;
      return { ...withList(state, list, (rows) => inserted(rows, at, row)), removed: null };
    }
    case 'edit-head': {
      const head = { ...form.head, ...change.patch };
      return withForm({ head, ...(form.slugTyped ? {} : { slug: suggestSlug(head) }) });
    }
    case 'name-slug':
      return withForm({ slug: change.slug, slugTyped: true });
    case 'edit-accuracy':
      return withForm({ accuracy: { ...form.accuracy, ...change.patch } });
    case 'edit-verification':
      return withForm({ verification: { ...form.verification, ...change.patch } });
    case 'replace':
      return { form: change.form, removed: null };
  }
}

/** Rows of one list never end up in another: the list's name and its rows come from one change. */
function withList(state: DraftState, list: ListName, change: (rows: Row[]) => Row[]): DraftState {
  return { ...state, form: { ...state.form, [list]: change(state.form[list]) } };
}

function inserted(rows: Row[], at: number, row: Row): Row[] {
  return [...rows.slice(0, at), row, ...rows.slice(at)];
}

function moved(rows: Row[], from: number, to: number): Row[] {
  const row = rows[from];
  if (row === undefined || to < 0 || to >= rows.length) return rows;
  const others = rows.filter((_, i) => i !== from);
  return inserted(others, to, row);
}
