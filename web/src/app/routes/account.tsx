import { Link } from 'react-router-dom';
import { PasswordForm } from '../../features/account/components/password-form';
import { SessionList } from '../../features/account/components/session-list';
import { useOwnSessions } from '../../features/account/api/use-own-sessions';
import { MailChoicesForm } from '../../features/notices/components/mail-choices-form';
import { useMailChoices } from '../../features/notices/api/use-mail-choices';
import { inWords } from '../../shared/format/in-words';
import { roleWords } from '../../shared/format/role-words';
import { paths } from '../../shared/paths';
import { useSession } from '../../shared/session/use-session';
import { Loading } from '../../shared/ui/loading';
import { MarginNote } from '../../shared/ui/margin-note';
import { ProblemNotice } from '../../shared/ui/problem-notice';
import { MarginRow, SheetPage } from '../../shared/ui/sheet-page';

export function AccountRoute() {
  const { session } = useSession();
  const { sessions, problem, refetch } = useOwnSessions();
  if (!session) return null;
  const { name, email, roles } = session.person;
  return (
    <SheetPage title={name} subtitle={`${email}, ${inWords(roles.map(roleWords))}`}>
      <MarginRow
        heading={<h2>Password</h2>}
        notes={
          <>
            <MarginNote title="Name and roles">
              are given by an administrator of the office. What you do stands on record under this name.
            </MarginNote>
            <MarginNote title="Changed?">
              All your other sessions end at once, and a letter to your address says that it was changed.
            </MarginNote>
          </>
        }
      >
        <PasswordForm email={email} onChanged={() => void refetch()} />
      </MarginRow>
      <section>
        <h2>Where you are signed in</h2>
        {problem ? <ProblemNotice problem={problem} onRetry={() => void refetch()} /> : null}
        {!sessions && !problem ? <Loading what="your sessions" /> : null}
        {sessions ? <SessionList sessions={sessions} refetch={refetch} /> : null}
      </section>
      <MarginRow
        heading={<h2>Notices</h2>}
        notes={
          <MarginNote title="In any case">
            every notice stands <Link to={paths.notices}>among yours</Link>, until you have read it and after.
          </MarginNote>
        }
      >
        <MailChoice />
      </MarginRow>
    </SheetPage>
  );
}

function MailChoice() {
  const { choices, problem, retry, choose } = useMailChoices();
  if (problem) return <ProblemNotice problem={problem} onRetry={retry} />;
  return choices ? <MailChoicesForm choices={choices} onChoose={choose} /> : <Loading what="your choice" />;
}
