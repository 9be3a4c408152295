import type { ReactNode } from 'react';
import type { Choice } from '../../../../shared/ui/fields/choice-field';
import { Field, describedBy } from '../../../../shared/ui/fields/field';
import { draftFieldId } from '../../model/field-id';
import { useDraftTools } from '../draft-context';

interface PickFieldProps {
  path: string;
  label: ReactNode;
  value: string;
  choices: readonly Choice[];
  onChange: (value: string) => void;
  hint?: ReactNode;
  disabled?: boolean;
}

/** One of a list, by the browser's own picker. A value that is not in the list stands there as it is. */
export function PickField({ path, label, value, choices, onChange, hint, disabled }: PickFieldProps) {
  const id = draftFieldId(path);
  const error = useDraftTools().problemAt(path)?.message;
  const known = choices.some((choice) => choice.value === value);
  return (
    <Field id={id} label={label} hint={hint} error={error}>
      <div className="choice-box">
        <select
          id={id}
          className="choice"
          value={value}
          disabled={disabled}
          onChange={(event) => onChange(event.target.value)}
          {...describedBy(id, { error, hint: hint !== undefined })}
        >
          {known ? null : <option value={value}>{value === '' ? 'choose …' : value}</option>}
          {choices.map((choice) => (
            <option key={choice.value} value={choice.value}>
              {choice.label}
            </option>
          ))}
        </select>
      </div>
    </Field>
  );
}
