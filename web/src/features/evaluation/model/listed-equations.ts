import type { Duty } from './duty';
import { fieldsOf, type FormField, type FormSection } from './duty-form';

/** An empty field that a listed property equation could fill, with the first one listed for it. */
export interface ListedEquation {
  field: FormField;
  slug: string;
}

/** Needed fields that stand empty and for which the sheet lists property equations. */
export function listedEquations(
  sections: readonly FormSection[],
  { typed }: Pick<Duty, 'typed'>,
): ListedEquation[] {
  return fieldsOf(sections).flatMap((field) => {
    const [first] = field.equations;
    const open = !field.optional && field.filledBy === null && (typed[field.key]?.text ?? '').trim() === '';
    return first && open ? [{ field, slug: first.slug }] : [];
  });
}
