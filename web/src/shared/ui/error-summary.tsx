import { useEffect, useRef } from 'react';
import './notice.css';

export interface SummaryError {
  /** Id of the control the error is about; without one the line is no link. */
  fieldId?: string;
  message: string;
}

interface ErrorSummaryProps {
  title: string;
  errors: SummaryError[];
}

/** What keeps a form from being sent, at its top: announced, focused, each line leading to its field. */
export function ErrorSummary({ title, errors }: ErrorSummaryProps) {
  const box = useRef<HTMLDivElement>(null);
  const words = errors.map((error) => error.message).join('\n');
  useEffect(() => {
    if (words) box.current?.focus();
  }, [words]);
  if (errors.length === 0) return null;
  return (
    <div className="notice notice-problem" role="alert" tabIndex={-1} ref={box}>
      <p className="notice-title">{title}</p>
      <ul>
        {errors.map(({ fieldId, message }) => (
          <li key={`${fieldId ?? ''}${message}`}>
            {fieldId ? <FieldLink id={fieldId}>{message}</FieldLink> : message}
          </li>
        ))}
      </ul>
    </div>
  );
}

function FieldLink({ id, children }: { id: string; children: string }) {
  return (
    <a
      href={`#${id}`}
      onClick={(event) => {
        event.preventDefault();
        document.getElementById(id)?.focus();
      }}
    >
      {children}
    </a>
  );
}
