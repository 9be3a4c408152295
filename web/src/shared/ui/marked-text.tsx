import { Fragment } from 'react';
import { SymbolMark } from './symbol-mark';

const SYMBOL = '(?<![A-Za-z0-9_])[A-Za-z]{1,8}_[A-Za-z0-9]{1,8}(?![A-Za-z0-9_])';
const POWER = '(?<=[A-Za-z0-9)])\\^(?:-?\\d+(?:\\.\\d+)?|\\([^()]{1,12}\\))';
const MARKS = new RegExp(`(${SYMBOL}|${POWER})`);

/** A sentence of a sheet with its symbols (`p_BM`) and powers (`Sc^(1/3)`) set as such. */
export function MarkedText({ text }: { text: string }) {
  return text.split(MARKS).map((piece, i) => {
    if (i % 2 === 0) return <Fragment key={i}>{piece}</Fragment>;
    return piece.startsWith('^') ? (
      <sup key={i}>{piece.replace(/^\^\(?|\)$/g, '').replace(/^-/, '\u2212')}</sup>
    ) : (
      <SymbolMark key={i} symbol={piece} />
    );
  });
}
