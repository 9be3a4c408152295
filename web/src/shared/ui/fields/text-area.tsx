import type { TextareaHTMLAttributes } from 'react';
import './field.css';

interface TextAreaProps extends Omit<
  TextareaHTMLAttributes<HTMLTextAreaElement>,
  'className' | 'onChange' | 'value'
> {
  id: string;
  value: string;
  onChange: (text: string) => void;
}

/** Several lines of text; it grows with what is written where the browser can do that. */
export function TextArea({ onChange, rows = 3, ...others }: TextAreaProps) {
  return (
    <textarea
      {...others}
      rows={rows}
      className="text-input text-area"
      onChange={(event) => onChange(event.target.value)}
    />
  );
}
