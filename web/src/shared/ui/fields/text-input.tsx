import type { InputHTMLAttributes } from 'react';
import './field.css';

interface TextInputProps extends Omit<
  InputHTMLAttributes<HTMLInputElement>,
  'className' | 'onChange' | 'value'
> {
  id: string;
  value: string;
  onChange: (text: string) => void;
}

/** One line of text in the manner of the page. Sign-in and search need no more, and stay light without a kit's input. */
export function TextInput({ onChange, ...others }: TextInputProps) {
  return <input {...others} className="text-input" onChange={(event) => onChange(event.target.value)} />;
}
