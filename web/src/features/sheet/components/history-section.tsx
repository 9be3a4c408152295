import { memo } from 'react';
import { Link } from 'react-router-dom';
import type { Sheet } from '../../../shared/api/types';
import { formatDay } from '../../../shared/format/format-date';
import { paths } from '../../../shared/paths';
import { MarginNote } from '../../../shared/ui/margin-note';
import { shortHash } from '../../../shared/ui/running-head';
import { SetTable } from '../../../shared/ui/set-table';
import { MarginRow } from '../../../shared/ui/sheet-page';
import { StandingWord } from '../../../shared/ui/standing-word';
import '../../../shared/ui/on-sheet/symbol-note.css';

const VERDICTS: Readonly<Record<Sheet['reviews'][number]['verdict'], string>> = {
  recommend: 'recommends it',
  'ask-for-changes': 'asks for changes',
  decline: 'advises against it',
};

/** Revisions with their standing, what happened to this one, and who reviewed it. */
export const HistorySection = memo(function HistorySection({ sheet }: { sheet: Sheet }) {
  return (
    <MarginRow heading={<h2>History</h2>} notes={<HistoryNotes sheet={sheet} />}>
      <SetTable label="Revisions">
        <thead>
          <tr>
            <th scope="col">Revision</th>
            <th scope="col">Standing</th>
            <th scope="col">Since</th>
            <th scope="col">Content</th>
            <th scope="col">Compare</th>
          </tr>
        </thead>
        <tbody>
          {sheet.revisions.map(({ number, standing, hash, at }) => (
            <tr key={number}>
              <th scope="row">
                {number === sheet.revision ? (
                  <span aria-current="true">rev {number}, this one</span>
                ) : (
                  <Link to={paths.revision(sheet.slug, number)}>rev {number}</Link>
                )}
              </th>
              <td>
                <StandingWord standing={standing} />
              </td>
              <td>{formatDay(at)}</td>
              <td>{shortHash(hash)}</td>
              <td>
                {number === sheet.revision ? null : (
                  <Link
                    to={paths.differences(
                      sheet.slug,
                      Math.min(number, sheet.revision),
                      Math.max(number, sheet.revision),
                    )}
                  >
                    differences<span className="heard-only"> between rev {number} and this one</span>
                  </Link>
                )}
              </td>
            </tr>
          ))}
        </tbody>
      </SetTable>
      <ol className="history">
        {sheet.history.map(({ standing, at, by, note }) => (
          <li key={`${at}${standing}`}>
            {formatDay(at)}: <StandingWord standing={standing} />, {by.name}
            {note ? <span className="symbol-note">{note}</span> : null}
          </li>
        ))}
      </ol>
    </MarginRow>
  );
});

function HistoryNotes({ sheet }: { sheet: Sheet }) {
  const { evaluations, calculations } = sheet.usage;
  return (
    <>
      <MarginNote title="Used in">
        {`${count(calculations, 'calculation')}, ${count(evaluations, 'kept evaluation')}.`}
      </MarginNote>
      <MarginNote title="Originator">{sheet.originator.name}</MarginNote>
      {sheet.reviews.map(({ reviewer, verdict, at, note }) => (
        <MarginNote key={`${reviewer.id}${at}`} title="Reviewed">
          {reviewer.name} {VERDICTS[verdict]}, {formatDay(at)}.{note ? ` ${note}` : ''}
        </MarginNote>
      ))}
    </>
  );
}

function count(number: number, noun: string): string {
  return `${number} ${noun}${number === 1 ? '' : 's'}`;
}
