import { Button } from 'antd';
import { useState } from 'react';
import type { EvaluationState } from '../hooks/use-evaluation';
import { refusingFindings } from '../model/refusing-findings';
import type { Shown } from '../model/shown-outcome';
import { Alternatives } from './alternatives';
import { DeviationForm } from './deviation-form';
import { FindingText } from './finding-text';

interface RefusalBoxProps {
  refusal: Extract<Shown, { kind: 'refusal' }>;
  evaluation: EvaluationState;
  notInUse: string | null;
}

/** The refusal: which bound, how far past it, and the two ways on that are open. */
export function RefusalBox({ refusal, evaluation, notInUse }: RefusalBoxProps) {
  const [deviating, setDeviating] = useState(false);
  const refusing = refusingFindings(refusal.findings);
  const deviable = refusing.length > 0 && refusing.every((finding) => finding.deviable);
  const sending = evaluation.keeping.state === 'sending';
  return (
    <div className="refusal">
      <h3>No number is given here.</h3>
      {refusing.length === 0 ? <p>{refusal.message}</p> : null}
      {refusing.map((finding) => (
        <FindingText key={finding.symbol} finding={finding} />
      ))}
      {refusing.length > 1 && !deviable && refusing.some((finding) => finding.deviable) ? (
        <p>A deviation would have to cover every bound, and one of them admits none.</p>
      ) : null}
      <div className="refusal-acts">
        {refusal.alternatives === null ? (
          <Button
            type="primary"
            loading={sending}
            disabled={notInUse !== null}
            onClick={() => evaluation.evaluateAndKeep()}
          >
            See what covers this duty
          </Button>
        ) : null}
        {deviable && !deviating ? (
          <Button disabled={notInUse !== null} onClick={() => setDeviating(true)}>
            Record a deviation
          </Button>
        ) : null}
      </div>
      {refusal.alternatives === null ? null : (
        <Alternatives items={refusal.alternatives} geometry={evaluation.sheet.definition.geometry} />
      )}
      {deviable && deviating ? (
        <DeviationForm refusing={refusing} evaluation={evaluation} onLeave={() => setDeviating(false)} />
      ) : null}
    </div>
  );
}
