import { memo } from 'react';
import type { QuantityRow } from '../model/draft-form';
import { DraftSection } from './draft-section';
import { QuantityFields } from './quantity-fields';
import { RowList } from './row-list';

interface SymbolsSectionProps {
  rows: readonly QuantityRow[];
  tables: readonly string[];
}

/** The physical quantities of the sheet, each tied to the dictionary. */
export const SymbolsSection = memo(function SymbolsSection({ rows, tables }: SymbolsSectionProps) {
  return (
    <DraftSection
      section="symbols"
      about={
        <>
          Every quantity that the formulas, the bounds or a property equation need. Enter in a field adds the
          next row, Alt and an arrow key moves it. The constants g, R and pi are there already.
        </>
      }
    >
      <RowList
        list="quantities"
        rows={rows}
        noun="symbol"
        first="symbol"
        titleOf={(row) => row.symbol}
        empty="A sheet has one symbol at least."
      >
        {(row, at, path) => <QuantityFields row={row} at={at} path={path} tables={tables} />}
      </RowList>
    </DraftSection>
  );
});
