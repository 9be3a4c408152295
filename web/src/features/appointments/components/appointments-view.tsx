import { Button } from 'antd';
import { useState } from 'react';
import type { Appointment, ListedPerson } from '../../../shared/api/types';
import { ReasonDialog } from '../../../shared/form/reason-dialog';
import { DoneNote } from '../../../shared/ui/done-note';
import { EmptyState } from '../../../shared/ui/empty-state';
import { endAppointment } from '../api/use-appointments';
import type { GeometryName } from '../model/scope-words';
import { AppointmentEntry } from './appointment-entry';
import { ConfirmDialog } from './confirm-dialog';
import { ProposeDialog } from './propose-dialog';
import './appointments.css';

interface AppointmentsViewProps {
  appointments: readonly Appointment[];
  geometries: readonly GeometryName[] | undefined;
  /** Those who could be proposed; null for who may not propose. */
  candidates: readonly ListedPerson[] | null;
  refetch: () => Promise<unknown>;
}

type Open = { act: 'propose' } | { act: 'confirm' | 'end'; appointment: Appointment };

const SECTIONS: readonly { state: Appointment['state']; heading: string }[] = [
  { state: 'proposed', heading: 'Proposed, to be confirmed' },
  { state: 'current', heading: 'Technical authorities now' },
  { state: 'ended', heading: 'Ended' },
];

/** Appointments by how they stand, and the three acts on them. */
export function AppointmentsView({ appointments, geometries, candidates, refetch }: AppointmentsViewProps) {
  const [open, setOpen] = useState<Open | null>(null);
  const [done, setDone] = useState('');
  const finish = (words: string) => {
    setOpen(null);
    setDone(words);
    void refetch();
  };
  const start = (what: Open) => {
    setDone('');
    setOpen(what);
  };
  return (
    <>
      {candidates ? (
        <p className="appointments-start">
          <Button type="primary" onClick={() => start({ act: 'propose' })}>
            Propose a technical authority
          </Button>
        </p>
      ) : null}
      <DoneNote words={done} />
      {appointments.length === 0 ? (
        <EmptyState title="Nobody is appointed yet">
          <p>
            Technical authorities would stand here, with the geometries they decide on and until when. An
            administrator proposes the first.
          </p>
        </EmptyState>
      ) : null}
      {SECTIONS.map(({ state, heading }) => {
        const listed = appointments.filter((appointment) => appointment.state === state);
        return listed.length === 0 ? null : (
          <section key={state}>
            <h2>{heading}</h2>
            <ul className="appointments">
              {listed.map((appointment) => (
                <AppointmentEntry
                  key={appointment.id}
                  appointment={appointment}
                  geometries={geometries}
                  onConfirm={() => start({ act: 'confirm', appointment })}
                  onEnd={() => start({ act: 'end', appointment })}
                />
              ))}
            </ul>
          </section>
        );
      })}
      {open?.act === 'propose' ? (
        <ProposeDialog
          candidates={candidates ?? []}
          geometries={geometries ?? []}
          onDone={finish}
          onLeave={() => setOpen(null)}
        />
      ) : null}
      {open?.act === 'confirm' ? (
        <ConfirmDialog
          appointment={open.appointment}
          geometries={geometries}
          onDone={finish}
          onLeave={() => setOpen(null)}
        />
      ) : null}
      {open?.act === 'end' ? (
        <EndDialog appointment={open.appointment} onDone={finish} onLeave={() => setOpen(null)} />
      ) : null}
    </>
  );
}

interface EndDialogProps {
  appointment: Appointment;
  onDone: (words: string) => void;
  onLeave: () => void;
}

function EndDialog({ appointment: { id, person, state }, onDone, onLeave }: EndDialogProps) {
  const proposed = state === 'proposed';
  return (
    <ReasonDialog
      title={proposed ? `Take back the proposal of ${person.name}` : `End the appointment of ${person.name}`}
      act={proposed ? 'Take it back' : 'End the appointment'}
      about={`end-appointment:${id}`}
      notDone={proposed ? 'The proposal still stands' : 'The appointment still stands'}
      onLeave={onLeave}
      onAct={async (reason) => {
        await endAppointment(id, reason);
        onDone(
          proposed
            ? `The proposal of ${person.name} is taken back.`
            : `The appointment of ${person.name} has ended.`,
        );
      }}
    >
      <p>
        {proposed
          ? 'A proposal that was taken back cannot be confirmed any more; another can be made.'
          : 'From now on no approval can be signed under it. Approvals that were given stay as they are.'}
      </p>
    </ReasonDialog>
  );
}
