import type { TableRowForm } from '../model/draft-form';
import { draftFieldId } from '../model/field-id';
import { useDraftTools } from './draft-context';
import { RowAct } from './row-list';

interface TableCellsProps {
  row: TableRowForm;
  path: string;
  symbols: readonly string[];
  onChange: (patch: Partial<TableRowForm>) => void;
  onRemove: () => void;
}

/** One row of a table, each cell a field of its own. */
export function TableCells({ row, path, symbols, onChange, onRemove }: TableCellsProps) {
  const textOf = (symbol: string) => row.values.find((value) => value.symbol === symbol)?.text ?? '';
  const setValue = (symbol: string, text: string) =>
    onChange({
      values: row.values.some((value) => value.symbol === symbol)
        ? row.values.map((value) => (value.symbol === symbol ? { symbol, text } : value))
        : [...row.values, { symbol, text }],
    });
  const name = row.label || row.key || 'the new row';
  return (
    <tr>
      <Cell
        path={`${path}.key`}
        label={`Key of ${name}`}
        value={row.key}
        onChange={(key) => onChange({ key })}
      />
      <Cell
        path={`${path}.label`}
        label={`Label of ${name}`}
        long
        value={row.label}
        onChange={(label) => onChange({ label })}
      />
      {symbols.map((symbol) => (
        <Cell
          key={symbol}
          path={`${path}.values.${symbol}`}
          label={`${symbol} of ${name}`}
          value={textOf(symbol)}
          onChange={(text) => setValue(symbol, text)}
          number
        />
      ))}
      <Cell
        path={`${path}.note`}
        label={`Note on ${name}`}
        long
        value={row.note}
        onChange={(note) => onChange({ note })}
      />
      <td>
        <RowAct what={`Remove ${name}`} onClick={onRemove}>
          remove
        </RowAct>
      </td>
    </tr>
  );
}

interface CellProps {
  path: string;
  label: string;
  value: string;
  number?: boolean;
  long?: boolean;
  onChange: (value: string) => void;
}

function Cell({ path, label, value, number = false, long = false, onChange }: CellProps) {
  const id = draftFieldId(path);
  const error = useDraftTools().problemAt(path)?.message;
  return (
    <td>
      <input
        id={id}
        className={`draft-input draft-cell ${number ? 'draft-cell-number' : long ? 'draft-cell-long' : ''}`}
        aria-label={label}
        aria-invalid={error !== undefined}
        aria-describedby={error ? `${id}-error` : undefined}
        value={value}
        autoComplete="off"
        inputMode={number ? 'decimal' : undefined}
        onChange={(event) => onChange(event.target.value)}
      />
      {error ? (
        <p className="field-error" id={`${id}-error`}>
          {error}
        </p>
      ) : null}
    </td>
  );
}
