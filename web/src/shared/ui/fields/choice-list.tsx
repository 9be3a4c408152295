import './field.css';

interface ChoiceListProps<T extends string> {
  /** Also the group's name for the browser. */
  id: string;
  legend: string;
  choices: readonly { value: T; label: string; hint?: string }[];
  value: T | null;
  error?: string | undefined;
  onChange: (value: T) => void;
}

/** One of a few, each said in words; nothing is chosen beforehand unless `value` says so. */
export function ChoiceList<T extends string>({
  id,
  legend,
  choices,
  value,
  error,
  onChange,
}: ChoiceListProps<T>) {
  return (
    <fieldset className="choice-list" aria-describedby={error ? `${id}-error` : undefined}>
      <legend className="field-label">{legend}</legend>
      {choices.map((choice, i) => (
        <label key={choice.value} className="choice-line">
          <input
            type="radio"
            // The first carries the id that an error summary leads to.
            id={i === 0 ? id : undefined}
            name={id}
            checked={choice.value === value}
            onChange={() => onChange(choice.value)}
          />
          <span>
            {choice.label}
            {choice.hint ? <span className="choice-hint"> {choice.hint}</span> : null}
          </span>
        </label>
      ))}
      {error ? (
        <p className="field-error" id={`${id}-error`}>
          {error}
        </p>
      ) : null}
    </fieldset>
  );
}
