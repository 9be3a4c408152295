import { Link } from 'react-router-dom';
import type { Letter } from '../../../shared/api/types';
import { formatMinute } from '../../../shared/format/format-date';
import { paths } from '../../../shared/paths';
import { letterState } from '../model/letter-state';
import './outbox.css';

/** Letters by subject, each leading to its text. */
export function LetterList({ letters }: { letters: readonly Letter[] }) {
  return (
    <ul className="letters">
      {letters.map((letter) => (
        <li key={letter.id} className="letter-line">
          <Link className="letter-subject" to={paths.letter(letter.id)}>
            {letter.subject}
          </Link>
          <span className="letter-to">to {letter.to}</span>
          <span className="letter-note">
            <time dateTime={letter.at}>{formatMinute(letter.at)}</time>, {letterState(letter)}
          </span>
        </li>
      ))}
    </ul>
  );
}
