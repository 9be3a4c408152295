import type { DeviationRequest, DrivingForce, EvaluationRequest, InputValue } from '@merestone/engine';
import { readQuantity } from '../../../shared/ui/quantity-field/typed-quantity';
import type { Duty } from './duty';
import { fieldsOf, pickersOf, type FormSection } from './duty-form';
import type { FieldError } from './field-error';

export interface BuiltRequest {
  request: EvaluationRequest;
  /** What cannot be read yet, by field. */
  errors: FieldError[];
  /** Whether anything has been typed or chosen at all. */
  started: boolean;
}

/** The request that the fields on show amount to. What a choice hides is left out, though it stays typed. */
export function buildRequest(sections: readonly FormSection[], duty: Duty): BuiltRequest {
  const inputs: Record<string, InputValue> = {};
  const equations: Record<string, string> = {};
  const rows: Record<string, string> = {};
  const errors: FieldError[] = [];
  for (const field of fieldsOf(sections)) {
    if (field.filledBy) {
      equations[field.key] = field.filledBy.slug;
      continue;
    }
    const reading = readQuantity(duty.typed[field.key] ?? { text: '', unit: field.startUnit });
    if (reading.kind === 'problem') errors.push({ field: field.key, message: reading.message });
    if (reading.kind !== 'value') continue;
    inputs[field.key] =
      field.kind === 'group' ? { value: reading.value } : { value: reading.value, unit: reading.unit };
  }
  for (const picker of pickersOf(sections)) if (picker.chosen) rows[picker.key] = picker.chosen.key;
  const force = readForce(duty, errors);
  return {
    request: {
      inputs,
      ...(isEmpty(rows) ? {} : { rows }),
      ...(isEmpty(equations) ? {} : { equations }),
      ...(force ? { drivingForce: force } : {}),
    },
    errors,
    started: !isEmpty(inputs) || !isEmpty(rows) || !isEmpty(equations) || errors.length > 0,
  };
}

/** The request with the reasons given for the symbols that lie outside. */
export function withDeviations(
  request: EvaluationRequest,
  deviations: DeviationRequest[],
): EvaluationRequest {
  return deviations.length === 0 ? request : { ...request, deviations };
}

/** A driving force counts once both of its sides are given. */
function readForce(duty: Duty, errors: FieldError[]): DrivingForce | null {
  if (!duty.force) return null;
  const sides = { interface: readQuantity(duty.force.interface), bulk: readQuantity(duty.force.bulk) };
  for (const side of ['interface', 'bulk'] as const) {
    const reading = sides[side];
    if (reading.kind === 'problem') errors.push({ field: `drivingForce.${side}`, message: reading.message });
  }
  if (sides.interface.kind !== 'value' || sides.bulk.kind !== 'value') return null;
  return {
    kind: duty.force.kind,
    interface: { value: sides.interface.value, unit: sides.interface.unit },
    bulk: { value: sides.bulk.value, unit: sides.bulk.unit },
  };
}

function isEmpty(record: Record<string, unknown>): boolean {
  return Object.keys(record).length === 0;
}
