import { ProblemNotice } from '../../../shared/ui/problem-notice';
import type { EvaluationState } from '../hooks/use-evaluation';
import { OutcomeAnnouncer } from './outcome-announcer';
import { RefusalBox } from './refusal-box';
import { ResultView } from './result-view';
import { WaitingForDuty } from './waiting-for-duty';
import './outcome-panel.css';

interface OutcomePanelProps {
  evaluation: EvaluationState;
  /** Number of the first written-out step, after the sheet's own equations. */
  firstNumber: number;
  notInUse: string | null;
}

/** What the duty comes to: a number with all its steps, a refusal, or what is still needed. */
export function OutcomePanel({ evaluation, firstNumber, notInUse }: OutcomePanelProps) {
  const { shown, failure } = evaluation;
  return (
    <section aria-label="Result" className="outcome">
      <OutcomeAnnouncer shown={shown} />
      {failure ? (
        <>
          <ProblemNotice problem={failure} />
          {failure.fields.map(({ field, message }) => (
            <p key={field + message}>{message}</p>
          ))}
        </>
      ) : null}
      {shown.kind === 'nothing' ? <WaitingForDuty evaluation={evaluation} /> : null}
      {shown.kind === 'refusal' ? (
        <RefusalBox refusal={shown} evaluation={evaluation} notInUse={notInUse} />
      ) : null}
      {shown.kind === 'preview' || shown.kind === 'kept' ? (
        <ResultView shown={shown} evaluation={evaluation} firstNumber={firstNumber} />
      ) : null}
    </section>
  );
}
