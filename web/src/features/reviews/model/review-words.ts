import type { Checklist, Review, Verdict } from '../../../shared/api/types';

export const CHECKLIST: readonly { point: keyof Checklist; text: string }[] = [
  { point: 'expression', text: 'The expression is that of the source, constant by constant.' },
  {
    point: 'definitions',
    text: 'Every symbol is defined as in the source: its length, its velocity, the state of its properties.',
  },
  { point: 'ranges', text: 'The ranges are those of the source.' },
  { point: 'basis', text: 'The basis of each bound, and that of the coefficient, is right.' },
  { point: 'recalculated', text: 'I recalculated a worked check by hand or by other means.' },
  { point: 'duplicates', text: 'The register has no other sheet of the same equation.' },
];

export const VERDICT_WORDS: Readonly<Record<Verdict['verdict'], string>> = {
  recommend: 'recommends it',
  'ask-for-changes': 'asks for changes',
  decline: 'advises against it',
};

/** How far a revision is from its approval: `1 of 2 favourable reviews.` and what else is missing. */
export function progressWords({ approvals, standing }: Pick<Review, 'approvals' | 'standing'>): string {
  const { favourable, needed } = approvals;
  const count = `${favourable} of ${needed} favourable ${needed === 1 ? 'review' : 'reviews'}.`;
  if (standing !== 'in review') return count;
  const missing = needed - favourable;
  if (missing <= 0) return `${count} It waits for the decision of a technical authority.`;
  return `${count} ${missing === 1 ? 'One more is' : `${missing} more are`} needed before a technical authority can decide.`;
}

/** Why a verdict does not count any more; null where it does. */
export function voidWords(verdict: Verdict, review: Pick<Review, 'iteration' | 'hash'>): string | null {
  if (verdict.current) return null;
  if (verdict.hash !== review.hash || verdict.iteration < review.iteration)
    return `Void: it was given on iteration ${verdict.iteration}, and the content has changed since.`;
  return 'Void: a later verdict has taken its place.';
}

/** `Iteration 2, 3 comments open.` */
export function openWords(open: number): string {
  if (open === 0) return 'No comment is open.';
  return open === 1 ? 'One comment is open.' : `${open} comments are open.`;
}
