import type { CorrelationDefinition } from '@merestone/engine';
import { useCallback, useMemo, useState } from 'react';
import { asApiProblem, type ApiProblem } from '../../../shared/api/api-problem';
import type { Sheet } from '../../../shared/api/types';
import { enterSheet, openRevision, submitRevision } from '../api/draft-sheets';
import { useChoices } from '../api/use-choices';
import { verdictOn } from '../model/draft-verdict';
import { formOfDefinition } from '../model/form-of-definition';
import type { FormProblem } from '../model/form-reading';
import type { Opening } from '../model/opening';
import { saveStateOf } from '../model/save-words';
import { draftKey, dropStoredDraft, readStoredDraft, storeDraft } from '../model/stored-draft';
import { slugProblem } from '../model/suggest-slug';
import { useAutosave } from './use-autosave';
import { useDraftForm, useKeptDraft } from './use-draft-form';
import { useDraftVerdict } from './use-draft-verdict';

export type Act = 'enter' | 'submit';

/** An act that did not go through, with what was in its way at that moment. */
export interface Stopped {
  act: Act;
  problems: FormProblem[];
}

/** One person's work on one draft: the form, what follows from it, where it is kept, and the acts on it. */
export function useDraft(opening: Opening, personId: string) {
  const { form, removed, change } = useDraftForm(opening.form);
  const live = useDraftVerdict(form);
  const choices = useChoices();
  const settled = useMemo(() => ({ form: live.form, definition: live.verdict.definition }), [live]);
  const autosave = useAutosave({ slug: form.slug, opening, form, settled });
  const { base, unsaved, take, goOnFrom } = autosave;
  const { kept, letGo } = useKeptDraft({
    personId,
    storeAs: opening.storeAs,
    draft: { form, base, unsaved },
    touched: form !== opening.form || base?.hash !== opening.base?.hash,
  });
  const [stopped, setStopped] = useState<Stopped | null>(null);
  const [acting, setActing] = useState(false);
  const [refusal, setRefusal] = useState<ApiProblem | null>(null);
  const aside = useSetAside(personId, opening.storeAs);

  const slugFault = opening.kind === 'new' ? slugProblem(form.slug) : null;
  const ofSlug = useMemo(
    () => (slugFault === null ? [] : [{ field: 'slug', code: 'empty', message: slugFault }]),
    [slugFault],
  );
  const problems = useMemo((): FormProblem[] => {
    const { wrong, empty } = live.verdict;
    const ofServer = refusal === null ? [] : problemsOf(refusal);
    return [...wrong, ...ofServer, ...(stopped === null ? [] : [...ofSlug, ...empty])];
  }, [live, ofSlug, refusal, stopped]);

  /** The sheet as it is typed at this moment; null where it is not whole, which is then told. */
  const wholeFor = useCallback(
    (act: Act): CorrelationDefinition | null => {
      const { definition, wrong, empty } = verdictOn(form, live.library);
      const inTheWay = [...ofSlug, ...wrong, ...empty];
      setStopped(inTheWay.length > 0 ? { act, problems: inTheWay } : null);
      return inTheWay.length > 0 ? null : definition;
    },
    [form, live.library, ofSlug],
  );

  const act = useCallback(async (which: Act, call: () => Promise<Sheet>): Promise<Sheet | null> => {
    setRefusal(null);
    setActing(true);
    try {
      return await call();
    } catch (thrown) {
      const problem = asApiProblem(thrown);
      setRefusal(problem);
      if (problem.fields.length > 0) setStopped({ act: which, problems: problemsOf(problem) });
      return null;
    } finally {
      setActing(false);
    }
  }, []);

  /** Puts the draft into the register for the first time; null where it cannot be or was refused. */
  const enter = useCallback(async (): Promise<Sheet | null> => {
    const definition = wholeFor('enter');
    if (definition === null) return null;
    const isNew = opening.kind === 'new';
    const sheet = await act('enter', () =>
      isNew ? enterSheet(form.slug, definition) : openRevision(form.slug, definition),
    );
    if (sheet === null) return null;
    if (isNew) letGo();
    else take(sheet, form);
    return sheet;
  }, [act, form, letGo, opening, take, wholeFor]);

  /** Saves what is not saved yet, then hands the revision to its reviewers. */
  const submit = useCallback(
    async (reviewers: string[]): Promise<Sheet | null> => {
      const definition = wholeFor('submit');
      if (definition === null || base === null) return null;
      const saved = unsaved ? await autosave.save(form, definition) : base;
      if (saved === null) return null;
      const sheet = await act('submit', () => submitRevision(form.slug, saved.revision, reviewers));
      if (sheet !== null) letGo();
      return sheet;
    },
    [act, autosave, base, form, letGo, unsaved, wholeFor],
  );

  const takeTheirs = useCallback(
    (theirs: Sheet) => {
      aside.put(form);
      const next = formOfDefinition(theirs.definition, theirs.slug);
      change({ do: 'replace', form: next });
      goOnFrom(theirs, next);
    },
    [aside, change, form, goOnFrom],
  );

  const saveState = saveStateOf({
    entered: base !== null,
    toOpen: opening.kind === 'revision' ? opening.nextRevision : null,
    unsaved,
    kept,
    conflict: autosave.theirs !== null,
    saving: autosave.saving || acting,
    savedAt: autosave.savedAt,
    held: autosave.held,
    whole: live.verdict.definition !== null && live.form === form,
    empty: live.verdict.empty,
    wrong: live.verdict.wrong,
    failure: autosave.failure,
  });

  return {
    opening,
    form,
    removed,
    change,
    live,
    choices,
    problems,
    autosave,
    saveState,
    /** What kept the last act from going through, until all of it is put right. */
    stopped: stopped !== null && problems.length > 0 ? stopped : null,
    acting,
    refusal,
    enter,
    submit,
    takeTheirs,
    keepMine: useCallback((theirs: Sheet) => goOnFrom(theirs, null), [goOnFrom]),
    aside,
  };
}
export type Draft = ReturnType<typeof useDraft>;

/** The server's faults at their places in the definition. */
function problemsOf({ fields }: ApiProblem): FormProblem[] {
  return fields.map(({ field, code, message }) => ({
    field: field.replace(/^definition\./, ''),
    code,
    message,
  }));
}

/** A version of the draft that gave way to somebody else's, kept until it is brought back or dropped. */
function useSetAside(personId: string, storeAs: string) {
  const key = draftKey(personId, `${storeAs}:set-aside`);
  const [version, setVersion] = useState(() => readStoredDraft(window.localStorage, key));
  return useMemo(
    () => ({
      version,
      put: (form: Opening['form']) => {
        const draft = { form, base: null, unsaved: true, at: new Date().toISOString() };
        storeDraft(window.localStorage, key, draft);
        setVersion(draft);
      },
      drop: () => {
        dropStoredDraft(window.localStorage, key);
        setVersion(null);
      },
    }),
    [key, version],
  );
}
