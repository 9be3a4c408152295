import type { DefinitionTex, LineTex } from '@merestone/engine';
import { memo } from 'react';
import type { Sheet } from '../../../shared/api/types';
import { formatDay } from '../../../shared/format/format-date';
import { MarginNote } from '../../../shared/ui/margin-note';
import { MarkedText } from '../../../shared/ui/marked-text';
import { EquationLine } from '../../../shared/ui/on-sheet/equation-line';
import { MarginRow } from '../../../shared/ui/sheet-page';
import { numberedLines } from '../../../shared/format/numbered-lines';
import { VERIFICATION_WORDS } from '../../../shared/format/plain-words';
import { SourceNotes } from './source-notes';

interface EquationsSectionProps {
  sheet: Sheet;
  tex: DefinitionTex | null;
}

/** The numbered equations, with their source and how far they have been verified beside them. */
export const EquationsSection = memo(function EquationsSection({ sheet, tex }: EquationsSectionProps) {
  return (
    <MarginRow heading={<h2 className="heard-only">Equations</h2>} notes={<EquationNotes sheet={sheet} />}>
      <div className="sheet-equations">
        {tex ? (
          <NumberedEquations tex={tex} />
        ) : (
          <p>The equations of this draft cannot be set yet: its definition does not hold together.</p>
        )}
      </div>
    </MarginRow>
  );
});

function EquationNotes({ sheet }: { sheet: Sheet }) {
  const { verification, sources } = sheet.definition;
  return (
    <>
      <SourceNotes sources={sources} />
      <MarginNote title="Verification">
        <p>{VERIFICATION_WORDS[verification.status]}</p>
        <p>
          <MarkedText text={verification.note} />
        </p>
      </MarginNote>
      {sheet.approval ? (
        <MarginNote title="Approved">
          <p>
            by {sheet.approval.by.name} on {formatDay(sheet.approval.at)}. {sheet.approval.meaning}
          </p>
          {sheet.reviewDue ? <p>To be looked at again by {formatDay(sheet.reviewDue)}.</p> : null}
        </MarginNote>
      ) : null}
    </>
  );
}

function NumberedEquations({ tex }: { tex: DefinitionTex }) {
  const numbers = new Map(numberedLines(tex).map((line, i) => [line, i + 1]));
  const several = tex.parts.length > 1;
  const set = (line: LineTex) => (
    <EquationLine key={line.symbol} line={line} number={numbers.get(line) ?? 0} />
  );
  return (
    <>
      {tex.intermediates.map(set)}
      {tex.parts.map((part) => (
        <section key={part.key} aria-label={part.title}>
          {several ? <h3>{part.title}</h3> : null}
          {set(part.result)}
          {part.coefficient ? set(part.coefficient) : null}
        </section>
      ))}
    </>
  );
}
