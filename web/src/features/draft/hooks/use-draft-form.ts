import { useCallback, useEffect, useReducer, useRef, useState } from 'react';
import { changeDraft } from '../model/change-draft';
import type { DraftForm } from '../model/draft-form';
import { draftKey, dropStoredDraft, storeDraft, type StoredDraft } from '../model/stored-draft';

const KEEP_MS = 250;

/** The form and its changes. */
export function useDraftForm(form: DraftForm) {
  const [state, change] = useReducer(changeDraft, { form, removed: null });
  return { ...state, change };
}

interface Keeping {
  personId: string;
  storeAs: string;
  draft: Omit<StoredDraft, 'at'>;
  /** Nothing is kept of a form that nobody has touched. */
  touched: boolean;
}

/** Keeps the draft in this browser shortly after each change, and at once when the page is left or hidden. */
export function useKeptDraft({ personId, storeAs, draft, touched }: Keeping) {
  const [kept, setKept] = useState(true);
  const { form, base, unsaved } = draft;
  const pending = useRef<() => void>(undefined);
  const gone = useRef(false);

  useEffect(() => {
    if (!touched) return;
    const run = () => {
      pending.current = undefined;
      if (gone.current) return;
      const at = new Date().toISOString();
      setKept(storeDraft(window.localStorage, draftKey(personId, storeAs), { form, base, unsaved, at }));
    };
    pending.current = run;
    const timer = window.setTimeout(run, KEEP_MS);
    return () => window.clearTimeout(timer);
  }, [personId, storeAs, form, base, unsaved, touched]);

  useEffect(() => {
    const now = () => pending.current?.();
    window.addEventListener('pagehide', now);
    document.addEventListener('visibilitychange', now);
    return () => {
      window.removeEventListener('pagehide', now);
      document.removeEventListener('visibilitychange', now);
      now();
    };
  }, []);

  /** Drops what is kept and keeps nothing more: the draft goes on under another name, or is out of hand. */
  const letGo = useCallback(() => {
    gone.current = true;
    dropStoredDraft(window.localStorage, draftKey(personId, storeAs));
  }, [personId, storeAs]);
  return { kept, letGo };
}
