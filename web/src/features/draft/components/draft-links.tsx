import { Link } from 'react-router-dom';
import { paths } from '../../../shared/paths';
import { useSession } from '../../../shared/session/use-session';
import './draft-links.css';

/** Ways from a sheet to the form: its next revision, or another correlation after its pattern. */
export function DraftLinks({ slug }: { slug: string }) {
  const { may } = useSession();
  if (!may('correlation.draft')) return null;
  return (
    <p className="draft-links">
      <Link to={paths.revise(slug)}>Revise</Link>
      <Link to={paths.draftNew(slug)}>Take as a pattern</Link>
    </p>
  );
}

/** The way from the register to a new sheet. */
export function SubmitLink() {
  const { may } = useSession();
  if (!may('correlation.draft')) return null;
  return (
    <p className="draft-links">
      <Link to={paths.draftNew()}>Submit a correlation</Link>
    </p>
  );
}
