import { Button } from 'antd';
import { useState, type SyntheticEvent } from 'react';
import { ErrorSummary, type SummaryError } from '../../../shared/ui/error-summary';
import { Field, describedBy } from '../../../shared/ui/fields/field';
import { PasswordField } from '../../../shared/ui/fields/password-field';
import { TextInput } from '../../../shared/ui/fields/text-input';

const EMAIL = 'sign-in-email';
const PASSWORD = 'sign-in-password';

interface SignInFormProps {
  /** Signs in; a rejection carries the words that are shown. */
  onSignIn: (email: string, password: string) => Promise<void>;
  /** Puts a refusal into words. */
  wordsFor: (thrown: unknown) => string;
}

/** E-mail address and password; both can be pasted and filled by a password manager. */
export function SignInForm({ onSignIn, wordsFor }: SignInFormProps) {
  const [email, setEmail] = useState('');
  const [password, setPassword] = useState('');
  const [missing, setMissing] = useState<Record<string, string>>({});
  const [refusal, setRefusal] = useState<string | null>(null);
  const [sending, setSending] = useState(false);

  const send = async (event: SyntheticEvent) => {
    event.preventDefault();
    const found = whatIsMissing(email, password);
    setMissing(found);
    setRefusal(null);
    if (Object.keys(found).length > 0) return;
    setSending(true);
    try {
      await onSignIn(email.trim(), password);
    } catch (thrown) {
      setRefusal(wordsFor(thrown));
      setSending(false);
    }
  };

  const errors: SummaryError[] = Object.entries(missing).map(([fieldId, message]) => ({ fieldId, message }));
  if (refusal) errors.push({ fieldId: EMAIL, message: refusal });
  return (
    <form className="sign-in-form" noValidate onSubmit={(event) => void send(event)}>
      <ErrorSummary title="You are not signed in yet" errors={errors} />
      <Field id={EMAIL} label="E-mail address" error={missing[EMAIL]}>
        <TextInput
          id={EMAIL}
          type="email"
          name="email"
          autoComplete="username"
          autoCapitalize="none"
          spellCheck={false}
          value={email}
          onChange={setEmail}
          {...describedBy(EMAIL, { error: missing[EMAIL] })}
        />
      </Field>
      <PasswordField
        id={PASSWORD}
        label="Password"
        autoComplete="current-password"
        value={password}
        onChange={setPassword}
        error={missing[PASSWORD]}
      />
      <Button type="primary" htmlType="submit" loading={sending}>
        Sign in
      </Button>
    </form>
  );
}

function whatIsMissing(email: string, password: string): Record<string, string> {
  return {
    ...(/^\S+@\S+$/.test(email.trim())
      ? {}
      : {
          [EMAIL]: email.trim()
            ? 'Write the whole e-mail address, with its @.'
            : 'Write your e-mail address.',
        }),
    ...(password ? {} : { [PASSWORD]: 'Write your password.' }),
  };
}
