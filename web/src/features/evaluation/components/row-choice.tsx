import { Figure } from '../../../shared/ui/figure';
import { SymbolMark } from '../../../shared/ui/symbol-mark';
import type { RowPicker } from '../model/duty-form';
import { fieldId } from '../model/field-id';
import type { DutyControls } from './duty-controls';

interface RowChoiceProps {
  picker: RowPicker;
  controls: DutyControls;
}

/** A row of a table the sheet carries, such as a packing; what it gives stands under it. */
export function RowChoice({ picker, controls }: RowChoiceProps) {
  const id = fieldId(`rows.${picker.key}`);
  const error = controls.errorOf(`rows.${picker.key}`);
  const { chosen } = picker;
  return (
    <div className="duty-item duty-item-wide">
      <label className="quantity-label" htmlFor={id}>
        {picker.title}
      </label>
      <select
        id={id}
        className="row-select"
        value={chosen?.key ?? ''}
        aria-invalid={error !== undefined}
        aria-describedby={[error ? `${id}-error` : null, `${id}-values`].filter(Boolean).join(' ')}
        onChange={(event) =>
          controls.change({ do: 'choose-row', key: picker.key, row: event.target.value || null })
        }
      >
        <option value="">none, I give the values myself</option>
        {picker.rows.map((row) => (
          <option key={row.key} value={row.key}>
            {row.label}
          </option>
        ))}
      </select>
      <div className="quantity-words" id={`${id}-values`}>
        {error ? (
          <p className="quantity-error" id={`${id}-error`}>
            {error}
          </p>
        ) : null}
        {chosen ? <RowValues picker={picker} /> : null}
      </div>
    </div>
  );
}

function RowValues({ picker }: { picker: RowPicker }) {
  const { chosen, columns, source } = picker;
  return (
    <>
      <ul className="row-values">
        {columns.map(({ symbol, unit, label }) => {
          const value = chosen?.values[symbol];
          return value === undefined ? null : (
            <li key={symbol} title={label}>
              <SymbolMark symbol={symbol} /> = <Figure value={value} unit={unit} exactly />
            </li>
          );
        })}
      </ul>
      {chosen?.note ? <p className="quantity-hint">{chosen.note}</p> : null}
      {source ? <p className="quantity-hint">{source}</p> : null}
    </>
  );
}
