import { draftFieldId } from '../model/field-id';
import { useDraftTools } from './draft-context';

interface ValueCellProps {
  path: string;
  /** Heard, not seen: the line's place says it to the eye. */
  label: string;
  value: string;
  number?: boolean;
  list?: string;
  placeholder?: string;
  onChange: (value: string) => void;
}

/** A field in a line of several, its error under it. */
export function ValueCell({
  path,
  label,
  value,
  number = false,
  list,
  placeholder,
  onChange,
}: ValueCellProps) {
  const id = draftFieldId(path);
  const error = useDraftTools().problemAt(path)?.message;
  return (
    <div className="draft-value-cell">
      <input
        id={id}
        className="draft-input draft-input-code"
        aria-label={label}
        aria-invalid={error !== undefined}
        aria-describedby={error ? `${id}-error` : undefined}
        value={value}
        list={list}
        placeholder={placeholder}
        autoComplete="off"
        autoCapitalize="none"
        spellCheck={false}
        inputMode={number ? 'decimal' : undefined}
        onChange={(event) => onChange(event.target.value)}
      />
      {error ? (
        <p className="field-error" id={`${id}-error`}>
          {error}
        </p>
      ) : null}
    </div>
  );
}
