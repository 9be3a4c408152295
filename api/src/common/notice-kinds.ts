/** What people are told of; each person chooses which kinds also come by mail. */
export const NOTICE_KINDS = [
  'review-asked',
  'comment',
  'verdict',
  'approval',
  'withdrawal',
  'reminder',
  'appointment',
  'report',
] as const;
export type NoticeKind = (typeof NOTICE_KINDS)[number];
