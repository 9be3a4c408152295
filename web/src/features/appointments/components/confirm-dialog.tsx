import { useState } from 'react';
import type { Appointment } from '../../../shared/api/types';
import { formatDay } from '../../../shared/format/format-date';
import { FormSummary } from '../../../shared/form/form-summary';
import { useFormAct } from '../../../shared/form/use-form-act';
import { ActDialog } from '../../../shared/ui/act-dialog';
import { PasswordField } from '../../../shared/ui/fields/password-field';
import { confirmAppointment } from '../api/use-appointments';
import { scopeWords, type GeometryName } from '../model/scope-words';

const PASSWORD = 'confirm-password';

interface ConfirmDialogProps {
  appointment: Appointment;
  geometries: readonly GeometryName[] | undefined;
  onDone: (words: string) => void;
  onLeave: () => void;
}

/** The second signature under an appointment: what it means is said, and the password is asked for. */
export function ConfirmDialog({ appointment, geometries, onDone, onLeave }: ConfirmDialogProps) {
  const { id, person, until, proposed } = appointment;
  const [password, setPassword] = useState('');
  const form = useFormAct({
    find: () => ({ password: password ? undefined : 'Write your password.' }),
    act: async () => {
      await confirmAppointment(id, password);
      onDone(`${person.name} is a technical authority until ${formatDay(until)}.`);
    },
  });
  return (
    <ActDialog
      title={`Confirm the appointment of ${person.name}`}
      act="Sign and confirm"
      working={form.working}
      onAct={form.send}
      onLeave={onLeave}
    >
      <p>
        {proposed.by.name} proposed {person.name} for {scopeWords(appointment.geometries, geometries)}, until{' '}
        {formatDay(until)}. With your signature {person.name} may approve, suspend and withdraw sheets within
        that. Your name and the time stand on record.
      </p>
      <FormSummary title="Nothing was confirmed yet" form={form} ids={{ password: PASSWORD }} />
      <PasswordField
        id={PASSWORD}
        label="Password"
        autoComplete="current-password"
        hint="Your own, once more: this is a signature."
        value={password}
        onChange={setPassword}
        error={form.errors['password']}
      />
    </ActDialog>
  );
}
