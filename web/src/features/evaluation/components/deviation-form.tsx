import type { Finding } from '@merestone/engine';
import { Button } from 'antd';
import { useState } from 'react';
import { ErrorSummary } from '../../../shared/ui/error-summary';
import { useFocusWhenLost } from '../../../shared/hooks/use-focus-when-lost';
import type { EvaluationState } from '../hooks/use-evaluation';
import { fieldId } from '../model/field-id';
import { findingLabel } from '../model/finding-label';
import { MIN_REASON, reasonError } from '../model/reason-error';
import { ReasonField } from './reason-field';

interface DeviationFormProps {
  refusing: readonly Finding[];
  evaluation: EvaluationState;
  onLeave: () => void;
}

/** One reason for each symbol outside its bound; what comes out is marked and on record. */
export function DeviationForm({ refusing, evaluation, onLeave }: DeviationFormProps) {
  const { duty, change, keeping, evaluateAndKeep } = evaluation;
  const [pressed, setPressed] = useState<{ fieldId: string; message: string }[]>([]);
  const box = useFocusWhenLost<HTMLDivElement>(true);
  const reasonOf = (symbol: string) => duty.reasons[symbol] ?? '';
  const allGood = refusing.every(({ symbol }) => reasonError(symbol, reasonOf(symbol)) === null);
  const record = () => {
    const wrong = refusing.flatMap(({ symbol }) => {
      const message = reasonError(symbol, reasonOf(symbol));
      return message ? [{ fieldId: fieldId(`reason-${symbol}`), message }] : [];
    });
    setPressed(wrong);
    if (wrong.length === 0)
      evaluateAndKeep(refusing.map(({ symbol }) => ({ symbol, reason: reasonOf(symbol).trim() })));
  };
  return (
    <div ref={box} tabIndex={-1} className="deviation" role="group" aria-label="Record a deviation">
      <p>
        A deviation uses the sheet outside a bound, for a reason that stands on record with your name. The
        number is marked <strong>provisional, not for design</strong> wherever it goes, until a technical
        authority accepts the deviation for this duty.
      </p>
      <ErrorSummary title="Each reason is needed" errors={allGood ? [] : pressed} />
      {refusing.map(({ symbol }) => (
        <ReasonField
          key={symbol}
          id={fieldId(`reason-${symbol}`)}
          label={`Why may ${findingLabel(symbol)} be outside its bound here?`}
          value={reasonOf(symbol)}
          error={pressed.length > 0 ? reasonError(symbol, reasonOf(symbol)) : null}
          onChange={(reason) => change({ do: 'give-reason', symbol, reason })}
        />
      ))}
      <div className="refusal-acts">
        <Button type="primary" loading={keeping.state === 'sending'} onClick={record}>
          Record deviation and evaluate
        </Button>
        <Button onClick={onLeave}>Leave it</Button>
        <span className="deviation-least">at least {MIN_REASON} characters each</span>
      </div>
    </div>
  );
}
