import type { Sheet, Withdrawal } from '../../../shared/api/types';

export const CLASS_WORDS: Readonly<Record<Withdrawal['class'], string>> = {
  'error-in-sheet': 'an error in the sheet',
  'error-in-source': 'an error in the source',
  unsafe: 'designs made with it may do harm',
};

type Life = Pick<Sheet, 'standing' | 'effectiveFrom' | 'reviewDue' | 'inForce'>;

/** The day from which an approval holds that has not come yet; null where there is none. */
export function heldFrom({ standing, effectiveFrom, inForce }: Life): string | null {
  return standing === 'approved' && !inForce ? effectiveFrom : null;
}

/** Whether the day has passed on which an approved revision was to be looked at again. */
export function isOverdue({ standing, reviewDue }: Life, now: Date): boolean {
  return standing === 'approved' && reviewDue !== null && new Date(reviewDue) < now;
}
