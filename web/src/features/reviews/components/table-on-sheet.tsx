import type { CorrelationDefinition, Table } from '@merestone/engine';
import { sentence } from '../../../shared/format/sentence';
import { symbolOnSheet } from '../../../shared/format/symbol-on-sheet';
import { InlineEquation } from '../../../shared/ui/equation';
import { Figure } from '../../../shared/ui/figure';
import { SetTable } from '../../../shared/ui/set-table';

/** A look-up table that a sheet carries, row by row. */
export function TableOnSheet({ table, definition }: { table: Table; definition: CorrelationDefinition }) {
  const symbols = [...new Set(table.rows.flatMap(({ values }) => Object.keys(values)))];
  return (
    <>
      <SetTable label={table.title}>
        <thead>
          <tr>
            <th scope="col">{table.title}</th>
            {symbols.map((symbol) => (
              <th key={symbol} scope="col" className="number">
                <InlineEquation tex={symbolOnSheet(definition, symbol).tex} />
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {table.rows.map(({ key, label, values }) => (
            <tr key={key}>
              <th scope="row">{label}</th>
              {symbols.map((symbol) => (
                <td key={symbol} className="number">
                  {values[symbol] === undefined ? '' : <Figure value={values[symbol]} exactly />}
                </td>
              ))}
            </tr>
          ))}
        </tbody>
      </SetTable>
      {table.source ? <p className="field-note">{sentence(table.source)}</p> : null}
    </>
  );
}
