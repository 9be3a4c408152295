import type { ManagedPerson } from '../../../shared/api/types';
import { ReasonDialog } from '../../../shared/form/reason-dialog';
import { deactivatePerson, reactivatePerson } from '../api/manage-people';
import { ChangeDialog } from './change-dialog';
import type { PersonAct } from './people-table';

interface PersonDialogProps {
  act: PersonAct;
  person: ManagedPerson;
  /** Told in words what was done. */
  onDone: (words: string) => void;
  onLeave: () => void;
}

/** Asks what an act on one person needs. */
export function PersonDialog({ act, person, onDone, onLeave }: PersonDialogProps) {
  const { id, name } = person;
  switch (act) {
    case 'deactivate':
      return (
        <ReasonDialog
          title={`Deactivate ${name}`}
          act="Deactivate"
          about={`deactivate:${id}`}
          notDone="Nobody was deactivated yet"
          onLeave={onLeave}
          onAct={async (reason) => {
            await deactivatePerson(id, reason);
            onDone(`${name} is inactive now; open sessions have ended.`);
          }}
        >
          <p>
            {name} is shut out at once: open sessions and any appointment end. Everything on record stays, and
            the person can be made active again.
          </p>
        </ReasonDialog>
      );
    case 'reactivate':
      return (
        <ReasonDialog
          title={`Reactivate ${name}`}
          act="Reactivate"
          about={`reactivate:${id}`}
          notDone="Nobody was reactivated yet"
          onLeave={onLeave}
          onAct={async (reason) => {
            await reactivatePerson(id, reason);
            onDone(`${name} is active again.`);
          }}
        >
          <p>
            {name} can sign in again with the password held before. An appointment that ended stays ended.
          </p>
        </ReasonDialog>
      );
    case 'change':
      return (
        <ChangeDialog
          person={person}
          onChanged={(changed) => onDone(`What was changed for ${changed.name} is kept.`)}
          onLeave={onLeave}
        />
      );
    case 'resend':
      return null;
  }
}
