/** A reviewer's word on one content of a revision. */
export const VERDICTS = ['recommend', 'ask-for-changes', 'decline'] as const;
export type Verdict = (typeof VERDICTS)[number];

/**
 * What a reviewer held against the source: the expression, the definitions of its symbols, the ranges and their
 * basis, an own recalculation, and that the register has no second sheet of the same equation.
 */
export const CHECKLIST_POINTS = [
  'expression',
  'definitions',
  'ranges',
  'basis',
  'recalculated',
  'duplicates',
] as const;
export type ChecklistPoint = (typeof CHECKLIST_POINTS)[number];
export type Checklist = Record<ChecklistPoint, boolean>;
