import { useState } from 'react';
import type { ListedPerson } from '../../../shared/api/types';
import { formatDay } from '../../../shared/format/format-date';
import { FormSummary } from '../../../shared/form/form-summary';
import { useFormAct, type FieldErrors } from '../../../shared/form/use-form-act';
import { ActDialog } from '../../../shared/ui/act-dialog';
import { CheckList } from '../../../shared/ui/fields/check-list';
import { ChoiceField } from '../../../shared/ui/fields/choice-field';
import { ChoiceList } from '../../../shared/ui/fields/choice-list';
import { describedBy, Field } from '../../../shared/ui/fields/field';
import { TextInput } from '../../../shared/ui/fields/text-input';
import { proposeAppointment } from '../api/use-appointments';
import { lastDayError, lastDays } from '../model/last-day';
import type { GeometryName } from '../model/scope-words';

const IDS = { person: 'propose-person', geometries: 'propose-geometries', until: 'propose-until' };

type Reach = 'all' | 'some';
const REACHES: readonly { value: Reach; label: string; hint?: string }[] = [
  { value: 'all', label: 'All geometries', hint: 'property equations, too' },
  { value: 'some', label: 'Only some geometries' },
];

interface ProposeDialogProps {
  candidates: readonly ListedPerson[];
  geometries: readonly GeometryName[];
  onDone: (words: string) => void;
  onLeave: () => void;
}

/** Person, geometries and last day of a technical authority to be. */
export function ProposeDialog({ candidates, geometries, onDone, onLeave }: ProposeDialogProps) {
  const [person, setPerson] = useState('');
  const [reach, setReach] = useState<Reach | null>(null);
  const [chosen, setChosen] = useState<string[]>([]);
  const [until, setUntil] = useState('');
  const form = useFormAct({
    find: (): FieldErrors => ({
      person: person ? undefined : 'Choose whom to propose.',
      geometries: scopeError(reach, chosen),
      until: lastDayError(until, new Date()),
    }),
    act: async () => {
      const proposed = await proposeAppointment({
        person,
        geometries: reach === 'all' ? 'all' : chosen,
        until,
      });
      onDone(
        `${proposed.person.name} is proposed until ${formatDay(until)}. A second person has to confirm it.`,
      );
    },
  });
  const { errors } = form;
  const { first, last } = lastDays(new Date());
  return (
    <ActDialog
      title="Propose a technical authority"
      act="Propose"
      leave="Leave it"
      working={form.working}
      onAct={form.send}
      onLeave={onLeave}
    >
      <FormSummary title="Nobody was proposed yet" form={form} ids={IDS} />
      <ChoiceField
        id={IDS.person}
        label="Person"
        value={person}
        choices={[
          { value: '', label: 'choose somebody' },
          ...candidates.map(({ id, name }) => ({ value: id, label: name })),
        ]}
        hint="Administrators are not listed: they have no say on content."
        error={errors['person']}
        onChange={setPerson}
      />
      <ChoiceList
        id={IDS.geometries}
        legend="For"
        choices={REACHES}
        value={reach}
        error={errors['geometries']}
        onChange={setReach}
      />
      {reach === 'some' ? (
        <div className="propose-geometries">
          <CheckList
            id={`${IDS.geometries}-chosen`}
            legend={`Geometries${chosen.length > 0 ? `, ${chosen.length} chosen` : ''}`}
            choices={geometries.map(({ slug, name }) => ({ value: slug, label: name }))}
            chosen={chosen}
            onChange={setChosen}
          />
        </div>
      ) : null}
      <Field id={IDS.until} label="Last day" hint="Ten years at most." error={errors['until']}>
        <TextInput
          id={IDS.until}
          type="date"
          min={first}
          max={last}
          value={until}
          onChange={setUntil}
          {...describedBy(IDS.until, { error: errors['until'], hint: true })}
        />
      </Field>
    </ActDialog>
  );
}

function scopeError(reach: Reach | null, chosen: readonly string[]): string | undefined {
  if (reach === null) return 'Say whether it is for all geometries or for some.';
  return reach === 'some' && chosen.length === 0 ? 'Choose at least one geometry.' : undefined;
}
