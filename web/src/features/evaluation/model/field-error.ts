import type { FormField, FormSection } from './duty-form';
import { fieldsOf, pickersOf } from './duty-form';

/** What is wrong with one field, by its key in the form. */
export interface FieldError {
  /** `u`, `rho.T`, `rows.packing`, `drivingForce.bulk`; empty where no field is meant. */
  field: string;
  message: string;
}

/** Of a problem as the engine or the server words it. */
export interface NamedProblem {
  code: string;
  field: string;
  message: string;
}

/** Finds the field on show that a problem is about, following an equation's input to the sheet's own quantity. */
export function fieldErrors(
  problems: readonly NamedProblem[],
  sections: readonly FormSection[],
): FieldError[] {
  const fields = fieldsOf(sections);
  const known = new Set([...fields.map((f) => f.key), ...pickersOf(sections).map((p) => `rows.${p.key}`)]);
  const found = new Map<string, FieldError>();
  for (const { field, message } of problems) {
    const key = keyOf(field, fields, known);
    const id = `${key} ${message}`;
    if (!found.has(id)) found.set(id, { field: key, message });
  }
  return [...found.values()];
}

function keyOf(path: string, fields: readonly FormField[], known: ReadonlySet<string>): string {
  if (path.startsWith('drivingForce.')) return path.split('.').slice(0, 2).join('.');
  const bare = path.replace(/^(inputs|equations)\./, '').replace(/\.(value|unit)$/, '');
  if (known.has(bare)) return bare;
  const served = fields.flatMap((f) =>
    (f.filledBy?.served ?? []).filter((s) => `${f.key}.${s.symbol}` === bare).map((s) => s.key),
  )[0];
  return served !== undefined && known.has(served) ? served : '';
}
