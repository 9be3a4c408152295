import { useState, type KeyboardEvent, type ReactNode } from 'react';
import { Field } from '../../../../shared/ui/fields/field';
import { matching, type SearchChoice } from '../../model/matching';

interface SearchFieldProps {
  id: string;
  label: ReactNode;
  /** What is chosen; empty for nothing. */
  value: string;
  choices: readonly SearchChoice[];
  onChoose: (value: string) => void;
  hint?: ReactNode;
  error?: string | undefined;
  placeholder?: string;
}

/** One of a long list, found by typing words of it. Arrow keys move, Enter takes, Escape leaves it as it was. */
export function SearchField(props: SearchFieldProps) {
  const { id, label, value, choices, onChoose, hint, error } = props;
  /** The words typed; null while nobody is searching. */
  const [words, setWords] = useState<string | null>(null);
  const [active, setActive] = useState(0);
  const found = words === null ? [] : matching(choices, words);
  const open = words !== null;
  const shown = choices.find((choice) => choice.value === value)?.label ?? value;
  const described = [error ? `${id}-error` : null, hint && !error ? `${id}-hint` : null];

  const take = (choice: SearchChoice | undefined) => {
    if (choice) onChoose(choice.value);
    setWords(null);
  };
  const onKeyDown = (event: KeyboardEvent<HTMLInputElement>) => {
    if (!open && (event.key === 'ArrowDown' || event.key === 'ArrowUp')) {
      setWords('');
      setActive(0);
    } else if (!open) return;
    else if (event.key === 'ArrowDown') setActive(Math.min(active + 1, found.length - 1));
    else if (event.key === 'ArrowUp') setActive(Math.max(active - 1, 0));
    else if (event.key === 'Enter') take(found[active]);
    else if (event.key === 'Escape') setWords(null);
    else return;
    event.preventDefault();
    event.stopPropagation();
  };

  return (
    <Field id={id} label={label} hint={hint} error={error}>
      <div className="draft-search">
        <input
          id={id}
          className="draft-input"
          role="combobox"
          aria-expanded={open}
          aria-controls={`${id}-list`}
          aria-autocomplete="list"
          aria-activedescendant={open && found[active] ? `${id}-option-${active}` : undefined}
          aria-invalid={error !== undefined}
          aria-describedby={described.filter(Boolean).join(' ') || undefined}
          autoComplete="off"
          spellCheck={false}
          placeholder={props.placeholder}
          value={words ?? shown}
          onChange={(event) => {
            setWords(event.target.value);
            setActive(0);
          }}
          onFocus={(event) => event.target.select()}
          onKeyDown={onKeyDown}
          onBlur={() => setWords(null)}
        />
        <ul
          id={`${id}-list`}
          role="listbox"
          aria-label="Choices"
          className="draft-search-list"
          hidden={!open}
        >
          {found.map((choice, i) => (
            <li
              key={choice.value}
              id={`${id}-option-${i}`}
              role="option"
              aria-selected={i === active}
              className={i === active ? 'draft-search-option active' : 'draft-search-option'}
              // The blur of the field comes before a click would.
              onMouseDown={(event) => {
                event.preventDefault();
                take(choice);
              }}
            >
              {choice.label}
              {choice.detail ? <span className="draft-search-detail">{choice.detail}</span> : null}
            </li>
          ))}
          {open && found.length === 0 ? (
            <li className="draft-search-option" role="option" aria-selected={false} aria-disabled>
              Nothing has all of these words.
            </li>
          ) : null}
        </ul>
      </div>
    </Field>
  );
}
