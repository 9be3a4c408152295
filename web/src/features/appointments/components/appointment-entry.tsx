import { Button } from 'antd';
import type { Appointment } from '../../../shared/api/types';
import { formatDay } from '../../../shared/format/format-date';
import { scopeWords, type GeometryName } from '../model/scope-words';

interface AppointmentEntryProps {
  appointment: Appointment;
  geometries: readonly GeometryName[] | undefined;
  onConfirm: () => void;
  onEnd: () => void;
}

/** One appointment: who, for what, until when, by whom, and what can be done with it. */
export function AppointmentEntry({ appointment, geometries, onConfirm, onEnd }: AppointmentEntryProps) {
  const { person, until, state, abilities, endReason } = appointment;
  return (
    <li className="appointment">
      <div>
        <h3>{person.name}</h3>
        <p>
          For {scopeWords(appointment.geometries, geometries)}, until{' '}
          <time dateTime={until}>{formatDay(until)}</time>.
        </p>
        <p className="appointment-steps">{stepsWords(appointment)}</p>
        {endReason ? <p className="appointment-steps">Reason: {endReason}</p> : null}
      </div>
      {abilities.confirm || abilities.end ? (
        <div className="appointment-acts">
          {abilities.confirm ? (
            <Button
              size="small"
              type="primary"
              aria-label={`Confirm the appointment of ${person.name}`}
              onClick={onConfirm}
            >
              Confirm
            </Button>
          ) : null}
          {abilities.end ? (
            <Button
              size="small"
              aria-label={
                state === 'proposed'
                  ? `Take back the proposal of ${person.name}`
                  : `End the appointment of ${person.name}`
              }
              onClick={onEnd}
            >
              {state === 'proposed' ? 'Take back' : 'End'}
            </Button>
          ) : null}
        </div>
      ) : null}
    </li>
  );
}

function stepsWords({ state, proposed, confirmed, ended }: Appointment): string {
  const steps = [`Proposed by ${proposed.by.name} on ${formatDay(proposed.at)}`];
  steps.push(
    confirmed ? `confirmed by ${confirmed.by.name} on ${formatDay(confirmed.at)}` : 'never confirmed',
  );
  if (state === 'proposed') steps[1] = 'waits to be confirmed';
  if (ended) steps.push(`ended by ${ended.by.name} on ${formatDay(ended.at)}`);
  else if (state === 'ended') steps.push('ended with its last day');
  return `${steps.join('; ')}.`;
}
