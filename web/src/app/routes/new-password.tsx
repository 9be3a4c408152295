import { useState } from 'react';
import { Link, useParams } from 'react-router-dom';
import { ChooseForm } from '../../features/password-reset/components/choose-form';
import { paths } from '../../shared/paths';
import { useSession } from '../../shared/session/use-session';
import { DoneNote } from '../../shared/ui/done-note';
import { SheetPage } from '../../shared/ui/sheet-page';

export function NewPasswordRoute() {
  const { token = '' } = useParams();
  const { retry } = useSession();
  const [chosen, setChosen] = useState(false);
  return (
    <SheetPage
      title="Choose a new password"
      subtitle="The link from the letter works once, within an hour. All your sessions end with it."
    >
      {chosen ? (
        <>
          <DoneNote words="Your new password holds." />
          <p style={{ marginTop: '1rem' }}>
            <Link to={paths.signIn}>Sign in with it</Link>
          </p>
        </>
      ) : (
        <>
          <ChooseForm
            token={token}
            onChosen={() => {
              setChosen(true);
              // A session in this browser may just have ended.
              retry();
            }}
          />
          <p style={{ marginTop: '1rem' }}>
            Does the link not hold any more? <Link to={paths.passwordReset}>Ask for another</Link>.
          </p>
        </>
      )}
    </SheetPage>
  );
}
