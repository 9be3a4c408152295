import type { CorrelationDefinition } from '@merestone/engine';
import { useCallback, useEffect, useRef, useState } from 'react';
import { asApiProblem, type ApiProblem } from '../../../shared/api/api-problem';
import type { Sheet, Standing } from '../../../shared/api/types';
import { fetchRevision, putContent } from '../api/draft-sheets';
import type { DraftForm } from '../model/draft-form';
import type { Opening } from '../model/opening';
import { mayPass } from '../model/save-words';
import type { DraftBase } from '../model/stored-draft';

const SAVE_MS = 1500;
const AGAIN_MS = 15_000;

interface Autosaving {
  slug: string;
  opening: Opening;
  /** The form as it is typed. */
  form: DraftForm;
  /** The last settled form, and the sheet that it comes to; null while it is not whole. */
  settled: { form: DraftForm; definition: CorrelationDefinition | null };
}

/**
 * Saves the draft to the register a moment after each change, naming the content it was made on. Where somebody else
 * has changed it in the meantime nothing is written before the person has chosen.
 */
export function useAutosave({ slug, opening, form, settled }: Autosaving) {
  const [base, setBase] = useState<DraftBase | null>(opening.base);
  const [standing, setStanding] = useState<Standing | null>(opening.standing);
  const [savedForm, setSavedForm] = useState<DraftForm | null>(opening.saved ? opening.form : null);
  const [savedAt, setSavedAt] = useState<string | null>(null);
  const [theirs, setTheirs] = useState<Sheet | null>(opening.theirs);
  const [failure, setFailure] = useState<{ form: DraftForm; problem: ApiProblem } | null>(null);
  const [released, setReleased] = useState(false);
  const [saving, setSaving] = useState(false);
  const busy = useRef(false);
  const unsaved = form !== savedForm;
  /** A revision in review is changed only once that was said: it costs the verdicts given so far. */
  const held = standing === 'in review' && !released;

  const take = useCallback((sheet: Sheet, of: DraftForm) => {
    setBase({ revision: sheet.revision, hash: sheet.hash });
    setStanding(sheet.standing);
    setSavedForm(of);
    setSavedAt(new Date().toISOString());
    setFailure(null);
  }, []);

  const save = useCallback(
    async (of: DraftForm, definition: CorrelationDefinition): Promise<DraftBase | null> => {
      if (base === null || busy.current) return null;
      busy.current = true;
      setSaving(true);
      try {
        const sheet = await putContent(slug, base.revision, base.hash, definition);
        take(sheet, of);
        return { revision: sheet.revision, hash: sheet.hash };
      } catch (thrown) {
        const problem = asApiProblem(thrown);
        const now = isStale(problem) ? await fetchRevision(slug, base.revision).catch(() => null) : null;
        if (now) setTheirs(now);
        else setFailure({ form: of, problem });
        return null;
      } finally {
        busy.current = false;
        setSaving(false);
      }
    },
    [base, slug, take],
  );

  const failed = failure !== null && failure.form === settled.form ? failure.problem : null;
  const due =
    base !== null &&
    theirs === null &&
    !held &&
    !saving &&
    settled.definition !== null &&
    settled.form === form &&
    settled.form !== savedForm &&
    (failed === null || mayPass(failed));

  useEffect(() => {
    const { form: of, definition } = settled;
    if (!due || definition === null) return;
    const timer = window.setTimeout(() => void save(of, definition), failed ? AGAIN_MS : SAVE_MS);
    return () => window.clearTimeout(timer);
  }, [due, failed, save, settled]);

  /** The next save goes on from what the register has now. */
  const goOnFrom = useCallback((sheet: Sheet, of: DraftForm | null) => {
    setBase({ revision: sheet.revision, hash: sheet.hash });
    setStanding(sheet.standing);
    setSavedForm(of);
    setTheirs(null);
    setFailure(null);
  }, []);

  return {
    base,
    standing,
    unsaved,
    saving,
    savedAt,
    theirs,
    failure: failed,
    held,
    release: useCallback(() => setReleased(true), []),
    take,
    save,
    goOnFrom,
  };
}
export type Autosave = ReturnType<typeof useAutosave>;

function isStale({ status, code }: ApiProblem): boolean {
  return status === 412 || code === 'stale';
}
