import { LetterList } from '../../features/outbox/components/letter-list';
import { useOutbox } from '../../features/outbox/api/use-outbox';
import { EmptyState } from '../../shared/ui/empty-state';
import { Loading } from '../../shared/ui/loading';
import { MarginNote } from '../../shared/ui/margin-note';
import { ProblemNotice } from '../../shared/ui/problem-notice';
import { SheetPage } from '../../shared/ui/sheet-page';
import { OfficeNav } from '../layout/office-nav';

export function OfficeOutboxRoute() {
  const { letters, problem, retry } = useOutbox();
  return (
    <SheetPage
      title="Outbox"
      subtitle="Letters of the office, the latest first, and what became of them."
      runningHead={<OfficeNav />}
      wide
      margin={
        <MarginNote title="Without a mail server">
          letters are kept here instead of sent, with the links in them, and an administrator passes them on.
          With one, the text stays and the link is sent only to its address.
        </MarginNote>
      }
    >
      {problem ? (
        <ProblemNotice problem={problem} {...(problem.status === 403 ? {} : { onRetry: retry })} />
      ) : null}
      {!letters && !problem ? <Loading what="the letters" /> : null}
      {letters?.length === 0 ? (
        <EmptyState title="No letter was written yet">
          <p>Invitations, links for new passwords and notices would stand here.</p>
        </EmptyState>
      ) : null}
      {letters && letters.length > 0 ? <LetterList letters={letters} /> : null}
    </SheetPage>
  );
}
