import { symbolParts } from '../format/symbol-parts';

/** A symbol set in running text where typeset mathematics would weigh too much: quantities italic, groups upright. */
export function SymbolMark({ symbol }: { symbol: string }) {
  const { body, subscript, upright } = symbolParts(symbol);
  return (
    <span style={{ whiteSpace: 'nowrap' }}>
      {upright ? body : <i>{body}</i>}
      {subscript === null ? null : <sub style={{ fontSize: '0.72em', lineHeight: 0 }}>{subscript}</sub>}
    </span>
  );
}
