import { useState } from 'react';
import type { ManagedPerson, Role } from '../../../shared/api/types';
import { FormSummary } from '../../../shared/form/form-summary';
import { useFormAct } from '../../../shared/form/use-form-act';
import { ActDialog } from '../../../shared/ui/act-dialog';
import { describedBy, Field } from '../../../shared/ui/fields/field';
import { TextInput } from '../../../shared/ui/fields/text-input';
import { invitePerson } from '../api/manage-people';
import { emailError, personErrors } from '../model/person-errors';
import { RoleChoice } from './role-choice';

const IDS = { name: 'invite-name', email: 'invite-email', roles: 'invite-roles' };

interface InviteDialogProps {
  onInvited: (person: ManagedPerson) => void;
  onLeave: () => void;
}

/** Name, address and roles of somebody new; the link goes to their address and nowhere else. */
export function InviteDialog({ onInvited, onLeave }: InviteDialogProps) {
  const [name, setName] = useState('');
  const [email, setEmail] = useState('');
  const [roles, setRoles] = useState<Role[]>([]);
  const form = useFormAct({
    find: () => ({ ...personErrors({ name, roles }), email: emailError(email) }),
    act: async () => onInvited(await invitePerson({ name: name.trim(), email: email.trim(), roles })),
  });
  const { errors } = form;
  return (
    <ActDialog
      title="Invite somebody"
      act="Send the invitation"
      leave="Leave it"
      working={form.working}
      onAct={form.send}
      onLeave={onLeave}
    >
      <p>A letter goes to the address, with a link that works once and for seven days.</p>
      <FormSummary title="Nobody was invited yet" form={form} ids={IDS} />
      <Field id={IDS.name} label="Name" error={errors['name']}>
        <TextInput
          id={IDS.name}
          value={name}
          maxLength={100}
          autoComplete="off"
          onChange={setName}
          {...describedBy(IDS.name, { error: errors['name'] })}
        />
      </Field>
      <Field id={IDS.email} label="E-mail address" error={errors['email']}>
        <TextInput
          id={IDS.email}
          type="email"
          value={email}
          maxLength={254}
          autoComplete="off"
          autoCapitalize="none"
          spellCheck={false}
          onChange={setEmail}
          {...describedBy(IDS.email, { error: errors['email'] })}
        />
      </Field>
      <RoleChoice
        id={IDS.roles}
        roles={roles}
        isAuthority={false}
        error={errors['roles']}
        onChange={setRoles}
      />
    </ActDialog>
  );
}
