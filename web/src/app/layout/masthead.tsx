import { Button } from 'antd';
import { useState } from 'react';
import { Link, NavLink, useNavigate } from 'react-router-dom';
import { NoticesDisclosure } from '../../features/notices/components/notices-disclosure';
import { asApiProblem } from '../../shared/api/api-problem';
import type { Permission, Role } from '../../shared/api/types';
import { inWords } from '../../shared/format/in-words';
import { roleWords } from '../../shared/format/role-words';
import { paths } from '../../shared/paths';
import { useSession } from '../../shared/session/use-session';
import './masthead.css';

/** The pages of the masthead; one with a permission is shown to those who have it. */
const NOUNS: readonly { to: string; noun: string; permission?: Permission }[] = [
  { to: paths.start, noun: 'Desk' },
  { to: paths.register, noun: 'Register' },
  { to: paths.reviews, noun: 'Reviews' },
  { to: paths.geometries, noun: 'Geometries' },
  { to: paths.propertyEquations, noun: 'Property equations' },
  { to: paths.journal, noun: 'Journal', permission: 'journal.read' },
  { to: paths.office, noun: 'Office', permission: 'appointment.end' },
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

function SignedIn({ name, roles }: { name: string; roles: Role[] }) {
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
    <div className="masthead-person">
      <NoticesDisclosure />
      <span aria-hidden="true"> · </span>
      <NavLink to={paths.account} title={`Your own page; ${inWords(roles.map(roleWords))}`}>
        {name}
      </NavLink>
      <span aria-hidden="true"> · </span>
      <Button type="link" size="small" onClick={() => void leave()}>
        Sign out
      </Button>
      {problem ? <span role="alert"> {problem}</span> : null}
    </div>
  );
}
