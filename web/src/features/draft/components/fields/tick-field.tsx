import type { ReactNode } from 'react';
import { draftFieldId } from '../../model/field-id';

interface TickFieldProps {
  path: string;
  label: ReactNode;
  checked: boolean;
  onChange: (checked: boolean) => void;
  hint?: ReactNode;
}

/** Yes or no. */
export function TickField({ path, label, checked, onChange, hint }: TickFieldProps) {
  const id = draftFieldId(path);
  return (
    <div className="field">
      <label className="draft-tick" htmlFor={id}>
        <input
          id={id}
          type="checkbox"
          checked={checked}
          aria-describedby={hint ? `${id}-hint` : undefined}
          onChange={(event) => onChange(event.target.checked)}
        />
        <span>{label}</span>
      </label>
      {hint ? (
        <p className="field-hint" id={`${id}-hint`}>
          {hint}
        </p>
      ) : null}
    </div>
  );
}
