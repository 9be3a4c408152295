import { Button } from 'antd';
import { useState } from 'react';
import { FormSummary } from '../../../shared/form/form-summary';
import { useFormAct } from '../../../shared/form/use-form-act';
import { DoneNote } from '../../../shared/ui/done-note';
import { NewPasswordField } from '../../../shared/ui/fields/new-password-field';
import { newPasswordError } from '../../../shared/ui/fields/new-password-error';
import { PasswordField } from '../../../shared/ui/fields/password-field';
import { changePassword } from '../api/use-own-sessions';
import './account.css';

const IDS = { current: 'account-current-password', password: 'account-new-password' };

interface PasswordFormProps {
  /** For password managers, which keep a password by its address. */
  email: string;
  onChanged: () => void;
}

/** Another password for whoever is signed in. */
export function PasswordForm({ email, onChanged }: PasswordFormProps) {
  const [current, setCurrent] = useState('');
  const [password, setPassword] = useState('');
  const [done, setDone] = useState('');
  const form = useFormAct({
    find: () => {
      setDone('');
      return {
        current: current ? undefined : 'Write the password you have.',
        password: newPasswordError(password),
      };
    },
    act: async () => {
      await changePassword(current, password);
      setCurrent('');
      setPassword('');
      setDone('Your password is changed. All your other sessions have ended, and a letter says so.');
      onChanged();
    },
  });
  return (
    <form className="account-form" noValidate onSubmit={form.send}>
      <FormSummary title="Your password was not changed" form={form} ids={IDS} />
      <input
        className="heard-only"
        type="text"
        name="username"
        autoComplete="username"
        value={email}
        readOnly
        tabIndex={-1}
        aria-hidden="true"
      />
      <PasswordField
        id={IDS.current}
        label="Present password"
        autoComplete="current-password"
        value={current}
        onChange={setCurrent}
        error={form.errors['current']}
      />
      <NewPasswordField
        id={IDS.password}
        value={password}
        onChange={setPassword}
        error={form.errors['password']}
      />
      <Button type="primary" htmlType="submit" loading={form.working}>
        Change the password
      </Button>
      <DoneNote words={done} />
    </form>
  );
}
