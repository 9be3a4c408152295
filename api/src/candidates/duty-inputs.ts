import { convert, QUANTITIES, type InputValue } from '@merestone/engine';
import type { FieldProblem } from '../common/problem.js';

export interface DutyInputs {
  readonly values: ReadonlyMap<string, Required<InputValue>>;
  readonly problems: readonly FieldProblem[];
}

/** Reads values keyed by dictionary name: known names, units that fit, values that can be. */
export function readDutyInputs(inputs: Readonly<Record<string, InputValue>>): DutyInputs {
  const values = new Map<string, Required<InputValue>>();
  const problems: FieldProblem[] = [];
  for (const [name, { value, unit }] of Object.entries(inputs)) {
    const field = `inputs.${name}`;
    const entry = Object.hasOwn(QUANTITIES, name) ? QUANTITIES[name] : undefined;
    if (entry === undefined) {
      problems.push({
        field,
        code: 'unknown-symbol',
        message: `"${name}" is not in the quantity dictionary.`,
      });
      continue;
    }
    const si = convert(value, unit ?? entry.unit, entry.unit);
    if (si === null) {
      const message = `${entry.title} cannot be measured in "${unit ?? entry.unit}"; its unit is ${entry.unit}.`;
      problems.push({ field: `${field}.unit`, code: 'unit', message });
      continue;
    }
    const impossible = (entry.sign === 'positive' && si <= 0) || (entry.sign === 'non-negative' && si < 0);
    if (impossible || !Number.isFinite(si)) {
      const must = entry.sign === 'non-negative' ? 'cannot be negative' : 'must be greater than zero';
      problems.push({ field, code: 'domain', message: `${entry.title} ${must}.` });
      continue;
    }
    values.set(name, { value, unit: unit ?? entry.unit });
  }
  return { values, problems };
}
