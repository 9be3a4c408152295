import { Button } from 'antd';
import { useJournal } from '../../features/journal/api/use-journal';
import { JournalTable } from '../../features/journal/components/journal-table';
import { VerifyJournal } from '../../features/journal/components/verify-journal';
import { useSession } from '../../shared/session/use-session';
import { EmptyState } from '../../shared/ui/empty-state';
import { Loading } from '../../shared/ui/loading';
import { MarginNote } from '../../shared/ui/margin-note';
import { ProblemNotice } from '../../shared/ui/problem-notice';
import { SheetPage } from '../../shared/ui/sheet-page';

export function JournalRoute() {
  const { may } = useSession();
  const journal = useJournal();
  const { entries, size, root, problem } = journal;
  return (
    <SheetPage
      title="Journal"
      subtitle="Every act on record, the latest first. Nothing in it can be changed."
      wide
      margin={<JournalNotes size={size} root={root} />}
    >
      {may('journal.verify') ? <VerifyJournal /> : null}
      {problem ? (
        <ProblemNotice problem={problem} {...(problem.status === 403 ? {} : { onRetry: journal.retry })} />
      ) : null}
      {!entries && !problem ? <Loading what="the journal" /> : null}
      {entries?.length === 0 ? (
        <EmptyState title="Nothing is on record yet">
          <p>The first act of the office will be the first entry.</p>
        </EmptyState>
      ) : null}
      {entries && entries.length > 0 ? <JournalTable entries={entries} /> : null}
      {journal.hasMore ? (
        <p className="journal-more">
          <Button onClick={journal.showMore} loading={journal.fetchingMore}>
            Show earlier entries
          </Button>
        </p>
      ) : null}
    </SheetPage>
  );
}

function JournalNotes({ size, root }: { size: number | undefined; root: string | null }) {
  return (
    <>
      <MarginNote title="How it is kept">
        Each entry is a leaf of one hash tree. Whoever keeps the root of a day elsewhere can prove later that
        no entry before it was altered.
      </MarginNote>
      {size !== undefined && root !== null ? (
        <MarginNote title={`Root over ${size} ${size === 1 ? 'entry' : 'entries'}`}>
          <span className="journal-root">{root}</span>
        </MarginNote>
      ) : null}
    </>
  );
}
