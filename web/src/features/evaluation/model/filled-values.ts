import { propertyValue, type InputValue, type Numbers, type PropertyLibrary } from '@merestone/engine';
import type { BuiltRequest } from './build-request';
import { firstSentence } from './first-sentence';
import { refusingFindings } from './refusing-findings';
import { fieldsOf, type FormField, type FormSection } from './duty-form';

/** The value that a property equation puts into a field. */
export interface FilledValue {
  value: number;
  unit: string;
  /** Why the value is not shown: the equation does not hold there. */
  outside?: string;
}

/**
 * What the chosen property equations come to, each as soon as its own inputs are there: also while other fields are
 * still empty, and where a bound of the sheet refuses the result.
 */
export function filledValues(
  library: PropertyLibrary,
  { request }: BuiltRequest,
  sections: readonly FormSection[],
): ReadonlyMap<string, FilledValue> {
  const fields = fieldsOf(sections);
  const found = new Map<string, FilledValue>();
  const pending = fields.filter((field) => field.filledBy !== null);
  for (let round = 0; round < pending.length; round += 1)
    for (const field of pending) {
      if (found.has(field.key)) continue;
      const value = valueOf(field, library, request.inputs, request.rows ?? {}, found);
      if (value !== null) found.set(field.key, value);
    }
  return found;
}

/** With the values that a number on show was computed from, also where a deviation took them outside. */
export function withUsed(
  filled: ReadonlyMap<string, FilledValue>,
  numbers: Numbers | null,
): ReadonlyMap<string, FilledValue> {
  const used = numbers?.equations ?? [];
  return used.length === 0
    ? filled
    : new Map([...filled, ...used.map(({ symbol, value, unit }) => [symbol, { value, unit }] as const)]);
}

function valueOf(
  { key, unit, filledBy }: FormField,
  library: PropertyLibrary,
  inputs: Record<string, InputValue>,
  rows: Record<string, string>,
  found: ReadonlyMap<string, FilledValue>,
): FilledValue | null {
  const equation = filledBy ? library(filledBy.slug) : undefined;
  if (!filledBy || !equation) return null;
  const own: Record<string, InputValue> = {};
  for (const [name, value] of Object.entries(inputs))
    if (name.startsWith(`${key}.`)) own[name.slice(key.length + 1)] = value;
  for (const { key: onSheet, symbol } of filledBy.served) {
    const value = inputs[onSheet] ?? found.get(onSheet);
    if (value) own[symbol] = value;
  }
  const ownRows = Object.entries(rows)
    .filter(([name]) => name.startsWith(`${key}.`))
    .map(([name, row]) => [name.slice(key.length + 1), row] as const);
  const result = propertyValue(equation, { inputs: own, rows: Object.fromEntries(ownRows) });
  if (result.value === null) return null;
  const outside = refusingFindings(result.findings).map(({ message }) => firstSentence(message));
  return {
    value: result.value,
    unit: equation.definition.unit || unit,
    ...(outside.length > 0 ? { outside: outside.join(' ') } : {}),
  };
}
