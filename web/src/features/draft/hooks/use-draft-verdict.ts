import { useMemo } from 'react';
import { useSettled } from '../../../shared/hooks/use-settled';
import { usePropertyLibrary } from '../api/use-property-library';
import type { DraftForm } from '../model/draft-form';
import { symbolsOfDraft, type DraftSymbol } from '../model/draft-symbols';
import { verdictOn, type DraftVerdict } from '../model/draft-verdict';
import { sketchOfDraft } from '../model/sketch-of-draft';
import type { LineSketch, PropertyLibrary } from '@merestone/engine';

const SETTLE_MS = 350;

/** What follows from the form once typing has settled. */
export interface LiveDraft {
  /** The form that all of this is about. */
  form: DraftForm;
  verdict: DraftVerdict;
  sketch: ReadonlyMap<string, LineSketch>;
  symbols: DraftSymbol[];
  library: PropertyLibrary;
}

export function useDraftVerdict(form: DraftForm): LiveDraft {
  const settled = useSettled(form, SETTLE_MS);
  const named = useMemo(() => equationsNamed(settled), [settled]);
  const { library } = usePropertyLibrary(named);
  return useMemo(
    () => ({
      form: settled,
      verdict: verdictOn(settled, library),
      sketch: sketchOfDraft(settled),
      symbols: symbolsOfDraft(settled),
      library,
    }),
    [settled, library],
  );
}

function equationsNamed({ quantities, checks }: DraftForm): string[] {
  return [
    ...quantities.flatMap(({ equations }) => equations),
    ...checks.flatMap(({ equations }) => equations.map(({ slug }) => slug.trim())),
  ].filter(Boolean);
}
