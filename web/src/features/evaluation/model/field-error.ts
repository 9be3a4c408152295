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

/** The message as a line of a summary, where the label beside the field is out of sight. */
export function summaryLine({ field, message }: FieldError, sections: readonly FormSection[]): string {
  const label =
    fieldsOf(sections).find(({ key }) => key === field)?.label ??
    pickersOf(sections).find(({ key }) => `rows.${key}` === field)?.title ??
    FORCE_LABELS[field];
  return label === undefined || message.startsWith(label.split(',')[0] ?? label)
    ? message
    : `${label}: ${message}`;
}

const FORCE_LABELS: Readonly<Record<string, string>> = {
  'drivingForce.interface': 'Flux, at the interface',
  'drivingForce.bulk': 'Flux, in the bulk',
};
