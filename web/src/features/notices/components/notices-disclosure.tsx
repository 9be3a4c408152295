import { Button } from 'antd';
import { useEffect, useRef, useState } from 'react';
import { Link, useLocation } from 'react-router-dom';
import type { Notice } from '../../../shared/api/types';
import { useAct } from '../../../shared/hooks/use-act';
import { paths } from '../../../shared/paths';
import { ProblemNotice } from '../../../shared/ui/problem-notice';
import { useLatestNotices, useReading } from '../api/use-notices';
import { countWords } from '../model/count-words';
import { NoticeList } from './notice-list';
import './notices.css';

/** How many notices wait, in words; pressed, it shows them where it stands. */
export function NoticesDisclosure() {
  const { notices, unread, problem, retry } = useLatestNotices();
  const [open, setOpen] = useState(false);
  const box = useClosing(open, () => setOpen(false));
  const read = useReading();
  const { problem: refusal, run } = useAct();
  const waiting = notices?.filter((notice) => !notice.read) ?? [];
  const markRead = (some: readonly Notice[]) => void run(() => read(some));
  return (
    <div className="notices-disclosure" ref={box}>
      <Button
        type="link"
        size="small"
        aria-expanded={open}
        aria-controls="notices-latest"
        onClick={() => setOpen((before) => !before)}
      >
        {unread === 0 ? (
          'Notices'
        ) : (
          <span>
            {countWords(unread)} new
            <span className="notices-noun"> {unread === 1 ? 'notice' : 'notices'}</span>
          </span>
        )}
      </Button>
      <div
        id="notices-latest"
        className="notices-latest"
        role="region"
        aria-label="Latest notices"
        hidden={!open}
      >
        {problem ? <ProblemNotice problem={problem} onRetry={retry} /> : null}
        {refusal ? <ProblemNotice problem={refusal} /> : null}
        {waiting.length === 0 && !problem ? (
          <p className="notices-none">Nothing new. You are told here when something waits for you.</p>
        ) : (
          <NoticeList notices={waiting} onRead={(notice) => markRead([notice])} />
        )}
        <p className="notices-acts">
          <Link to={paths.notices}>All notices</Link>
          {waiting.length > 1 ? (
            <Button type="link" size="small" onClick={() => markRead(waiting)}>
              Mark these as read
            </Button>
          ) : null}
        </p>
      </div>
    </div>
  );
}

/** Closes on Escape, on a press elsewhere and on another page. */
function useClosing(open: boolean, close: () => void) {
  const box = useRef<HTMLDivElement>(null);
  const { pathname } = useLocation();
  const [at, setAt] = useState(pathname);
  if (at !== pathname) {
    setAt(pathname);
    if (open) close();
  }
  useEffect(() => {
    if (!open) return;
    const onKey = (event: KeyboardEvent) => {
      if (event.key !== 'Escape') return;
      close();
      box.current?.querySelector('button')?.focus();
    };
    const onPress = ({ target }: PointerEvent) => {
      if (target instanceof Node && !box.current?.contains(target)) close();
    };
    document.addEventListener('keydown', onKey);
    document.addEventListener('pointerdown', onPress);
    return () => {
      document.removeEventListener('keydown', onKey);
      document.removeEventListener('pointerdown', onPress);
    };
  });
  return box;
}
