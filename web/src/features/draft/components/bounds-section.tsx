import { Button } from 'antd';
import { memo } from 'react';
import type { BoundRow } from '../model/draft-form';
import type { DraftSymbol } from '../model/draft-symbols';
import { emptyBound } from '../model/empty-rows';
import { BoundFields } from './bound-fields';
import { useDraftTools } from './draft-context';
import { DraftSection } from './draft-section';
import { RowList } from './row-list';

interface BoundsSectionProps {
  rows: readonly BoundRow[];
  symbols: readonly DraftSymbol[];
}

/** How far each symbol may go, and how that is known. */
export const BoundsSection = memo(function BoundsSection({ rows, symbols }: BoundsSectionProps) {
  const { change } = useDraftTools();
  const bounded = new Set(rows.map(({ on }) => on));
  const without = symbols.filter(({ kind, symbol }) => kind === 'group' && !bounded.has(symbol));
  return (
    <DraftSection
      section="bounds"
      about="Every group that the result stands on has a bound, if only to say that none is on record. Values are in the symbol’s own unit on this sheet."
    >
      <RowList
        list="bounds"
        rows={rows}
        noun="bound"
        first="on"
        titleOf={(row) => row.on}
        empty="No bound so far."
      >
        {(row, at, path) => <BoundFields row={row} at={at} path={path} symbols={symbols} />}
      </RowList>
      {without.length > 0 ? (
        <div className="draft-row-acts">
          {without.map(({ symbol }) => (
            <Button
              key={symbol}
              onClick={() => change({ do: 'add-row', list: 'bounds', row: { ...emptyBound(), on: symbol } })}
            >
              Add a bound on {symbol}
            </Button>
          ))}
        </div>
      ) : null}
    </DraftSection>
  );
});
