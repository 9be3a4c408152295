import type { CheckReport } from '@merestone/engine';
import { memo } from 'react';
import type { CheckRow, TableForm } from '../model/draft-form';
import type { DraftSymbol } from '../model/draft-symbols';
import { CheckFields } from './check-fields';
import { DraftSection } from './draft-section';
import { RowList } from './row-list';

interface ChecksSectionProps {
  rows: readonly CheckRow[];
  symbols: readonly DraftSymbol[];
  tables: readonly TableForm[];
  reports: ReadonlyMap<number, CheckReport>;
}

/** Inputs with the answer that the sheet must reproduce, recomputed as they are typed. */
export const ChecksSection = memo(function ChecksSection({
  rows,
  symbols,
  tables,
  reports,
}: ChecksSectionProps) {
  return (
    <DraftSection
      section="checks"
      about="An example or a table value in print is worth most: it proves that the formula is written down right. A value of our own guards against slips only."
    >
      <RowList
        list="checks"
        rows={rows}
        noun="check"
        first="title"
        titleOf={(row) => row.title}
        empty="A sheet has one worked check at least."
      >
        {(row, at, path) => (
          <CheckFields
            row={row}
            at={at}
            path={path}
            symbols={symbols}
            tables={tables}
            report={reports.get(at)}
          />
        )}
      </RowList>
    </DraftSection>
  );
});
