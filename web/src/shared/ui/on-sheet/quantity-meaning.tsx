import { QUANTITIES, type Quantity } from '@merestone/engine';
import { quantityWords } from '../../format/quantity-words';
import './symbol-note.css';

/** What a quantity stands for on its sheet: the dictionary's name, the state, and what else must be known of it. */
export function QuantityMeaning({ quantity }: { quantity: Quantity }) {
  const hint = quantity.meaning ?? QUANTITIES[quantity.is]?.hint;
  const notes = [hint, roleWords(quantity)].filter(Boolean);
  return (
    <>
      {quantityWords(quantity)}
      {notes.length > 0 ? <span className="symbol-note">{notes.join(' ')}</span> : null}
    </>
  );
}

function roleWords({ role, table }: Quantity): string | undefined {
  if (role === 'characteristic-length') return 'The characteristic length.';
  if (role === 'state') return 'Serves property equations, bounds and other bases.';
  return table ? `From the table of ${table.replaceAll('-', ' ')}s, or given.` : undefined;
}
