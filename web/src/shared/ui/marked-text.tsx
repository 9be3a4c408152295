import { Fragment } from 'react';
import { SymbolMark } from './symbol-mark';

const SYMBOL = /(?<![A-Za-z0-9_])([A-Za-z]{1,8}_[A-Za-z0-9]{1,8})(?![A-Za-z0-9_])/;

/** A sentence of a sheet with its symbols (`p_BM`) set as symbols. */
export function MarkedText({ text }: { text: string }) {
  return text
    .split(SYMBOL)
    .map((piece, i) =>
      i % 2 === 1 ? <SymbolMark key={i} symbol={piece} /> : <Fragment key={i}>{piece}</Fragment>,
    );
}
