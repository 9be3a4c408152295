import { Button } from 'antd';
import type { ReactNode } from 'react';
import type { ManagedPerson } from '../../../shared/api/types';
import { formatMinute } from '../../../shared/format/format-date';
import { inWords } from '../../../shared/format/in-words';
import { roleWords } from '../../../shared/format/role-words';

export type PersonAct = 'change' | 'deactivate' | 'reactivate' | 'resend';

const ACT_WORDS: Readonly<Record<PersonAct, string>> = {
  change: 'Change',
  deactivate: 'Deactivate',
  reactivate: 'Reactivate',
  resend: 'Send again',
};

interface PeopleTableProps {
  heading: string;
  people: readonly ManagedPerson[];
  /** What can be done with one of them. */
  actsOn: (person: ManagedPerson) => readonly PersonAct[];
  /** The person whose invitation is on its way again. */
  sending: string | null;
  onAct: (act: PersonAct, person: ManagedPerson) => void;
}

/** People who stand alike, each with address, roles, last sign-in and what can be done. */
export function PeopleTable({ heading, people, actsOn, sending, onAct }: PeopleTableProps) {
  if (people.length === 0) return null;
  return (
    <section>
      <h2>{heading}</h2>
      <table className="people-table" aria-label={heading}>
        <thead>
          <tr>
            <th scope="col">Name</th>
            <th scope="col">Roles</th>
            <th scope="col">Last sign-in</th>
            <th scope="col">
              <span className="heard-only">Acts</span>
            </th>
          </tr>
        </thead>
        <tbody>
          {people.map((person) => (
            <tr key={person.id}>
              <th scope="row">
                <span className="people-name">{person.name}</span>
                <span className="people-note">{person.email}</span>
              </th>
              <td>{person.roles.length > 0 ? inWords(person.roles.map(roleWords)) : 'none'}</td>
              <td className="people-since">{lastSeen(person)}</td>
              <td>
                <div className="people-acts">
                  {actsOn(person).map((act) => (
                    <Button
                      key={act}
                      type="link"
                      size="small"
                      loading={act === 'resend' && sending === person.id}
                      aria-label={`${ACT_WORDS[act]}: ${person.name}`}
                      onClick={() => onAct(act, person)}
                    >
                      {ACT_WORDS[act]}
                    </Button>
                  ))}
                </div>
              </td>
            </tr>
          ))}
        </tbody>
      </table>
    </section>
  );
}

function lastSeen({ invited, lastSignIn }: ManagedPerson): ReactNode {
  if (lastSignIn !== null)
    return (
      <>
        <span className="people-since-word">Last sign-in </span>
        <time dateTime={lastSignIn}>{formatMinute(lastSignIn)}</time>
      </>
    );
  return invited ? 'has not joined yet' : 'has not signed in yet';
}
