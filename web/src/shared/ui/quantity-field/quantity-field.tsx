import { Input } from 'antd';
import { useState, type ReactNode } from 'react';
import { formatUnit } from '../../format/format-unit';
import { LabelWords } from './label-words';
import { parseTypedNumber } from './parse-typed-number';
import { QuantityQuestion } from './quantity-question';
import { withUnit, type TypedQuantity } from './typed-quantity';
import './quantity-field.css';

export interface QuantityFieldProps {
  /** Id of the input itself; an error summary leads to it. */
  id: string;
  /** Plain words for the label, also of the unit beside it. */
  label: string;
  /** The symbol, typeset, after the words. */
  symbol?: ReactNode;
  typed: TypedQuantity;
  /** Units to choose from; one alone stands as text, and `1` as nothing. */
  units: readonly string[];
  hint?: ReactNode;
  /** What is wrong, as told by whoever knows more than the text shows. */
  error?: string | undefined;
  optional?: boolean;
  /** Why an empty field must be filled in after all. */
  needed?: string | undefined;
  onChange: (typed: TypedQuantity) => void;
}

/**
 * A number with its unit. Keeps what was typed to the letter, asks about a comma, and asks whether to convert
 * when the unit is changed under a number. What cannot be read is said once the field is left.
 */
export function QuantityField(props: QuantityFieldProps) {
  const { id, label, symbol, typed, units, hint, optional = false, needed, onChange } = props;
  const [busy, setBusy] = useState(false);
  const asked = isAsked(typed);
  const error = asked ? undefined : (props.error ?? (busy ? undefined : refusalOf(typed)));
  const wrong = props.error !== undefined || error !== undefined;
  const described = [
    asked ? `${id}-question` : null,
    error ? `${id}-error` : null,
    needed ? `${id}-needed` : null,
    hint ? `${id}-hint` : null,
  ]
    .filter(Boolean)
    .join(' ');
  return (
    <div className={classOf(wrong, needed !== undefined)}>
      <label className="quantity-label" htmlFor={id}>
        <LabelWords label={label} symbol={symbol} />
        {optional ? <span className="quantity-optional"> (optional)</span> : null}
      </label>
      <div className="quantity-box">
        <Input
          id={id}
          variant="borderless"
          inputMode="decimal"
          autoComplete="off"
          spellCheck={false}
          value={typed.text}
          aria-invalid={wrong}
          aria-describedby={described || undefined}
          onChange={(event) => onChange({ text: event.target.value, unit: typed.unit })}
          onFocus={() => setBusy(true)}
          onBlur={() => setBusy(false)}
        />
        <UnitPicker label={label} typed={typed} units={units} onChange={onChange} />
      </div>
      <QuantityQuestion label={label} typed={typed} inputId={id} onChange={onChange} />
      <div className="quantity-words">
        {error ? (
          <p className="quantity-error" id={`${id}-error`}>
            {error}
          </p>
        ) : null}
        {needed ? (
          <p className="quantity-needed-words" id={`${id}-needed`}>
            {needed}
          </p>
        ) : null}
        {hint ? (
          <p className="quantity-hint" id={`${id}-hint`}>
            {hint}
          </p>
        ) : null}
      </div>
    </div>
  );
}

function classOf(wrong: boolean, needed: boolean): string {
  if (wrong) return 'quantity quantity-wrong';
  return needed ? 'quantity quantity-needed' : 'quantity';
}

interface UnitPickerProps {
  label: string;
  typed: TypedQuantity;
  units: readonly string[];
  onChange: (typed: TypedQuantity) => void;
}

function UnitPicker({ label, typed, units, onChange }: UnitPickerProps) {
  if (units.length < 2) {
    const unit = formatUnit(units[0] ?? '1');
    return unit ? <span className="quantity-unit">{unit}</span> : null;
  }
  return (
    <select
      className="quantity-unit"
      aria-label={`Unit of ${label}`}
      value={typed.unit}
      onChange={(event) => onChange(withUnit(typed, event.target.value))}
    >
      {units.map((unit) => (
        <option key={unit} value={unit}>
          {formatUnit(unit) || 'as a number'}
        </option>
      ))}
    </select>
  );
}

/** Whether the field itself is asking something, which says more than an error would. */
function isAsked({ text, unitBefore }: TypedQuantity): boolean {
  return unitBefore !== undefined || parseTypedNumber(text).kind === 'ask';
}

function refusalOf(typed: TypedQuantity): string | undefined {
  const parsed = parseTypedNumber(typed.text);
  return parsed.kind === 'refused' ? parsed.message : undefined;
}
