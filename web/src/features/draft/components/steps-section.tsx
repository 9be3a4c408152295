import { memo } from 'react';
import type { IntermediateRow, QuantityRow, TableForm } from '../model/draft-form';
import { useDraftTools } from './draft-context';
import { DraftSection } from './draft-section';
import { TextField } from './fields/text-field';
import { TickField } from './fields/tick-field';
import { FormulaFields } from './formula-fields';
import { RowList } from './row-list';
import { TableFields } from './table-fields';

interface StepsSectionProps {
  rows: readonly IntermediateRow[];
  tables: readonly TableForm[];
  quantities: readonly QuantityRow[];
}

/** Named steps on the way to the result, and tables whose rows fill quantities. */
export const StepsSection = memo(function StepsSection({ rows, tables, quantities }: StepsSectionProps) {
  return (
    <DraftSection
      section="steps"
      about="Only where they are needed: a hold-up, a friction factor, a wetted area; a table of packings or fibre bundles."
    >
      <RowList list="intermediates" rows={rows} noun="step" first="symbol" titleOf={(row) => row.symbol}>
        {(row, at, path) => <StepFields row={row} at={at} path={path} />}
      </RowList>
      <div className="draft-tables">
        <RowList list="tables" rows={tables} noun="table" first="title" titleOf={(row) => row.title}>
          {(table, at, path) => <TableFields table={table} at={at} path={path} quantities={quantities} />}
        </RowList>
      </div>
    </DraftSection>
  );
});

interface StepFieldsProps {
  row: IntermediateRow;
  at: number;
  path: string;
}

const StepFields = memo(function StepFields({ row, at, path }: StepFieldsProps) {
  const { change } = useDraftTools();
  const edit = (patch: Partial<IntermediateRow>) =>
    change({ do: 'edit-row', list: 'intermediates', at, patch });
  return (
    <>
      <div className="draft-quantity">
        <TextField
          path={`${path}.symbol`}
          label="Symbol"
          value={row.symbol}
          onChange={(symbol) => edit({ symbol })}
          code
        />
        <TextField path={`${path}.name`} label="Name" value={row.name} onChange={(name) => edit({ name })} />
        <TextField
          path={`${path}.unit`}
          label="Unit"
          value={row.unit}
          onChange={(unit) => edit({ unit })}
          hint="1 for none"
          code
        />
      </div>
      <FormulaFields path={path} formula={row} onChange={edit} label="Expression" />
      <details className="draft-more">
        <summary>
          {[row.dimensional && 'a dimensional formula', row.note].filter(Boolean).join('; ') ||
            'dimensional formula, note, typeset form'}
        </summary>
        <TickField
          path={`${path}.dimensional`}
          label="Its constant carries units"
          checked={row.dimensional}
          onChange={(dimensional) => edit({ dimensional })}
        />
        <div className="draft-grid">
          <TextField
            path={`${path}.note`}
            label="Note (optional)"
            value={row.note}
            onChange={(note) => edit({ note })}
          />
          <TextField
            path={`${path}.tex`}
            label="Typeset as (optional)"
            value={row.tex}
            onChange={(tex) => edit({ tex })}
            code
          />
        </div>
      </details>
    </>
  );
});
