import type { Actor } from '../common/actor.js';
import type { Verdict } from '../common/verdict.js';
import type { Notice } from '../notices/notices.service.js';
import type { RevisionRecord } from '../revisions/revision-record.js';

type Named = Pick<RevisionRecord, 'slug' | 'number' | 'title'>;

const VERDICT_WORDS: Record<Verdict, string> = {
  recommend: 'recommends',
  'ask-for-changes': 'asks for changes to',
  decline: 'declined',
};

/** What people are told in the life of a correlation's revision. Each text is one sentence. */
export const reviewLetters = {
  asked: (by: Actor, record: Named): Notice => ({
    kind: 'review-asked',
    text: `${by.name} asks you to review ${named(record)}.`,
    href: reviewPath(record),
  }),
  readyAgain: (by: Actor, record: Named): Notice => ({
    kind: 'review-asked',
    text: `${by.name} put ${named(record)} forward again.`,
    href: reviewPath(record),
  }),
  verdict: (by: Actor, record: Named, verdict: Verdict): Notice => ({
    kind: 'verdict',
    text: `${by.name} ${VERDICT_WORDS[verdict]} ${named(record)}.`,
    href: reviewPath(record),
  }),
  declined: (by: Actor, record: Named): Notice => ({
    kind: 'verdict',
    text: `${by.name} declined ${named(record)} as technical authority.`,
    href: reviewPath(record),
  }),
  commented: (by: Actor, record: Named): Notice => ({
    kind: 'comment',
    text: `${by.name} commented on ${named(record)}.`,
    href: reviewPath(record),
  }),
  answered: (by: Actor, record: Named): Notice => ({
    kind: 'comment',
    text: `${by.name} answered a comment on ${named(record)}.`,
    href: reviewPath(record),
  }),
  approved: (by: Actor, record: Named, from: string, at: string): Notice => ({
    kind: 'approval',
    text: `${by.name} approved ${named(record)}${from > at ? ` from ${from.slice(0, 10)} on` : ''}.`,
    href: sheetPath(record),
  }),
  outOfUse: (by: Actor, record: Named, done: 'suspended' | 'withdrew'): Notice => ({
    kind: 'withdrawal',
    text: `${by.name} ${done} ${named(record)}; it is not to be used.`,
    href: sheetPath(record),
  }),
  reinstated: (by: Actor, record: Named): Notice => ({
    kind: 'withdrawal',
    text: `${by.name} reinstated ${named(record)}.`,
    href: sheetPath(record),
  }),
  due: (record: Named, day: string, isDue: boolean): Notice => ({
    kind: 'reminder',
    text: `${named(record)} ${isDue ? 'was' : 'is'} due for review on ${day.slice(0, 10)}.`,
    href: sheetPath(record),
  }),
  superseded: (record: Named, by: number): Notice => ({
    kind: 'approval',
    text: `${named(record)} is superseded by revision ${by}.`,
    href: sheetPath({ ...record, number: by }),
  }),
};

function named({ title, number }: Named): string {
  return `"${title}", revision ${number}`;
}

function reviewPath({ slug, number }: Named): string {
  return `/register/${slug}/revisions/${number}/review`;
}

function sheetPath({ slug, number }: Named): string {
  return `/register/${slug}/revisions/${number}`;
}
