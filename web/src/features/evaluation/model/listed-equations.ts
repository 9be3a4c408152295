import type { Duty } from './duty';
import { fieldsOf, type FormField, type FormSection } from './duty-form';

export type Phase = 'gas' | 'liquid';

const OTHER: Readonly<Record<Phase, Phase>> = { gas: 'liquid', liquid: 'gas' };

/** What one press would choose: the first equation listed for each empty field. */
export interface EquationSet {
  /** Where the sheet serves gases and liquids and lists equations of both, the phase that the set is for. */
  phase: Phase | null;
  fields: FormField[];
  equations: Record<string, string>;
}

/**
 * Property equations for the needed fields that stand empty. Where the fluid may be a gas or a liquid nobody but a
 * person can say which: then there is a set for each.
 */
export function equationSets(
  sections: readonly FormSection[],
  { typed }: Pick<Duty, 'typed'>,
): EquationSet[] {
  const open = fieldsOf(sections).filter(
    ({ key, optional, filledBy, equations }) =>
      equations.length > 0 && !optional && filledBy === null && (typed[key]?.text ?? '').trim() === '',
  );
  if (open.length === 0) return [];
  const phases: (Phase | null)[] = open.some(servesBoth) ? ['gas', 'liquid'] : [null];
  return phases.map((phase) => setFor(phase, open));
}

function servesBoth({ equations }: FormField): boolean {
  const has = (phase: Phase) => equations.some(({ gives }) => gives.startsWith(`${phase}-`));
  return has('gas') && has('liquid');
}

function setFor(phase: Phase | null, open: readonly FormField[]): EquationSet {
  const chosen = open.flatMap((field) => {
    const first = field.equations.find(
      ({ gives }) => phase === null || !gives.startsWith(`${OTHER[phase]}-`),
    );
    return first ? [{ field, slug: first.slug }] : [];
  });
  return {
    phase,
    fields: chosen.map(({ field }) => field),
    equations: Object.fromEntries(chosen.map(({ field, slug }) => [field.key, slug])),
  };
}
