import type { Checklist, Verdict } from '../../../shared/api/types';
import { CHECKLIST } from './review-words';

export const NOTE_ID = 'verdict-note';

/** Id of a point of the checklist on the page. */
export function pointId(point: keyof Checklist): string {
  return `verdict-${point}`;
}

/** What a verdict still lacks: a favourable one every point of the list, another one a note. */
export function verdictFaults(
  verdict: Verdict['verdict'],
  checklist: Checklist,
  note: string,
): { fieldId: string; message: string }[] {
  if (verdict === 'recommend')
    return CHECKLIST.filter(({ point }) => !checklist[point]).map(({ point, text }) => ({
      fieldId: pointId(point),
      message: `Not checked yet: ${text}`,
    }));
  return note.trim() === '' ? [{ fieldId: NOTE_ID, message: 'Write in the note what is wrong.' }] : [];
}
