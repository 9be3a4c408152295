import { Button } from 'antd';
import { useState } from 'react';
import { FormSummary } from '../../../shared/form/form-summary';
import { useFormAct } from '../../../shared/form/use-form-act';
import { NewPasswordField } from '../../../shared/ui/fields/new-password-field';
import { newPasswordError } from '../../../shared/ui/fields/new-password-error';
import { choosePassword } from '../api/password-resets';
import './password-reset.css';

const PASSWORD = 'reset-password';

interface ChooseFormProps {
  /** From the letter's link. */
  token: string;
  onChosen: () => void;
}

/** A new password for whoever has the letter. */
export function ChooseForm({ token, onChosen }: ChooseFormProps) {
  const [password, setPassword] = useState('');
  const form = useFormAct({
    find: () => ({ password: newPasswordError(password) }),
    act: async () => {
      await choosePassword(token, password);
      onChosen();
    },
  });
  return (
    <form className="reset-form" noValidate onSubmit={form.send}>
      <FormSummary title="Your password was not changed" form={form} ids={{ password: PASSWORD }} />
      <NewPasswordField
        id={PASSWORD}
        value={password}
        onChange={setPassword}
        error={form.errors['password']}
      />
      <Button type="primary" htmlType="submit" loading={form.working}>
        Choose this password
      </Button>
    </form>
  );
}
