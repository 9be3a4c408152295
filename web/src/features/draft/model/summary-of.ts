import type { SummaryError } from '../../../shared/ui/error-summary';
import type { DraftForm } from './draft-form';
import { draftFieldId } from './field-id';
import type { FormProblem } from './form-reading';
import { placeWords } from './place-words';

const MOST = 12;

/** The first problems of the form as lines that lead to their fields, and how many more there are. */
export function summaryOf(problems: readonly FormProblem[], form: DraftForm): SummaryError[] {
  const shown = problems.slice(0, MOST).map(({ field, message }): SummaryError => ({
    fieldId: draftFieldId(field),
    message: field === 'slug' ? message : `${placeWords(field, form)}: ${message}`,
  }));
  const rest = problems.length - shown.length;
  return rest > 0 ? [...shown, { message: `… and ${rest} more; the margin lists them all.` }] : shown;
}
