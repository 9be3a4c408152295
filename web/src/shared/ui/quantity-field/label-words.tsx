import type { ReactNode } from 'react';

/** A field's words and its symbol; the symbol is never left alone at the start of a line. */
export function LabelWords({ label, symbol }: { label: string; symbol?: ReactNode }) {
  if (!symbol) return label;
  const words = label.split(' ');
  const last = words.pop() ?? '';
  return (
    <>
      {words.length > 0 ? `${words.join(' ')} ` : ''}
      <span className="quantity-label-end">
        {last}, {symbol}
      </span>
    </>
  );
}
