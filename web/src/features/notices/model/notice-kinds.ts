import type { NoticeKind } from '../../../shared/api/types';

/** What the office tells of, in the order of a revision's life. */
export const NOTICE_KINDS: readonly { kind: NoticeKind; label: string; hint: string }[] = [
  {
    kind: 'review-asked',
    label: 'A review is asked of you',
    hint: 'you were named, or changes are ready again',
  },
  { kind: 'comment', label: 'Comments', hint: 'on what you drafted or review' },
  { kind: 'verdict', label: 'Verdicts', hint: 'a reviewer has decided on your revision' },
  { kind: 'approval', label: 'Approvals', hint: 'a revision you had part in is approved or declined' },
  { kind: 'withdrawal', label: 'Out of use', hint: 'something you used is suspended or withdrawn' },
  { kind: 'reminder', label: 'Reminders', hint: 'a review that is due' },
  { kind: 'appointment', label: 'Appointments', hint: 'technical authorities proposed, confirmed, ended' },
  { kind: 'report', label: 'Problem reports', hint: 'on a sheet you answer for, and answers to yours' },
];
