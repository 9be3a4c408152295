import type { CorrelationDefinition } from '@merestone/engine';
import type { ReactNode } from 'react';
import { MarginNote } from '../../../shared/ui/margin-note';
import { MarginRow } from '../../../shared/ui/sheet-page';
import { STATE_WORDS } from '../model/plain-words';

interface DutySectionProps {
  definition: CorrelationDefinition;
  children: ReactNode;
}

/** The duty, with what has to be minded while filling it in. */
export function DutySection({ definition, children }: DutySectionProps) {
  return (
    <MarginRow heading={<h2 id="your-duty">Your duty</h2>} notes={<DutyNotes definition={definition} />}>
      {children}
    </MarginRow>
  );
}

function DutyNotes({ definition }: { definition: CorrelationDefinition }) {
  return (
    <>
      <MarginNote title="Property state">{STATE_WORDS[definition.propertyState]}</MarginNote>
      {definition.cautions.map((caution) => (
        <MarginNote key={caution} title="Mind">
          {caution}
        </MarginNote>
      ))}
    </>
  );
}
