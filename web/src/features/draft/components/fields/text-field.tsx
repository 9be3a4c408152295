import type { ReactNode } from 'react';
import { Field, describedBy } from '../../../../shared/ui/fields/field';
import { draftFieldId } from '../../model/field-id';
import { useDraftTools } from '../draft-context';

interface TextFieldProps {
  /** Place in the definition; the control's id and its error come from it. */
  path: string;
  label: ReactNode;
  value: string;
  onChange: (value: string) => void;
  hint?: ReactNode;
  /** What is wrong, where the field itself knows better than the machine. */
  error?: string | undefined;
  /** Expressions and symbols: upright digits, no spelling marks. */
  code?: boolean;
  number?: boolean;
  disabled?: boolean;
  /** Id of a datalist with what may be meant. */
  list?: string;
  placeholder?: string;
}

/** One line of text. */
export function TextField(props: TextFieldProps) {
  const { path, label, value, onChange, hint, code = false, number = false, disabled, list } = props;
  const id = draftFieldId(path);
  const { problemAt } = useDraftTools();
  const error = props.error ?? problemAt(path)?.message;
  return (
    <Field id={id} label={label} hint={hint} error={error}>
      <input
        id={id}
        className={code || number ? 'draft-input draft-input-code' : 'draft-input'}
        value={value}
        disabled={disabled}
        list={list}
        placeholder={props.placeholder}
        autoComplete="off"
        autoCapitalize={code ? 'none' : undefined}
        spellCheck={code || number ? false : undefined}
        inputMode={number ? 'decimal' : undefined}
        onChange={(event) => onChange(event.target.value)}
        {...describedBy(id, { error, hint: hint !== undefined })}
      />
    </Field>
  );
}
