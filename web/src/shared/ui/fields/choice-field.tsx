import { useId } from 'react';
import { Field } from './field';

export interface Choice {
  value: string;
  label: string;
}

interface ChoiceFieldProps {
  label: string;
  value: string;
  choices: readonly Choice[];
  onChange: (value: string) => void;
}

/** One of a list, by the browser's own picker: it works with every keyboard, reader and phone. */
export function ChoiceField({ label, value, choices, onChange }: ChoiceFieldProps) {
  const id = useId();
  return (
    <Field id={id} label={label}>
      <div className="choice-box">
        <select id={id} className="choice" value={value} onChange={(event) => onChange(event.target.value)}>
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
