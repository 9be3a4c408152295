import { Link } from 'react-router-dom';
import type { JournalEntry } from '../../../shared/api/types';
import { formatMinute } from '../../../shared/format/format-date';
import { SetTable } from '../../../shared/ui/set-table';
import { actWords } from '../model/act-words';
import { subjectOf } from '../model/subject-of';
import './journal.css';

/** Entries as sentences, with when and the start of each one's hash. */
export function JournalTable({ entries }: { entries: readonly JournalEntry[] }) {
  return (
    <SetTable label="Journal entries">
      <thead>
        <tr>
          <th scope="col" className="journal-number">
            No.
          </th>
          <th scope="col">When</th>
          <th scope="col">Who did what</th>
          <th scope="col">Leaf</th>
        </tr>
      </thead>
      <tbody>
        {entries.map((entry) => (
          <tr key={entry.index}>
            <td className="journal-number">{entry.index}</td>
            <td className="journal-when">
              <time dateTime={entry.at}>{formatMinute(entry.at)}</time>
            </td>
            <td>
              <Sentence entry={entry} />
              <Subject entry={entry} />
            </td>
            <td className="journal-leaf" title={entry.leaf}>
              {entry.leaf.slice(0, 8)}
            </td>
          </tr>
        ))}
      </tbody>
    </SetTable>
  );
}

function Subject({ entry }: { entry: JournalEntry }) {
  const subject = subjectOf(entry);
  if (!subject) return null;
  return (
    <span className="journal-subject">
      {subject.to ? <Link to={subject.to}>{subject.words}</Link> : subject.words}
    </span>
  );
}

function Sentence({ entry }: { entry: JournalEntry }) {
  // Whoever was refused has no name here: only an address was given.
  if (entry.act === 'session.refused') return <>A sign-in was refused</>;
  return (
    <>
      <strong>{entry.actor.name}</strong> {actWords(entry.act)}
    </>
  );
}
