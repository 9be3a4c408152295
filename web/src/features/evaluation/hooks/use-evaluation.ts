import type { DeviationRequest } from '@merestone/engine';
import { useCallback, useMemo, useState } from 'react';
import { buildForm } from '../model/build-form';
import { buildRequest } from '../model/build-request';
import { dutyKey } from '../model/stored-duty';
import type { EvaluatedSheet } from '../model/evaluated-sheet';
import { fieldErrors, type FieldError } from '../model/field-error';
import { filledValues, withUsed, type FilledValue } from '../model/filled-values';
import { askedOf } from '../model/keeping';
import { previewOf, type Preview } from '../model/preview';
import { readingsOf } from '../model/readings';
import { numbersOf, shownOutcome } from '../model/shown-outcome';
import { useCompiledSheet } from './use-compiled-sheet';
import { useDuty } from './use-duty';
import { useKeeping } from './use-keeping';
import { useSettled } from '../../../shared/hooks/use-settled';

const SETTLE_MS = 150;

/** One person's evaluation of one sheet: the duty typed, the live preview, and what the server has kept. */
export function useEvaluation(sheet: EvaluatedSheet, personId: string) {
  const [duty, change] = useDuty(dutyKey(personId, sheet.slug));
  const engine = useCompiledSheet(sheet);
  const { keeping, keep, forget } = useKeeping(sheet.slug, sheet.revision);
  const { mode, equations, rows } = duty;
  const sections = useMemo(() => buildForm(sheet, { mode, equations, rows }), [sheet, mode, equations, rows]);
  const form = useMemo(() => ({ sections, built: buildRequest(sections, duty) }), [sections, duty]);
  const settled = useSettled(form, SETTLE_MS);
  const preview = useMemo(
    (): Preview => (engine.ok ? previewOf(engine, settled.built, settled.sections) : { state: 'empty' }),
    [engine, settled],
  );
  const computed = useMemo(
    (): ReadonlyMap<string, FilledValue> =>
      engine.ok ? filledValues(engine.library, settled.built, settled.sections) : new Map(),
    [engine, settled],
  );
  const [summary, setSummary] = useState<FieldError[]>([]);

  const asked = askedOf(form.built.request);
  const shown = useMemo(() => shownOutcome(preview, keeping, asked), [preview, keeping, asked]);
  const filled = useMemo(() => withUsed(computed, numbersOf(shown)), [computed, shown]);
  const readings = useMemo(
    () => readingsOf(shown, settled.built.request.inputs, filled, sheet),
    [shown, settled, filled, sheet],
  );
  const errors = useMemo((): FieldError[] => {
    const ofServer =
      keeping.state === 'failed' && keeping.asked === asked
        ? fieldErrors(keeping.problem.fields, form.sections)
        : [];
    const ofPreview = preview.state === 'wrong' && form.built.errors.length === 0 ? preview.errors : [];
    if (summary.length === 0) return [...ofPreview, ...ofServer];
    const missing = preview.state === 'incomplete' ? preview.missing : [];
    return [...form.built.errors, ...ofPreview, ...missing, ...ofServer];
  }, [asked, form, keeping, preview, summary]);

  const evaluateAndKeep = useCallback(
    (deviations: DeviationRequest[] = []) => {
      const found = engine.ok ? obstacles(previewOf(engine, form.built, form.sections)) : form.built.errors;
      setSummary(found);
      if (found.length === 0) void keep(form.built.request, deviations);
    },
    [engine, form, keep],
  );
  const startAnew = useCallback(() => {
    change({ do: 'start-anew' });
    setSummary([]);
    forget();
  }, [change, forget]);

  return {
    sheet,
    duty,
    change,
    sections,
    started: form.built.started,
    definitionProblems: engine.ok ? [] : engine.problems,
    preview,
    filled,
    keeping,
    /** Why the server did not compute the duty as it stands, other than a bound. */
    failure: keeping.state === 'failed' && keeping.asked === asked ? keeping.problem : null,
    shown,
    readings,
    errors,
    /** What kept the last press of the button from going through; empty once it is all put right. */
    summary: errors.length > 0 || preview.state === 'empty' ? summary : [],
    evaluateAndKeep,
    startAnew,
  };
}
export type EvaluationState = ReturnType<typeof useEvaluation>;

function obstacles(preview: Preview): FieldError[] {
  if (preview.state === 'wrong') return preview.errors;
  if (preview.state === 'incomplete') return preview.missing;
  return preview.state === 'empty' ? [{ field: '', message: 'Nothing has been filled in yet.' }] : [];
}
