import { Button } from 'antd';
import type { Notice } from '../../../shared/api/types';
import { useAct } from '../../../shared/hooks/use-act';
import { EmptyState } from '../../../shared/ui/empty-state';
import { Loading } from '../../../shared/ui/loading';
import { ProblemNotice } from '../../../shared/ui/problem-notice';
import { useNotices, useReading } from '../api/use-notices';
import { countWords } from '../model/count-words';
import { NoticeList } from './notice-list';
import './notices.css';

/** Every notice of whoever is signed in. */
export function NoticesView() {
  const { notices, unread, problem, hasMore, fetchingMore, showMore, refetch } = useNotices();
  const read = useReading();
  const { working, problem: refusal, run } = useAct();
  const markRead = (some: readonly Notice[]) =>
    void run(async () => {
      await read(some);
      await refetch();
    });
  if (problem) return <ProblemNotice problem={problem} onRetry={() => void refetch()} />;
  if (!notices) return <Loading what="your notices" />;
  if (notices.length === 0)
    return (
      <EmptyState title="No notices yet">
        <p>Here you are told when a review is asked of you, and when something you have part in moves on.</p>
      </EmptyState>
    );
  const waiting = notices.filter((notice) => !notice.read);
  return (
    <>
      <div className="notices-start">
        <p role="status">{waitingWords(unread)}</p>
        {waiting.length > 1 ? (
          <Button type="link" size="small" loading={working} onClick={() => markRead(waiting)}>
            Mark these as read
          </Button>
        ) : null}
      </div>
      {refusal ? <ProblemNotice problem={refusal} /> : null}
      <NoticeList notices={notices} onRead={(notice) => markRead([notice])} />
      {hasMore ? (
        <p className="notices-more">
          <Button loading={fetchingMore} onClick={showMore}>
            Show earlier notices
          </Button>
        </p>
      ) : null}
    </>
  );
}

function waitingWords(unread: number): string {
  if (unread === 0) return 'Nothing new.';
  return unread === 1 ? 'One of them is new.' : `Of these, ${countWords(unread)} are new.`;
}
