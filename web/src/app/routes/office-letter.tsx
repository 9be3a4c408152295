import { Link, useParams } from 'react-router-dom';
import { LetterText } from '../../features/outbox/components/letter-text';
import { useOutbox } from '../../features/outbox/api/use-outbox';
import { paths } from '../../shared/paths';
import { Loading } from '../../shared/ui/loading';
import { ProblemNotice } from '../../shared/ui/problem-notice';
import { SheetPage } from '../../shared/ui/sheet-page';
import { OfficeNav } from '../layout/office-nav';

export function OfficeLetterRoute() {
  const { id = '' } = useParams();
  const { letters, problem, retry } = useOutbox();
  const letter = letters?.find((one) => one.id === id);
  return (
    <SheetPage title={letter?.subject ?? (letters ? 'No such letter' : 'Letter')} runningHead={<OfficeNav />}>
      {problem ? (
        <ProblemNotice problem={problem} {...(problem.status === 403 ? {} : { onRetry: retry })} />
      ) : null}
      {!letters && !problem ? <Loading what="the letter" /> : null}
      {letter ? <LetterText letter={letter} /> : null}
      {letters && !letter ? <p>It may be older than those that are shown.</p> : null}
      <p style={{ marginTop: '1rem' }}>
        <Link to={paths.outbox}>All letters</Link>
      </p>
    </SheetPage>
  );
}
