import { useState } from 'react';
import type { ManagedPerson } from '../../../shared/api/types';
import { FormSummary } from '../../../shared/form/form-summary';
import { useFormAct } from '../../../shared/form/use-form-act';
import { ActDialog } from '../../../shared/ui/act-dialog';
import { describedBy, Field } from '../../../shared/ui/fields/field';
import { TextInput } from '../../../shared/ui/fields/text-input';
import { changePerson } from '../api/manage-people';
import { personErrors } from '../model/person-errors';
import { RoleChoice } from './role-choice';

const IDS = { name: 'change-name', roles: 'change-roles' };

interface ChangeDialogProps {
  person: ManagedPerson;
  onChanged: (person: ManagedPerson) => void;
  onLeave: () => void;
}

/** Another name or other roles; what was signed before keeps the name it was signed with. */
export function ChangeDialog({ person, onChanged, onLeave }: ChangeDialogProps) {
  const [name, setName] = useState(person.name);
  const [roles, setRoles] = useState(person.roles);
  const form = useFormAct({
    find: () => personErrors({ name, roles }),
    act: async () => onChanged(await changePerson(person.id, { name: name.trim(), roles })),
  });
  return (
    <ActDialog
      title={`Change name or roles of ${person.name}`}
      act="Keep the change"
      working={form.working}
      onAct={form.send}
      onLeave={onLeave}
    >
      <FormSummary title="Nothing was changed yet" form={form} ids={IDS} />
      <Field
        id={IDS.name}
        label="Name"
        hint="What is on record already keeps the name it was signed with."
        error={form.errors['name']}
      >
        <TextInput
          id={IDS.name}
          value={name}
          maxLength={100}
          autoComplete="off"
          onChange={setName}
          {...describedBy(IDS.name, { error: form.errors['name'], hint: true })}
        />
      </Field>
      <RoleChoice
        id={IDS.roles}
        roles={roles}
        isAuthority={person.roles.includes('authority')}
        error={form.errors['roles']}
        onChange={setRoles}
      />
    </ActDialog>
  );
}
