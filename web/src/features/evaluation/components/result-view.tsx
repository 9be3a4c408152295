import type { EvaluationState } from '../hooks/use-evaluation';
import { useFocusWhenLost } from '../../../shared/hooks/use-focus-when-lost';
import { accuracyOfResult } from '../../../shared/format/plain-words';
import { MarkedText } from '../../../shared/ui/marked-text';
import { copyText } from '../model/copy-text';
import { notableFindings, unboundedSymbols } from '../model/refusing-findings';
import type { Shown } from '../model/shown-outcome';
import { BasesTable } from './bases-table';
import { CopyButton } from './copy-button';
import { FindingText } from './finding-text';
import { FluxLine } from './flux-line';
import { GroupsTable } from './groups-table';
import { Headline } from './headline';
import { Provenance } from './provenance';
import { RecordLine } from './record-line';
import { UnboundedNote } from './unbounded-note';
import { StepsList } from './steps-list';

interface ResultViewProps {
  shown: Extract<Shown, { kind: 'preview' | 'kept' }>;
  evaluation: EvaluationState;
  firstNumber: number;
}

/** A number with everything that belongs to it: mark, groups, bases, flux, findings, steps and where it comes from. */
export function ResultView({ shown, evaluation, firstNumber }: ResultViewProps) {
  const { sheet } = evaluation;
  const heading = useFocusWhenLost<HTMLHeadingElement>(shown.kind === 'kept' ? shown.outcome.id : null);
  const { outcome } = shown;
  const mark = outcome.outcome === 'deviating' ? outcome.mark : null;
  const notable = notableFindings(outcome.findings);
  const reasons = new Map(
    outcome.outcome === 'deviating' ? outcome.deviations.map(({ symbol, reason }) => [symbol, reason]) : [],
  );
  return (
    <div className={mark ? 'result result-marked' : 'result'}>
      <h2 ref={heading} tabIndex={-1}>
        Result
      </h2>
      <RecordLine shown={shown} />
      <Headline numbers={outcome} request={shown.request} mark={mark} definition={sheet.definition} />
      <p className="result-accuracy">
        <strong>Accuracy of the sheet:</strong>{' '}
        <MarkedText text={accuracyOfResult(sheet.definition.accuracy)} />
      </p>
      {notable.map((finding) => (
        <FindingText key={finding.symbol} finding={finding} deviation={reasons.get(finding.symbol)} />
      ))}
      <UnboundedNote symbols={unboundedSymbols(outcome.findings)} />
      {outcome.remarks.map((remark) => (
        <p key={remark}>{sentence(remark)}</p>
      ))}
      {outcome.flux ? <FluxLine flux={outcome.flux} mark={mark} /> : null}
      <div className="result-acts">
        <CopyButton text={() => copyText({ sheet, shown })}>Copy as text</CopyButton>
      </div>
      <GroupsTable numbers={outcome} mark={mark} definition={sheet.definition} />
      <BasesTable numbers={outcome} mark={mark} />
      <StepsList steps={outcome.steps} firstNumber={firstNumber} mark={mark} definition={sheet.definition} />
      <Provenance shown={shown} sheet={sheet} />
    </div>
  );
}

function sentence(text: string): string {
  return `${text.charAt(0).toUpperCase()}${text.slice(1).replace(/\.$/, '')}.`;
}
