import { useState } from 'react';
import { Link, useNavigate, useParams } from 'react-router-dom';
import { JoinForm } from '../../features/invitation/components/join-form';
import { join, useInvitation, type Joining } from '../../features/invitation/api/use-invitation';
import type { Invitation } from '../../shared/api/types';
import { paths } from '../../shared/paths';
import { useSession } from '../../shared/session/use-session';
import { Loading } from '../../shared/ui/loading';
import { MarginNote } from '../../shared/ui/margin-note';
import { ProblemNotice } from '../../shared/ui/problem-notice';
import { SheetPage } from '../../shared/ui/sheet-page';

export function InvitationRoute() {
  const { token = '' } = useParams();
  const { invitation, problem, retry } = useInvitation(token);
  if (invitation) return <Joining key={token} token={token} invitation={invitation} />;
  return (
    <SheetPage title="Invitation">
      {problem ? (
        <ProblemNotice problem={problem} {...(problem.status === 404 ? {} : { onRetry: retry })} />
      ) : (
        <Loading what="your invitation" />
      )}
      {problem?.status === 404 ? (
        <p>
          A link works once and for seven days. If you have joined already, <SignInLink />.
        </p>
      ) : null}
    </SheetPage>
  );
}

function Joining({ token, invitation }: { token: string; invitation: Invitation }) {
  const { session, signIn, signOut } = useSession();
  const navigate = useNavigate();
  const [joined, setJoined] = useState(false);
  const isFirst = invitation.email === null;

  const take = async (joining: Joining) => {
    const { email } = await join(token, joining);
    setJoined(true);
    // Whoever was signed in here before is somebody else.
    if (session) await signOut();
    await signIn(email, joining.password);
    await navigate(paths.start, { replace: true });
  };
  return (
    <SheetPage
      title={isFirst ? 'The first administrator' : `Welcome, ${invitation.name ?? ''}`}
      subtitle={
        isFirst
          ? 'This office has nobody yet. Whoever joins here looks after its people, settings and mail.'
          : 'You are invited to a register of mass transfer correlations.'
      }
      margin={
        <MarginNote title="Why a name?">
          Which correlation was used, by whom and why, is kept on record. So every use has a name.
        </MarginNote>
      }
    >
      {session ? (
        <p style={{ marginTop: '1rem' }}>
          {session.person.name} is signed in in this browser, and is signed out when you join.
        </p>
      ) : null}
      {joined ? (
        <p style={{ marginTop: '1rem' }}>
          You have joined. If the next page does not come, <SignInLink />.
        </p>
      ) : null}
      <JoinForm invitation={invitation} onJoin={take} />
    </SheetPage>
  );
}

function SignInLink() {
  return <Link to={paths.signIn}>sign in</Link>;
}
