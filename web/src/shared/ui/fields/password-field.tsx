import { useState, type ReactNode } from 'react';
import { lowerFirst } from '../../format/lower-first';
import { describedBy, Field } from './field';
import './password-field.css';
import { TextInput } from './text-input';

interface PasswordFieldProps {
  id: string;
  label: string;
  value: string;
  onChange: (password: string) => void;
  /** What a password manager should put in: the one it knows, or one it makes up. */
  autoComplete: 'current-password' | 'new-password';
  error?: string | undefined;
  hint?: ReactNode;
}

/** A password: pasted, filled by a manager, looked at, and taken as it is, spaces and all. */
export function PasswordField({ id, label, value, onChange, autoComplete, error, hint }: PasswordFieldProps) {
  const [shown, setShown] = useState(false);
  return (
    <div>
      <Field id={id} label={label} error={error} hint={hint}>
        <TextInput
          id={id}
          type={shown ? 'text' : 'password'}
          name={autoComplete}
          autoComplete={autoComplete}
          autoCapitalize="none"
          spellCheck={false}
          value={value}
          onChange={onChange}
          {...describedBy(id, { error, hint: hint !== undefined })}
        />
      </Field>
      <label className="password-show">
        <input type="checkbox" checked={shown} onChange={(event) => setShown(event.target.checked)} />
        Show the {lowerFirst(label)}
      </label>
    </div>
  );
}
