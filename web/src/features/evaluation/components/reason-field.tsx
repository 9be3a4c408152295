import { Input } from 'antd';
import { MIN_REASON } from '../model/reason-error';

interface ReasonFieldProps {
  id: string;
  label: string;
  value: string;
  error: string | null;
  onChange: (value: string) => void;
}

/** A written reason with its count of characters. */
export function ReasonField({ id, label, value, error, onChange }: ReasonFieldProps) {
  const { length } = value.trim();
  const described = [`${id}-count`, error ? `${id}-error` : null].filter(Boolean).join(' ');
  return (
    <div className={error ? 'quantity quantity-wrong' : 'quantity'}>
      <label className="quantity-label" htmlFor={id}>
        {label}
      </label>
      <Input.TextArea
        id={id}
        value={value}
        autoSize={{ minRows: 2, maxRows: 8 }}
        aria-invalid={error !== null}
        aria-describedby={described}
        onChange={(event) => onChange(event.target.value)}
      />
      <div className="quantity-words">
        {error ? (
          <p className="quantity-error" id={`${id}-error`}>
            {error}
          </p>
        ) : null}
        <p className="quantity-hint" id={`${id}-count`}>
          {length < MIN_REASON ? `${length} of at least ${MIN_REASON} characters` : `${length} characters`}
        </p>
      </div>
    </div>
  );
}
