import { lowerFirst } from '../../../shared/format/lower-first';
import type { EvaluationState } from '../hooks/use-evaluation';
import { fieldsOf } from '../model/duty-form';

/** What is still needed before there is a number. */
export function WaitingForDuty({ evaluation }: { evaluation: EvaluationState }) {
  return <p className="outcome-waiting">{wordsFor(evaluation)}</p>;
}

function wordsFor({ preview, sections, definitionProblems }: EvaluationState): string {
  if (definitionProblems.length > 0)
    return `This sheet's definition cannot be computed yet: ${definitionProblems.map((p) => p.message).join(' ')}`;
  if (preview.state === 'wrong') {
    const general = preview.errors.filter((error) => error.field === '').map((error) => error.message);
    return general.length > 0 ? general.join(' ') : 'A number follows once the marked fields are put right.';
  }
  if (preview.state === 'incomplete') {
    const labels = fieldsOf(sections)
      .filter((field) => preview.missing.some((error) => error.field === field.key))
      .map((field) => lowerFirst(field.label));
    return labels.length > 0
      ? `Still needed: ${labels.join('; ')}.`
      : preview.missing.map((p) => p.message).join(' ');
  }
  return 'Fill in the duty; strips, groups and result follow as you type.';
}
