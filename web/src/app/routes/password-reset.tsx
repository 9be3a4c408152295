import { Link } from 'react-router-dom';
import { AskForm } from '../../features/password-reset/components/ask-form';
import { paths } from '../../shared/paths';
import { MarginNote } from '../../shared/ui/margin-note';
import { SheetPage } from '../../shared/ui/sheet-page';

export function PasswordResetRoute() {
  return (
    <SheetPage
      title="A new password"
      subtitle="A letter with a link goes to your address; with it you choose a new password."
      margin={
        <MarginNote title="No letter?">
          It goes only to an address that somebody here has, and this page does not say which those are. Ask
          an administrator of your office.
        </MarginNote>
      }
    >
      <AskForm />
      <p style={{ marginTop: '1rem' }}>
        <Link to={paths.signIn}>Back to the sign-in</Link>
      </p>
    </SheetPage>
  );
}
