import { Fragment } from 'react';
import { Link } from 'react-router-dom';
import type { ListedCorrelation } from '../../../shared/api/types';
import { authorWords } from '../../../shared/format/author-words';
import { paths } from '../../../shared/paths';
import { SmallBoundStrip } from '../../../shared/ui/bound-strip/bound-strip';
import { rangeWords } from '../../../shared/ui/bound-strip/strip-words';
import { MarkedText } from '../../../shared/ui/marked-text';
import { StandingWord } from '../../../shared/ui/standing-word';
import { SymbolMark } from '../../../shared/ui/symbol-mark';
import { titleBesideAuthors } from '../model/title-beside-authors';
import { REYNOLDS_AXIS, boundOfRow } from '../model/strip-of-row';

/** One correlation: what it was measured on, whose it is, where it holds, how it stands. */
export function RegisterRow({ item, withGeometry }: { item: ListedCorrelation; withGeometry: boolean }) {
  return (
    <tr role="row">
      {withGeometry ? (
        <td role="cell" className="register-geometry">
          <Link to={paths.geometry(item.geometry)}>{item.geometryName}</Link>
        </td>
      ) : null}
      <th role="rowheader" scope="row" className="register-correlation">
        <Link to={paths.sheet(item.slug)}>
          {authorWords(item.authors)}
          {item.year === null ? '' : ` (${item.year})`}
        </Link>
        <span className="register-title">
          <MarkedText text={titleBesideAuthors(item)} />
        </span>
      </th>
      <td role="cell" className="register-strip">
        <RowBound item={item} />
      </td>
      <td role="cell" className="register-standing">
        <StandingWord standing={item.standing} />
        <span className="register-revision">rev {item.revision}</span>
      </td>
    </tr>
  );
}

/** Where the correlation holds: its Reynolds number drawn, or the symbols that are bounded instead. */
export function RowBound({ item }: { item: ListedCorrelation }) {
  const row = boundOfRow(item);
  if (row.kind === 'others') return <OtherBounds symbols={row.symbols} />;
  const { symbol, name, stretches } = row.bound;
  return (
    <>
      <SmallBoundStrip label={`${name}, ${symbol}`} stretches={stretches} axis={REYNOLDS_AXIS} />
      <span className="register-range" aria-hidden="true">
        <SymbolMark symbol={symbol} /> {rangeWords(stretches)}
      </span>
    </>
  );
}

const MOST_SYMBOLS = 4;

function OtherBounds({ symbols }: { symbols: readonly string[] }) {
  if (symbols.length === 0) return <span className="register-no-strip">no bound stated</span>;
  return (
    <span className="register-no-strip">
      bounded in{' '}
      {symbols.slice(0, MOST_SYMBOLS).map((symbol, index) => (
        <Fragment key={symbol}>
          {index > 0 ? ', ' : ''}
          <SymbolMark symbol={symbol} />
        </Fragment>
      ))}
      {symbols.length > MOST_SYMBOLS ? ' …' : ''}
    </span>
  );
}
