import { convert } from '@merestone/engine';
import type { ReactNode } from 'react';
import { formatUnit } from '../../../shared/format/format-unit';
import { inWords } from '../../../shared/format/in-words';
import { lowerFirst } from '../../../shared/format/lower-first';
import { Figure } from '../../../shared/ui/figure';
import { MarkedText } from '../../../shared/ui/marked-text';
import { LabelWords } from '../../../shared/ui/quantity-field/label-words';
import type { EquationInUse, FormField } from '../model/duty-form';
import { fieldId } from '../model/field-id';
import type { FilledValue } from '../model/filled-values';

interface FilledQuantityProps {
  field: FormField;
  equation: EquationInUse;
  /** The value, once everything it needs is there. */
  filled: FilledValue | undefined;
  symbol: ReactNode;
}

/** A value that the product filled in: in italics, with where it comes from and what it takes for granted. */
export function FilledQuantity({ field, equation, filled, symbol }: FilledQuantityProps) {
  const id = fieldId(field.key);
  const shown = filled && filled.outside === undefined ? inUnit(filled, field.startUnit) : undefined;
  return (
    <div className="quantity">
      <span className="quantity-label" id={`${id}-label`}>
        <LabelWords label={field.label} symbol={symbol} />
      </span>
      <output
        className="quantity-box filled-box"
        id={id}
        tabIndex={-1}
        aria-labelledby={`${id}-label`}
        aria-describedby={`${id}-from`}
      >
        <span className="filled-value">
          {shown ? <Figure value={shown.value} /> : <span aria-label="not yet computed">…</span>}
        </span>
        <span className="quantity-unit">{formatUnit(shown?.unit ?? field.startUnit)}</span>
      </output>
      <div className="quantity-words">
        {filled?.outside === undefined ? null : (
          <p className="quantity-error">
            <MarkedText text={`${filled.outside} The equation does not hold there.`} />
          </p>
        )}
        <p className="quantity-hint" id={`${id}-from`}>
          {wordsFor(equation)}
        </p>
      </div>
    </div>
  );
}

/** The value in the unit that the field would have been typed in. */
function inUnit({ value, unit }: FilledValue, wanted: string): FilledValue {
  const converted = convert(value, unit, wanted);
  return converted === null ? { value, unit } : { value: converted, unit: wanted };
}

function wordsFor({ title, assumes, served }: EquationInUse): string {
  const from = served.length > 0 ? `, from ${inWords(served.map((s) => lowerFirst(s.label)))}` : '';
  const taking = assumes ? `; takes for granted: ${lowerFirst(assumes).replace(/\.$/, '')}` : '';
  return `Filled by “${title}”${from}${taking}.`;
}
