import { Button } from 'antd';
import { useState } from 'react';
import type { ListedPerson, ManagedPerson } from '../../../shared/api/types';
import { useAct } from '../../../shared/hooks/use-act';
import { DoneNote } from '../../../shared/ui/done-note';
import { ProblemNotice } from '../../../shared/ui/problem-notice';
import { invitePerson } from '../api/manage-people';
import { managedPeople } from '../model/managed-people';
import { InviteDialog } from './invite-dialog';
import { PeopleTable, type PersonAct } from './people-table';
import { PersonDialog } from './person-dialog';
import './people.css';

interface PeopleViewProps {
  people: readonly ListedPerson[];
  /** Who looks at it: nobody shuts themselves out. */
  ownId: string;
  refetch: () => Promise<unknown>;
}

/** Everybody by how they stand, and what an administrator can do with them. */
export function PeopleView({ people, ownId, refetch }: PeopleViewProps) {
  const { here, invited, inactive } = managedPeople(people);
  const [inviting, setInviting] = useState(false);
  const [open, setOpen] = useState<{ act: PersonAct; person: ManagedPerson } | null>(null);
  const [done, setDone] = useState('');
  const resend = useResending();

  const finish = (words: string) => {
    setInviting(false);
    setOpen(null);
    setDone(words);
    void refetch();
  };
  const start = (act: PersonAct, person: ManagedPerson) => {
    setDone('');
    if (act === 'resend')
      void resend.send(person).then((sent) => {
        if (sent) finish(`A new letter to ${person.email} is on its way. The former link is void.`);
      });
    else setOpen({ act, person });
  };
  const table = { sending: resend.sending, onAct: start };
  return (
    <>
      <div className="people-start">
        <Button
          type="primary"
          onClick={() => {
            setDone('');
            setInviting(true);
          }}
        >
          Invite somebody
        </Button>
      </div>
      <DoneNote words={done} />
      {resend.problem ? <ProblemNotice problem={resend.problem} /> : null}
      <PeopleTable
        {...table}
        heading="Invited, not joined yet"
        people={invited}
        actsOn={() => ['resend', 'change', 'deactivate']}
      />
      <PeopleTable
        {...table}
        heading="Here"
        people={here}
        actsOn={({ id }) => (id === ownId ? ['change'] : ['change', 'deactivate'])}
      />
      <PeopleTable {...table} heading="Inactive" people={inactive} actsOn={() => ['reactivate']} />
      {inviting ? (
        <InviteDialog
          onInvited={({ name, email }) => finish(`${name} is invited; the letter to ${email} is on its way.`)}
          onLeave={() => setInviting(false)}
        />
      ) : null}
      {open ? (
        <PersonDialog act={open.act} person={open.person} onDone={finish} onLeave={() => setOpen(null)} />
      ) : null}
    </>
  );
}

/** The same invitation once more. */
function useResending() {
  const { problem, working, run } = useAct();
  const [to, setTo] = useState<string | null>(null);
  const send = ({ id, name, email, roles }: ManagedPerson): Promise<boolean> => {
    setTo(id);
    return run(() => invitePerson({ name, email, roles }));
  };
  return { sending: working ? to : null, problem, send };
}
