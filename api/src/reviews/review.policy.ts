import type { FieldProblem } from '../common/problem.js';
import { CHECKLIST_POINTS, type Checklist, type Verdict } from '../common/verdict.js';

/** Who recommends has checked everything; who does not says why. */
export function reviewFaults(review: {
  readonly verdict: Verdict;
  readonly checklist: Checklist;
  readonly note?: string | undefined;
}): FieldProblem[] {
  const { verdict, checklist, note = '' } = review;
  if (verdict === 'recommend') {
    return CHECKLIST_POINTS.filter((point) => !checklist[point]).map((point) => ({
      field: `checklist.${point}`,
      code: 'malformed',
      message: 'A revision is recommended once every point of the list was checked.',
    }));
  }
  if (note.trim() !== '') return [];
  return [{ field: 'note', code: 'missing', message: 'Say what is wrong.' }];
}
