import { Navigate, Outlet, useLocation } from 'react-router-dom';
import { signInPath } from '../paths';
import { Loading } from '../ui/loading';
import { ProblemNotice } from '../ui/problem-notice';
import { SheetPage } from '../ui/sheet-page';
import { useSession } from './use-session';

/** Lets only signed-in people through; others sign in first and come back to where they wanted to go. */
export function RequireSignIn() {
  const { session, problem, retry } = useSession();
  const { pathname, search } = useLocation();
  if (session) return <Outlet />;
  if (session === null) return <Navigate to={signInPath(pathname + search)} replace />;
  return (
    <SheetPage title={problem ? 'Not reached' : 'One moment'}>
      {problem ? <ProblemNotice problem={problem} onRetry={retry} /> : <Loading what="your session" />}
    </SheetPage>
  );
}
