import type { ReactNode } from 'react';
import './field.css';

interface FieldProps {
  /** Id of the control. Its error has the id `<id>-error`, its hint `<id>-hint`. */
  id: string;
  label: ReactNode;
  hint?: ReactNode;
  error?: string | undefined;
  children: ReactNode;
}

/** A label, a control, and beside it what is wrong with it or what it is for. */
export function Field({ id, label, hint, error, children }: FieldProps) {
  return (
    <div className="field">
      <label className="field-label" htmlFor={id}>
        {label}
      </label>
      {children}
      {hint && !error ? (
        <p className="field-hint" id={`${id}-hint`}>
          {hint}
        </p>
      ) : null}
      {error ? (
        <p className="field-error" id={`${id}-error`}>
          {error}
        </p>
      ) : null}
    </div>
  );
}

/** What a control must carry so that its words are read with it. */
export function describedBy(id: string, { error, hint }: { error?: string | undefined; hint?: boolean }) {
  if (error) return { 'aria-invalid': true, 'aria-describedby': `${id}-error` } as const;
  return hint ? ({ 'aria-describedby': `${id}-hint` } as const) : {};
}
