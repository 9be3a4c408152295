import { PasswordField } from './password-field';

interface NewPasswordFieldProps {
  id: string;
  label?: string;
  value: string;
  onChange: (password: string) => void;
  error: string | undefined;
}

/** A password to be chosen, with its rules beside it before anybody can break one. */
export function NewPasswordField({
  id,
  label = 'New password',
  value,
  onChange,
  error,
}: NewPasswordFieldProps) {
  return (
    <PasswordField
      id={id}
      label={label}
      value={value}
      onChange={onChange}
      autoComplete="new-password"
      error={error}
      hint="8 to 128 characters, 15 or more are better. Any signs and spaces will do, several words are good. Not your name or address, and none of those that are tried first."
    />
  );
}
