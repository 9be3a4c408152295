import type { CorrelationDefinition, Step } from '@merestone/engine';
import { memo } from 'react';
import { nameOfResult } from '../../../shared/format/part-words';
import { Equation } from '../../../shared/ui/equation';
import { Figure } from '../../../shared/ui/figure';
import { MarginNote } from '../../../shared/ui/margin-note';
import { MarginRow } from '../../../shared/ui/sheet-page';
import { Mark } from './mark';

interface StepsListProps {
  steps: readonly Step[];
  firstNumber: number;
  mark: string | null;
  definition: CorrelationDefinition;
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
export const StepsList = memo(function StepsList({ steps, firstNumber, mark, definition }: StepsListProps) {
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
            <MarginRow notes={<StepNote step={step} mark={mark} name={nameOf(step, definition)} />}>
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

/** What the line's number is: a result by its kind, all else as the engine names it. */
function nameOf({ kind, symbol, note }: Step, definition: CorrelationDefinition): string | undefined {
  const part =
    kind === 'result' ? definition.parts.find(({ result }) => result.symbol === symbol) : undefined;
  return part ? nameOfResult(definition, part.key) : note;
}

function StepNote({ step, mark, name }: { step: Step; mark: string | null; name: string | undefined }) {
  return (
    <MarginNote title={WORDS[step.kind]}>
      <p>
        {name ? `${name.replace(/\.$/, '')}: ` : null}
        <Figure value={step.value} unit={step.unit} />{' '}
        {CARRIES_MARK.has(step.kind) ? <Mark words={mark} /> : null}
      </p>
    </MarginNote>
  );
}
