import { memo } from 'react';
import { formatUnit } from '../../../shared/format/format-unit';
import { BOUND_BASES } from '../model/choices';
import type { BoundRow, StretchForm } from '../model/draft-form';
import type { DraftSymbol } from '../model/draft-symbols';
import { emptyStretch } from '../model/empty-rows';
import { draftFieldId } from '../model/field-id';
import { useDraftTools } from './draft-context';
import { EndFields } from './end-fields';
import { LongTextField } from './fields/long-text-field';
import { PickField } from './fields/pick-field';

import { RowAct } from './row-list';

interface BoundFieldsProps {
  row: BoundRow;
  at: number;
  path: string;
  symbols: readonly DraftSymbol[];
}

/** The bound on one symbol: its stretches, each with a limit on either side or on one, and its basis. */
export const BoundFields = memo(function BoundFields({ row, at, path, symbols }: BoundFieldsProps) {
  const { change, problemAt } = useDraftTools();
  const edit = (patch: Partial<BoundRow>) => change({ do: 'edit-row', list: 'bounds', at, patch });
  const unit = formatUnit(symbols.find(({ symbol }) => symbol === row.on)?.unit ?? '1');
  const stretches = problemAt(`${path}.stretches`);
  return (
    <>
      <div className="draft-grid">
        <PickField
          path={`${path}.on`}
          label="Symbol"
          value={row.on}
          choices={symbols
            .filter(({ kind }) => kind !== 'coefficient' && kind !== 'result')
            .map(({ symbol, name }) => ({ value: symbol, label: name ? `${symbol}, ${name}` : symbol }))}
          onChange={(on) => edit({ on })}
        />
        <PickField
          path={`${path}.basis`}
          label="Basis"
          value={row.basis}
          choices={BOUND_BASES}
          onChange={(basis) => edit({ basis })}
          hint={row.basis === 'none' ? 'The sheet then says “unchecked” for this symbol.' : undefined}
        />
      </div>
      {row.basis === 'none' ? null : (
        <div id={draftFieldId(`${path}.stretches`)} tabIndex={-1}>
          {row.stretches.map((stretch, i) => (
            <StretchFields
              key={stretch.id}
              stretch={stretch}
              path={`${path}.stretches[${i}]`}
              unit={unit}
              onChange={(patch) =>
                edit({ stretches: row.stretches.map((one, j) => (j === i ? { ...one, ...patch } : one)) })
              }
              onRemove={
                row.stretches.length > 1
                  ? () => edit({ stretches: row.stretches.filter((_, j) => j !== i) })
                  : null
              }
            />
          ))}
          {stretches ? <p className="field-error">{stretches.message}</p> : null}
          <RowAct
            what={`Add a stretch, where there is a gap between the data on ${row.on}`}
            onClick={() => edit({ stretches: [...row.stretches, emptyStretch()] })}
          >
            add a stretch, where there is a gap between the data
          </RowAct>
        </div>
      )}
      <div className="draft-grid">
        <LongTextField
          path={`${path}.place`}
          rows={1}
          label="Place (optional)"
          value={row.place}
          onChange={(place) => edit({ place })}
          hint="Where in the source the limits stand, or who says so."
        />
        <LongTextField
          path={`${path}.note`}
          rows={1}
          label="Note (optional)"
          value={row.note}
          onChange={(note) => edit({ note })}
        />
      </div>
    </>
  );
});

interface StretchFieldsProps {
  stretch: StretchForm;
  path: string;
  unit: string;
  onChange: (patch: Partial<StretchForm>) => void;
  onRemove: (() => void) | null;
}

function StretchFields({ stretch, path, unit, onChange, onRemove }: StretchFieldsProps) {
  const problem = useDraftTools().problemAt(path);
  const side = unit ? `, ${unit}` : '';
  return (
    <div id={draftFieldId(path)} tabIndex={-1} className="draft-stretch">
      <EndFields
        path={`${path}.lo`}
        label={`From${side}`}
        end={stretch.lo}
        onChange={(patch) => onChange({ lo: { ...stretch.lo, ...patch } })}
      />
      <EndFields
        path={`${path}.hi`}
        label={`Up to${side}`}
        end={stretch.hi}
        onChange={(patch) => onChange({ hi: { ...stretch.hi, ...patch } })}
      />
      {problem ? <p className="field-error">{problem.message}</p> : null}
      {onRemove ? (
        <RowAct what="Remove this stretch" onClick={onRemove}>
          remove this stretch
        </RowAct>
      ) : null}
    </div>
  );
}
