import type { ReactNode } from 'react';
import { Field, describedBy } from '../../../../shared/ui/fields/field';
import { draftFieldId } from '../../model/field-id';
import { useDraftTools } from '../draft-context';

interface LongTextFieldProps {
  path: string;
  label: ReactNode;
  value: string;
  onChange: (value: string) => void;
  hint?: ReactNode;
  rows?: number;
}

/** Several lines of text; the box grows with them where the browser can. */
export function LongTextField({ path, label, value, onChange, hint, rows = 2 }: LongTextFieldProps) {
  const id = draftFieldId(path);
  const error = useDraftTools().problemAt(path)?.message;
  return (
    <Field id={id} label={label} hint={hint} error={error}>
      <textarea
        id={id}
        className="draft-input draft-input-long"
        rows={rows}
        value={value}
        onChange={(event) => onChange(event.target.value)}
        {...describedBy(id, { error, hint: hint !== undefined })}
      />
    </Field>
  );
}
