import { Button } from 'antd';
import { memo, useState } from 'react';
import { SetTable } from '../../../shared/ui/set-table';
import type { QuantityRow, TableForm, TableRowForm } from '../model/draft-form';
import { emptyTableRow } from '../model/empty-rows';
import { draftFieldId } from '../model/field-id';
import { pasteTable } from '../model/paste-table';
import { suggestSlug } from '../model/suggest-slug';
import { useDraftTools } from './draft-context';
import { LongTextField } from './fields/long-text-field';
import { TextField } from './fields/text-field';
import { RowAct } from './row-list';
import { TableCells } from './table-cells';

interface TableFieldsProps {
  table: TableForm;
  at: number;
  path: string;
  quantities: readonly QuantityRow[];
}

/** A table that the sheet carries; its rows are pasted from a spreadsheet or typed. */
export const TableFields = memo(function TableFields({ table, at, path, quantities }: TableFieldsProps) {
  const { change } = useDraftTools();
  const [pasted, setPasted] = useState('');
  const [told, setTold] = useState<string[]>([]);
  const edit = (patch: Partial<TableForm>) => change({ do: 'edit-row', list: 'tables', at, patch });
  const symbols = columnsOf(table, quantities);
  const editRow = (row: number, patch: Partial<TableRowForm>) =>
    edit({ rows: table.rows.map((one, i) => (i === row ? { ...one, ...patch } : one)) });
  const followsTitle = table.name === '' || table.name === suggestSlug(table);

  const paste = () => {
    const all = quantities.map(({ symbol }) => symbol.trim()).filter(Boolean);
    const read = pasteTable(
      pasted,
      all,
      table.rows.map(({ key }) => key),
    );
    setTold([...read.problems, ...(read.rows.length > 0 ? [`${read.rows.length} rows taken over.`] : [])]);
    if (read.rows.length === 0) return;
    edit({ rows: [...table.rows, ...read.rows] });
    setPasted('');
    for (const [i, quantity] of quantities.entries())
      if (read.symbols.includes(quantity.symbol.trim()) && quantity.table === '')
        change({ do: 'edit-row', list: 'quantities', at: i, patch: { table: table.name } });
  };

  return (
    <>
      <div className="draft-grid draft-grid-wide">
        <TextField
          path={`${path}.title`}
          label="Title of the table"
          value={table.title}
          onChange={(title) => edit({ title, ...(followsTitle ? { name: suggestSlug({ title }) } : {}) })}
          placeholder="Packings with their constants …"
        />
        <TextField
          path={`${path}.name`}
          label="Key"
          value={table.name}
          onChange={(name) => edit({ name })}
          code
        />
      </div>
      <LongTextField
        path={`${path}.source`}
        label="Where its values come from (optional)"
        value={table.source}
        onChange={(source) => edit({ source })}
      />
      {table.rows.length > 0 ? (
        <SetTable label={`Rows of ${table.title || 'the table'}`}>
          <thead>
            <tr>
              <th scope="col">Key</th>
              <th scope="col">Label</th>
              {symbols.map((symbol) => (
                <th scope="col" key={symbol}>
                  {symbol}
                </th>
              ))}
              <th scope="col">Note</th>
              <th scope="col">
                <span className="heard-only">Acts</span>
              </th>
            </tr>
          </thead>
          <tbody>
            {table.rows.map((row, i) => (
              <TableCells
                key={row.id}
                row={row}
                path={`${path}.rows[${i}]`}
                symbols={symbols}
                onChange={(patch) => editRow(i, patch)}
                onRemove={() => edit({ rows: table.rows.filter((_, other) => other !== i) })}
              />
            ))}
          </tbody>
        </SetTable>
      ) : null}
      <RowAct what="Add a row to the table" onClick={() => edit({ rows: [...table.rows, emptyTableRow()] })}>
        add a row
      </RowAct>
      <LongTextField
        path={`${path}.rows`}
        label="Paste rows from a spreadsheet"
        value={pasted}
        onChange={setPasted}
        hint="The first line names the columns: label, then symbols of this sheet, and note if there is one."
        rows={3}
      />
      <Button disabled={pasted.trim() === ''} onClick={paste}>
        Take the pasted rows over
      </Button>
      <div role="status" className="draft-told" id={`${draftFieldId(path)}-told`}>
        {told.map((line) => (
          <p key={line}>{line}</p>
        ))}
      </div>
    </>
  );
});

/** The quantities that the table fills, and whatever its rows have values for. */
function columnsOf({ name, rows }: TableForm, quantities: readonly QuantityRow[]): string[] {
  const filled = quantities
    .filter(({ table, symbol }) => name !== '' && table === name && symbol !== '')
    .map(({ symbol }) => symbol);
  return [...new Set([...filled, ...rows.flatMap(({ values }) => values.map(({ symbol }) => symbol))])];
}
