import { Button } from 'antd';
import { useState } from 'react';
import { Link, NavLink, useNavigate } from 'react-router-dom';
import { asApiProblem } from '../../shared/api/api-problem';
import type { Permission } from '../../shared/api/types';
import { paths } from '../../shared/paths';
import { useSession } from '../../shared/session/use-session';
import './masthead.css';

/** The pages of the masthead; one with a permission is shown to those who have it. */
const NOUNS: readonly { to: string; noun: string; permission?: Permission }[] = [
  { to: paths.register, noun: 'Register' },
  { to: paths.geometries, noun: 'Geometries' },
  { to: paths.propertyEquations, noun: 'Property equations' },
  { to: paths.journal, noun: 'Journal', permission: 'journal.read' },
];

/** The product's word, its nouns, and who is signed in. */
export function Masthead() {
  const { session, may } = useSession();
  const nouns = NOUNS.filter(({ permission }) => permission === undefined || may(permission));
  return (
    <header className="masthead">
      <Link className="masthead-word" to={paths.start}>
        Merestone
      </Link>
      {session ? (
        <>
          <nav aria-label="Main">
            <ul className="masthead-nouns">
              {nouns.map(({ to, noun }) => (
                <li key={to}>
                  <NavLink to={to}>{noun}</NavLink>
                </li>
              ))}
            </ul>
          </nav>
          <SignedIn name={session.person.name} roles={session.person.roles} />
        </>
      ) : null}
    </header>
  );
}

function SignedIn({ name, roles }: { name: string; roles: string[] }) {
  const { signOut } = useSession();
  const [problem, setProblem] = useState<string | null>(null);
  const navigate = useNavigate();
  const leave = async () => {
    try {
      await signOut();
      await navigate(paths.signIn);
    } catch (thrown) {
      setProblem(asApiProblem(thrown).title);
    }
  };
  return (
    <p className="masthead-person">
      <span title={roles.join(', ')}>{name}</span>
      <span aria-hidden="true"> · </span>
      <Button type="link" size="small" onClick={() => void leave()}>
        Sign out
      </Button>
      {problem ? <span role="alert"> {problem}</span> : null}
    </p>
  );
}
