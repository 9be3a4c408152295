/** What a revision counts for in the office; told by events, never part of its content. */
export const STANDINGS = [
  'draft',
  'in review',
  'approved',
  'suspended',
  'superseded',
  'withdrawn',
  'declined',
] as const;
export type Standing = (typeof STANDINGS)[number];

/** Why a revision was withdrawn. */
export const WITHDRAWAL_CLASSES = ['error-in-sheet', 'error-in-source', 'unsafe'] as const;
export type WithdrawalClass = (typeof WITHDRAWAL_CLASSES)[number];

/** Standings that only those concerned see: not yet, or never, the office's word. */
export const UNAPPROVED: readonly Standing[] = ['draft', 'in review', 'declined'];
