import { Link } from 'react-router-dom';
import type { Letter } from '../../../shared/api/types';
import { formatMinute } from '../../../shared/format/format-date';
import { letterState } from '../model/letter-state';
import { textWithLinks } from '../model/text-with-links';
import './outbox.css';

/** One letter as it was written. */
export function LetterText({ letter }: { letter: Letter }) {
  return (
    <div className="letter">
      <dl className="letter-head">
        <dt>To</dt>
        <dd>{letter.to}</dd>
        <dt>Written</dt>
        <dd>
          <time dateTime={letter.at}>{formatMinute(letter.at)}</time>, {letterState(letter)}
        </dd>
        {letter.lastError ? (
          <>
            <dt>Last answer</dt>
            <dd>{letter.lastError}</dd>
          </>
        ) : null}
      </dl>
      <div className="letter-body">
        {textWithLinks(letter.body.trim(), window.location.origin).map(({ text, to }, i) =>
          to === null ? (
            text
          ) : (
            <Link key={i} to={to}>
              {text}
            </Link>
          ),
        )}
      </div>
    </div>
  );
}
