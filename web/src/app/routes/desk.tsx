import { Link } from 'react-router-dom';
import { useDesk } from '../../features/desk/api/use-desk';
import { DeskView } from '../../features/desk/components/desk-view';
import { RoleNotes } from '../../features/desk/components/role-notes';
import { waitingWords } from '../../features/desk/model/waiting-words';
import { paths } from '../../shared/paths';
import { useSession } from '../../shared/session/use-session';
import { Loading } from '../../shared/ui/loading';
import { MarginNote } from '../../shared/ui/margin-note';
import { ProblemNotice } from '../../shared/ui/problem-notice';
import { SheetPage } from '../../shared/ui/sheet-page';

/** The start page: what waits for whoever is signed in. */
export function DeskRoute() {
  const { session } = useSession();
  const { sections, problem, retry } = useDesk();
  return (
    <SheetPage
      title="Desk"
      subtitle={sections ? waitingWords(sections) : 'What waits for you.'}
      margin={
        <>
          <RoleNotes roles={session?.person.roles ?? []} />
          <MarginNote title="Looking something up?">
            <Link to={paths.register}>The register</Link> has every correlation and where it holds;{' '}
            <Link to={paths.geometries}>the geometries</Link> have each one’s sketch and its length.
          </MarginNote>
        </>
      }
    >
      {problem ? <ProblemNotice problem={problem} onRetry={retry} /> : null}
      {!sections && !problem ? <Loading what="your desk" /> : null}
      {sections ? <DeskView sections={sections} /> : null}
    </SheetPage>
  );
}
