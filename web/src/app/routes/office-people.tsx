import { Link } from 'react-router-dom';
import { PeopleView } from '../../features/people/components/people-view';
import { paths } from '../../shared/paths';
import { usePeople } from '../../shared/people/use-people';
import { useSession } from '../../shared/session/use-session';
import { Loading } from '../../shared/ui/loading';
import { MarginNote } from '../../shared/ui/margin-note';
import { ProblemNotice } from '../../shared/ui/problem-notice';
import { SheetPage } from '../../shared/ui/sheet-page';
import { OfficeNav } from '../layout/office-nav';

export function OfficePeopleRoute() {
  const { session, may } = useSession();
  const { people, problem, refetch } = usePeople();
  if (!may('people.manage'))
    return (
      <SheetPage title="People" runningHead={<OfficeNav />}>
        <p>Administrators look after the people of the office. Ask one of them.</p>
      </SheetPage>
    );
  return (
    <SheetPage
      title="People"
      subtitle="Who works in this register, and as what."
      runningHead={<OfficeNav />}
      wide
      margin={<PeopleNotes />}
    >
      {problem ? <ProblemNotice problem={problem} onRetry={() => void refetch()} /> : null}
      {!people && !problem ? <Loading what="the people" /> : null}
      {people && session ? <PeopleView people={people} ownId={session.person.id} refetch={refetch} /> : null}
    </SheetPage>
  );
}

function PeopleNotes() {
  return (
    <>
      <MarginNote title="Roles">
        A person may have several. Only administrator and technical authority exclude each other.
      </MarginNote>
      <MarginNote title="Technical authorities">
        are not made here: two people <Link to={paths.appointments}>appoint</Link> them.
      </MarginNote>
      <MarginNote title="Leaving">
        Nobody is deleted: what they did stays on record under their name. Whoever is inactive cannot sign in.
      </MarginNote>
    </>
  );
}
