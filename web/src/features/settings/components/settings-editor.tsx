import { Button } from 'antd';
import { useState } from 'react';
import type { ListedPerson, Settings, SettingsChange } from '../../../shared/api/types';
import { FormSummary } from '../../../shared/form/form-summary';
import { useFormAct } from '../../../shared/form/use-form-act';
import { DoneNote } from '../../../shared/ui/done-note';
import { ChoiceField } from '../../../shared/ui/fields/choice-field';
import { describedBy, Field } from '../../../shared/ui/fields/field';
import { TextInput } from '../../../shared/ui/fields/text-input';
import { changeOf, formOf, REVIEWS_NEEDED, settingsErrors } from '../model/settings-form';
import './settings.css';

const IDS = {
  officeName: 'settings-office-name',
  reviewsNeeded: 'settings-reviews-needed',
  principal: 'settings-principal',
  reviewDueMonths: 'settings-review-due-months',
};

interface SettingsEditorProps {
  settings: Settings;
  /** Those who could be the principal. */
  candidates: readonly ListedPerson[];
  onChange: (settings: SettingsChange) => Promise<void>;
}

/** What an administrator sets for the whole office. */
export function SettingsEditor({ settings, candidates, onChange }: SettingsEditorProps) {
  const [typed, setTyped] = useState(() => formOf(settings));
  const [done, setDone] = useState('');
  const set = (part: Partial<typeof typed>) => setTyped((before) => ({ ...before, ...part }));
  const form = useFormAct({
    find: () => {
      setDone('');
      return settingsErrors(typed);
    },
    act: async () => {
      await onChange(changeOf(typed));
      setDone('The settings are kept. They hold from now on.');
    },
  });
  const { errors } = form;
  return (
    <form className="settings-form" noValidate onSubmit={form.send}>
      <FormSummary title="Nothing was changed yet" form={form} ids={IDS} />
      <Field
        id={IDS.officeName}
        label="Name of the office"
        hint="Stands in every letter."
        error={errors['officeName']}
      >
        <TextInput
          id={IDS.officeName}
          value={typed.officeName}
          maxLength={100}
          autoComplete="organization"
          onChange={(officeName) => set({ officeName })}
          {...describedBy(IDS.officeName, { error: errors['officeName'], hint: true })}
        />
      </Field>
      <ChoiceField
        id={IDS.reviewsNeeded}
        label="Favourable reviews before an approval"
        value={typed.reviewsNeeded}
        choices={REVIEWS_NEEDED.map((value) => ({ value, label: value }))}
        hint="Counts for approvals to come; what is approved stays approved."
        error={errors['reviewsNeeded']}
        onChange={(reviewsNeeded) => set({ reviewsNeeded })}
      />
      <ChoiceField
        id={IDS.principal}
        label="Principal of the office"
        value={typed.principal}
        choices={[
          { value: '', label: 'nobody' },
          ...candidates.map(({ id, name }) => ({ value: id, label: name })),
        ]}
        hint="Confirms appointments beside the technical authorities, and so the first one. Never an administrator."
        error={errors['principal']}
        onChange={(principal) => set({ principal })}
      />
      <Field
        id={IDS.reviewDueMonths}
        label="Months until an approved revision is due for review"
        hint="Proposed at each approval; 1 to 120."
        error={errors['reviewDueMonths']}
      >
        <TextInput
          id={IDS.reviewDueMonths}
          inputMode="numeric"
          autoComplete="off"
          value={typed.reviewDueMonths}
          onChange={(reviewDueMonths) => set({ reviewDueMonths })}
          {...describedBy(IDS.reviewDueMonths, { error: errors['reviewDueMonths'], hint: true })}
        />
      </Field>
      <Button type="primary" htmlType="submit" loading={form.working}>
        Keep the settings
      </Button>
      <DoneNote words={done} />
    </form>
  );
}
