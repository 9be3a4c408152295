import { Button } from 'antd';
import { useState } from 'react';
import type { DemoPeople } from '../../../shared/api/types';
import { inWords } from '../../../shared/format/in-words';
import { roleWords } from '../../../shared/format/role-words';

interface DemoPeopleListProps {
  demo: DemoPeople;
  onSignIn: (email: string, password: string) => Promise<void>;
  wordsFor: (thrown: unknown) => string;
}

/** The invented people of the demo office, each one press away. */
export function DemoPeopleList({ demo, onSignIn, wordsFor }: DemoPeopleListProps) {
  const [waiting, setWaiting] = useState<string | null>(null);
  const [refusal, setRefusal] = useState<string | null>(null);

  const enter = async (email: string) => {
    setWaiting(email);
    setRefusal(null);
    try {
      await onSignIn(email, demo.password);
    } catch (thrown) {
      setRefusal(wordsFor(thrown));
      setWaiting(null);
    }
  };

  return (
    <section className="demo-people" aria-labelledby="demo-people-title">
      <h2 id="demo-people-title">Or look around as one of the demo office</h2>
      <p className="demo-people-words">
        This office and its people are invented. All of them sign in with the password{' '}
        <code>{demo.password}</code>.
      </p>
      {refusal ? (
        <p className="field-error" role="alert">
          {refusal}
        </p>
      ) : null}
      <ul>
        {demo.items.map(({ name, email, roles }) => (
          <li key={email}>
            <span className="demo-person">
              <span className="demo-person-name">{name}</span>, {inWords(roles.map(roleWords))}
              <span className="demo-person-email">{email}</span>
            </span>
            <Button
              size="small"
              loading={waiting === email}
              disabled={waiting !== null && waiting !== email}
              onClick={() => void enter(email)}
              aria-label={`Enter as ${name}`}
            >
              Enter
            </Button>
          </li>
        ))}
      </ul>
    </section>
  );
}
