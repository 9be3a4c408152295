import { useState } from 'react';
import { TextField } from './text-field';

interface SlugsFieldProps {
  path: string;
  label: string;
  value: readonly string[];
  onChange: (value: string[]) => void;
}

/** Names of sheets in one line, separated by commas or spaces; what is typed stays as typed while it is. */
export function SlugsField({ path, label, value, onChange }: SlugsFieldProps) {
  const [typed, setTyped] = useState(value.join(', '));
  const read = namesIn(typed);
  // Somebody else may have put other names there.
  const text = read.join() === value.join() ? typed : value.join(', ');
  return (
    <TextField
      path={path}
      label={label}
      value={text}
      onChange={(next) => {
        setTyped(next);
        onChange(namesIn(next));
      }}
      hint="Their names in the register, separated by commas."
      code
    />
  );
}

function namesIn(text: string): string[] {
  return text.split(/[\s,;]+/).filter(Boolean);
}
