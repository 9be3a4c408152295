import type { Step } from '@merestone/engine';
import { memo } from 'react';
import { Equation } from '../../../shared/ui/equation';
import { Figure } from '../../../shared/ui/figure';
import { MarginNote } from '../../../shared/ui/margin-note';
import { MarginRow } from '../../../shared/ui/sheet-page';
import { Mark } from './mark';

interface StepsListProps {
  steps: readonly Step[];
  firstNumber: number;
  mark: string | null;
}

const WORDS: Readonly<Record<Step['kind'], string>> = {
  quantity: 'Given',
  property: 'Filled in',
  group: 'Group',
  intermediate: 'Step',
  result: 'Result',
  coefficient: 'Coefficient',
  conversion: 'Other basis',
  flux: 'Flux',
};
/** Lines whose number came from outside a bound under a deviation. */
const CARRIES_MARK = new Set<Step['kind']>(['result', 'coefficient', 'conversion', 'flux', 'intermediate']);

/** The whole calculation in numbered lines, each in symbols and with the values put in. */
export const StepsList = memo(function StepsList({ steps, firstNumber, mark }: StepsListProps) {
  return (
    <section aria-labelledby="written-out">
      <h2 id="written-out">Written out</h2>
      {mark ? (
        <p>
          Every number below that rests on the deviation is <Mark words={mark} />.
        </p>
      ) : null}
      <ol className="steps" aria-label="Steps">
        {steps.map((step, i) => (
          <li key={`${step.kind} ${step.symbol}`}>
            <MarginRow notes={<StepNote step={step} mark={mark} />}>
              <Equation tex={step.tex} number={firstNumber + i} />
              {step.texWithNumbers && step.texWithNumbers !== step.tex ? (
                <Equation tex={step.texWithNumbers} />
              ) : null}
            </MarginRow>
          </li>
        ))}
      </ol>
    </section>
  );
});

function StepNote({ step, mark }: { step: Step; mark: string | null }) {
  return (
    <MarginNote title={WORDS[step.kind]}>
      <p>
        {step.note ? `${step.note.replace(/\.$/, '')}: ` : null}
        <Figure value={step.value} unit={step.unit} />{' '}
        {CARRIES_MARK.has(step.kind) ? <Mark words={mark} /> : null}
      </p>
    </MarginNote>
  );
}
