import { Button } from 'antd';
import { useMemo } from 'react';
import { ErrorSummary } from '../../../shared/ui/error-summary';
import type { EvaluationState } from '../hooks/use-evaluation';
import { hasContent } from '../hooks/use-duty';
import { summaryLine } from '../model/field-error';
import { fieldId } from '../model/field-id';
import type { DutyControls } from './duty-controls';
import { DutySection } from './duty-section';
import { EquationOffer } from './equation-offer';
import { ForceSection } from './force-section';
import { ModeSwitch } from './mode-switch';
import './duty-panel.css';

interface DutyPanelProps {
  evaluation: EvaluationState;
  /** Why the server would not keep an evaluation of this revision; null where it would. */
  notInUse: string | null;
}

/** The form for a duty, made from the sheet's definition. */
export function DutyPanel({ evaluation, notInUse }: DutyPanelProps) {
  const { duty, change, sections, errors, filled, keeping } = evaluation;
  const controls = useMemo(
    (): DutyControls => ({
      duty,
      change,
      errorOf: (key) => errors.find((error) => error.field === key)?.message,
      filledOf: (key) => filled.get(key),
    }),
    [duty, change, errors, filled],
  );
  return (
    <form
      noValidate
      aria-label="Your duty"
      className="duty"
      onSubmit={(event) => {
        event.preventDefault();
        if (notInUse === null) evaluation.evaluateAndKeep();
      }}
    >
      <ErrorSummary
        title="The duty is not complete yet"
        errors={evaluation.summary.map((error) => ({
          message: summaryLine(error, sections),
          ...(error.field ? { fieldId: fieldId(error.field) } : {}),
        }))}
      />
      <ModeSwitch definition={evaluation.sheet.definition} duty={duty} change={change} />
      <EquationOffer evaluation={evaluation} />
      {sections.map((section) => (
        <DutySection key={section.key} section={section} controls={controls} />
      ))}
      <ForceSection controls={controls} />
      <div className="duty-acts">
        <Button
          type="primary"
          htmlType="submit"
          loading={keeping.state === 'sending'}
          disabled={notInUse !== null}
        >
          Evaluate and keep
        </Button>
        <Button onClick={evaluation.startAnew} disabled={!hasContent(duty)}>
          Start anew
        </Button>
        <p className="duty-acts-words">
          {notInUse ??
            'What you type stays in this browser. A number is on record once the server has kept it.'}
        </p>
      </div>
    </form>
  );
}
