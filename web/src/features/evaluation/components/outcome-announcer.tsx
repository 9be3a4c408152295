import { symbolText } from '../../../shared/format/symbol-parts';
import { formatNumber } from '../../../shared/format/format-number';
import { formatUnit } from '../../../shared/format/format-unit';
import { useSettled } from '../../../shared/hooks/use-settled';
import type { Shown } from '../model/shown-outcome';

const QUIET_MS = 900;

/** Tells a screen reader what came out, once typing has paused. */
export function OutcomeAnnouncer({ shown }: { shown: Shown }) {
  const words = useSettled(wordsFor(shown), QUIET_MS);
  return (
    <p role="status" className="heard-only">
      {words}
    </p>
  );
}

function wordsFor(shown: Shown): string {
  if (shown.kind === 'nothing') return '';
  if (shown.kind === 'refusal') return `No number is given here. ${shown.message}`;
  const { outcome } = shown;
  const { symbol, value, unit } = outcome.coefficient ?? outcome.result;
  const mark = outcome.outcome === 'deviating' ? `, ${outcome.mark}` : '';
  const state = shown.kind === 'kept' ? 'Kept' : 'Preview';
  return `${state}: ${symbolText(symbol)} = ${formatNumber(value)} ${formatUnit(unit)}${mark}.`;
}
