import { Link, Navigate, useNavigate, useSearchParams } from 'react-router-dom';
import { useDemoPeople } from '../../features/sign-in/api/use-demo-people';
import { DemoPeopleList } from '../../features/sign-in/components/demo-people-list';
import { SignInForm } from '../../features/sign-in/components/sign-in-form';
import { refusalWords } from '../../features/sign-in/model/refusal-words';
import { pathWithin } from '../../features/sign-in/model/path-within';
import '../../features/sign-in/components/sign-in.css';
import { paths } from '../../shared/paths';
import { useSession } from '../../shared/session/use-session';
import { MarginNote } from '../../shared/ui/margin-note';
import { SheetPage } from '../../shared/ui/sheet-page';

export function SignInRoute() {
  const { session, signIn } = useSession();
  const demo = useDemoPeople();
  const navigate = useNavigate();
  const [query] = useSearchParams();
  const next = pathWithin(query.get('from'));
  if (session) return <Navigate to={next} replace />;
  const enter = async (email: string, password: string) => {
    await signIn(email, password);
    await navigate(next, { replace: true });
  };
  return (
    <SheetPage
      title="Sign in"
      subtitle="A register of mass transfer correlations that knows where each one stops."
      margin={
        <MarginNote title="Why sign in?">
          Which correlation was used, by whom and why, is kept on record. So every use has a name.
        </MarginNote>
      }
    >
      <SignInForm onSignIn={enter} wordsFor={refusalWords} />
      <p className="sign-in-else">
        <Link to={paths.passwordReset}>Forgot your password?</Link>
      </p>
      {demo ? <DemoPeopleList demo={demo} onSignIn={enter} wordsFor={refusalWords} /> : null}
    </SheetPage>
  );
}
