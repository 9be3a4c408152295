import { memo } from 'react';
import type { PartRow } from '../model/draft-form';
import { DraftSection } from './draft-section';
import { PartFields } from './part-fields';
import { RowList } from './row-list';

/** What the sheet gives: one equation, or the parts of a method that belong together. */
export const EquationSection = memo(function EquationSection({ rows }: { rows: readonly PartRow[] }) {
  return (
    <DraftSection
      section="equation"
      about="One part for most sheets. A method with an interfacial area and two sides has several; the last one is the principal."
    >
      <RowList
        list="parts"
        rows={rows}
        noun="part"
        first="title"
        titleOf={(row) => row.title}
        empty="A sheet has one part at least."
      >
        {(row, at, path) => <PartFields row={row} at={at} path={path} alone={rows.length === 1} />}
      </RowList>
    </DraftSection>
  );
});
