import type { ReactNode } from 'react';
import './field.css';

interface CheckListProps<T extends string> {
  id: string;
  legend: string;
  choices: readonly { value: T; label: string; hint?: ReactNode }[];
  chosen: readonly T[];
  /** Said under the list, whatever is chosen. */
  hint?: ReactNode;
  error?: string | undefined;
  onChange: (chosen: T[]) => void;
}

/** Any number out of a list, each said in words; the chosen ones stay in the list's order. */
export function CheckList<T extends string>({
  id,
  legend,
  choices,
  chosen,
  hint,
  error,
  onChange,
}: CheckListProps<T>) {
  const set = (value: T, wanted: boolean) =>
    onChange(
      choices.map((choice) => choice.value).filter((one) => (one === value ? wanted : chosen.includes(one))),
    );
  const described = [hint ? `${id}-hint` : null, error ? `${id}-error` : null].filter(Boolean).join(' ');
  return (
    <fieldset className="choice-list" aria-describedby={described || undefined}>
      <legend className="field-label">{legend}</legend>
      {choices.map(({ value, label, hint: words }, i) => (
        <label key={value} className="choice-line">
          <input
            type="checkbox"
            // The first carries the id that an error summary leads to.
            id={i === 0 ? id : undefined}
            checked={chosen.includes(value)}
            onChange={(event) => set(value, event.target.checked)}
          />
          <span>
            {label}
            {words ? <span className="choice-hint"> {words}</span> : null}
          </span>
        </label>
      ))}
      {hint ? (
        <p className="field-hint" id={`${id}-hint`}>
          {hint}
        </p>
      ) : null}
      {error ? (
        <p className="field-error" id={`${id}-error`}>
          {error}
        </p>
      ) : null}
    </fieldset>
  );
}
