import type { ApprovalBody } from '../api/review-calls';

/** An approval as it is typed; dates as the browser's date field has them, or empty. */
export interface ApprovalDraft {
  meaning: string;
  effectiveFrom: string;
  reviewDue: string;
  note: string;
  password: string;
}

export const APPROVAL_IDS = {
  meaning: 'approval-meaning',
  effectiveFrom: 'approval-effective',
  reviewDue: 'approval-review-due',
  note: 'approval-note',
  password: 'approval-password',
} as const satisfies Record<keyof ApprovalDraft, string>;

const SHORTEST_MEANING = 3;

/** What an approval lacks before it can be signed on the given day (`2026-03-04`). */
export function approvalFaults(
  { meaning, effectiveFrom, reviewDue, password }: ApprovalDraft,
  today: string,
): { fieldId: string; message: string }[] {
  const from = effectiveFrom || today;
  return [
    ...(meaning.trim().length < SHORTEST_MEANING
      ? [{ fieldId: APPROVAL_IDS.meaning, message: 'Write what your signature means.' }]
      : []),
    ...(effectiveFrom !== '' && effectiveFrom < today
      ? [
          {
            fieldId: APPROVAL_IDS.effectiveFrom,
            message: 'Choose today or a later day: no approval reaches back.',
          },
        ]
      : []),
    ...(reviewDue !== '' && reviewDue <= from
      ? [{ fieldId: APPROVAL_IDS.reviewDue, message: 'Choose a day after the one it holds from.' }]
      : []),
    ...(password === ''
      ? [{ fieldId: APPROVAL_IDS.password, message: 'Write your password: it signs the approval.' }]
      : []),
  ];
}

/** What is sent: only what was filled in. */
export function approvalBody(draft: ApprovalDraft, hash: string): ApprovalBody {
  const { meaning, effectiveFrom, reviewDue, note, password } = draft;
  return {
    password,
    hash,
    meaning: meaning.trim(),
    ...(note.trim() === '' ? {} : { note: note.trim() }),
    ...(effectiveFrom === '' ? {} : { effectiveFrom }),
    ...(reviewDue === '' ? {} : { reviewDue }),
  };
}
