import { Button } from 'antd';
import { useState } from 'react';
import { FormSummary } from '../../../shared/form/form-summary';
import { useFormAct } from '../../../shared/form/use-form-act';
import { DoneNote } from '../../../shared/ui/done-note';
import { describedBy, Field } from '../../../shared/ui/fields/field';
import { TextInput } from '../../../shared/ui/fields/text-input';
import { askForPassword } from '../api/password-resets';
import './password-reset.css';

const EMAIL = 'reset-email';

/** The address to send a link to. Whether anybody here has it is not said. */
export function AskForm() {
  const [email, setEmail] = useState('');
  const [done, setDone] = useState('');
  const form = useFormAct({
    find: () => {
      setDone('');
      return { email: email.trim() ? undefined : 'Write your e-mail address.' };
    },
    act: async () => setDone(await askForPassword(email.trim())),
  });
  const error = form.errors['email'];
  return (
    <form className="reset-form" noValidate onSubmit={form.send}>
      <FormSummary title="No letter was asked for yet" form={form} ids={{ email: EMAIL }} />
      <Field id={EMAIL} label="E-mail address" error={error}>
        <TextInput
          id={EMAIL}
          type="email"
          name="email"
          autoComplete="username"
          autoCapitalize="none"
          spellCheck={false}
          maxLength={254}
          value={email}
          onChange={setEmail}
          {...describedBy(EMAIL, { error })}
        />
      </Field>
      <Button type="primary" htmlType="submit" loading={form.working}>
        Send a link
      </Button>
      <DoneNote words={done} />
    </form>
  );
}
