import { Fragment } from 'react';
import { FindingSymbol } from './finding-symbol';

/** What is left to the engineer, where the sheet has no bound for some symbols. */
export function UnboundedNote({ symbols }: { symbols: readonly string[] }) {
  if (symbols.length === 0) return null;
  return (
    <p>
      No bound is on record for{' '}
      {symbols.map((symbol, i) => (
        <Fragment key={symbol}>
          {separator(i, symbols.length)}
          <FindingSymbol symbol={symbol} />
        </Fragment>
      ))}
      : whether the sheet holds here is the engineer&rsquo;s to judge.
    </p>
  );
}

function separator(i: number, count: number): string {
  if (i === 0) return '';
  return i === count - 1 ? ' and ' : ', ';
}
