import { useId, type ReactNode } from 'react';
import { describedBy, Field } from './field';

export interface Choice {
  value: string;
  label: string;
}

interface ChoiceFieldProps {
  /** Given where an error summary leads to it. */
  id?: string;
  label: string;
  value: string;
  choices: readonly Choice[];
  hint?: ReactNode;
  error?: string | undefined;
  onChange: (value: string) => void;
}

/** One of a list, by the browser's own picker: it works with every keyboard, reader and phone. */
export function ChoiceField({ id: given, label, value, choices, hint, error, onChange }: ChoiceFieldProps) {
  const own = useId();
  const id = given ?? own;
  return (
    <Field id={id} label={label} hint={hint} error={error}>
      <div className="choice-box">
        <select
          id={id}
          className="choice"
          value={value}
          onChange={(event) => onChange(event.target.value)}
          {...describedBy(id, { error, hint: hint !== undefined })}
        >
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
