import { Button } from 'antd';
import { useState } from 'react';
import type { Invitation } from '../../../shared/api/types';
import { FormSummary } from '../../../shared/form/form-summary';
import { useFormAct } from '../../../shared/form/use-form-act';
import { describedBy, Field } from '../../../shared/ui/fields/field';
import { NewPasswordField } from '../../../shared/ui/fields/new-password-field';
import { newPasswordError } from '../../../shared/ui/fields/new-password-error';
import { TextInput } from '../../../shared/ui/fields/text-input';
import type { Joining } from '../api/use-invitation';
import './join-form.css';

const IDS = { name: 'join-name', email: 'join-email', password: 'join-password' };

interface JoinFormProps {
  invitation: Invitation;
  onJoin: (joining: Joining) => Promise<void>;
}

/** A password for whoever was invited; the first administrator of an office also says who they are. */
export function JoinForm({ invitation, onJoin }: JoinFormProps) {
  const isFirst = invitation.email === null;
  const [name, setName] = useState(invitation.name ?? '');
  const [email, setEmail] = useState(invitation.email ?? '');
  const [password, setPassword] = useState('');
  const form = useFormAct({
    find: () => ({
      ...(isFirst
        ? {
            name: name.trim() ? undefined : 'Write your name as it is to stand on record.',
            email: /^\S+@\S+$/.test(email.trim())
              ? undefined
              : 'Write your whole e-mail address, with its @.',
          }
        : {}),
      password: newPasswordError(password),
    }),
    act: () => onJoin({ password, ...(isFirst ? { name: name.trim(), email: email.trim() } : {}) }),
  });
  const { errors } = form;
  return (
    <form className="join-form" noValidate onSubmit={form.send}>
      <FormSummary title="You have not joined yet" form={form} ids={IDS} />
      {isFirst ? (
        <Field id={IDS.name} label="Name" error={errors['name']}>
          <TextInput
            id={IDS.name}
            name="name"
            autoComplete="name"
            maxLength={100}
            value={name}
            onChange={setName}
            {...describedBy(IDS.name, { error: errors['name'] })}
          />
        </Field>
      ) : null}
      <Field id={IDS.email} label="E-mail address" error={errors['email']}>
        <TextInput
          id={IDS.email}
          type="email"
          name="email"
          autoComplete="username"
          autoCapitalize="none"
          spellCheck={false}
          maxLength={254}
          readOnly={!isFirst}
          value={email}
          onChange={setEmail}
          {...describedBy(IDS.email, { error: errors['email'] })}
        />
      </Field>
      <NewPasswordField
        id={IDS.password}
        label="Password"
        value={password}
        onChange={setPassword}
        error={errors['password']}
      />
      <Button type="primary" htmlType="submit" loading={form.working}>
        Join
      </Button>
    </form>
  );
}
