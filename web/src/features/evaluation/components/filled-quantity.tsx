import type { ReactNode } from 'react';
import { formatUnit } from '../../../shared/format/format-unit';
import { lowerFirst } from '../../../shared/format/lower-first';
import { Figure } from '../../../shared/ui/figure';
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
          {filled ? <Figure value={filled.value} /> : <span aria-label="not yet computed">…</span>}
        </span>
        <span className="quantity-unit">{formatUnit(filled?.unit ?? field.unit)}</span>
      </output>
      <div className="quantity-words">
        <p className="quantity-hint" id={`${id}-from`}>
          {wordsFor(equation)}
        </p>
      </div>
    </div>
  );
}

function wordsFor({ title, assumes, served }: EquationInUse): string {
  const from = served.length > 0 ? `, from ${served.map((s) => s.label.toLowerCase()).join(' and ')}` : '';
  const taking = assumes ? `; takes for granted: ${lowerFirst(assumes).replace(/\.$/, '')}` : '';
  return `Filled by “${title}”${from}${taking}.`;
}
