import { Button } from 'antd';
import { Link } from 'react-router-dom';
import type { Notice } from '../../../shared/api/types';
import { formatMinute } from '../../../shared/format/format-date';
import { pathOfNotice } from '../model/path-of-notice';
import './notices.css';

interface NoticeListProps {
  notices: readonly Notice[];
  onRead: (notice: Notice) => void;
}

/** Notices, those not read yet in ink and with their word; following one reads it. */
export function NoticeList({ notices, onRead }: NoticeListProps) {
  return (
    <ul className="notices">
      {notices.map((notice) => {
        const to = pathOfNotice(notice.href);
        return (
          <li key={notice.id} className={notice.read ? 'notice-line notice-read' : 'notice-line'}>
            <span className="notice-text">
              {notice.read ? null : <span className="notice-new">new </span>}
              {to === null ? (
                notice.text
              ) : (
                <Link to={to} onClick={() => onRead(notice)}>
                  {notice.text}
                </Link>
              )}
              <time className="notice-at" dateTime={notice.at}>
                {formatMinute(notice.at)}
              </time>
            </span>
            {notice.read ? null : (
              <Button
                type="link"
                size="small"
                aria-label={`Mark as read: ${notice.text}`}
                onClick={() => onRead(notice)}
              >
                Mark as read
              </Button>
            )}
          </li>
        );
      })}
    </ul>
  );
}
