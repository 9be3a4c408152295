import { convert } from '@merestone/engine';
import { parseTypedNumber, typedValue } from './parse-typed-number';

/** A quantity as it stands in a form: the very text that was typed, and the unit chosen beside it. */
export interface TypedQuantity {
  text: string;
  unit: string;
  /** The unit before it was changed under a typed number, until it is said whether to convert. */
  unitBefore?: string;
}

export type QuantityReading =
  { kind: 'empty' } | { kind: 'value'; value: number; unit: string } | { kind: 'problem'; message: string };

const DIGITS = 12;

/** The value a typed quantity stands for, or what has to be settled first. */
export function readQuantity(typed: TypedQuantity): QuantityReading {
  const number = parseTypedNumber(typed.text);
  if (number.kind === 'empty') return { kind: 'empty' };
  if (number.kind === 'refused') return { kind: 'problem', message: number.message };
  if (number.kind === 'ask')
    return { kind: 'problem', message: commaQuestion(number.readings.map((r) => r.text)) };
  if (typed.unitBefore !== undefined)
    return { kind: 'problem', message: 'The unit was changed: convert the number or keep it.' };
  return { kind: 'value', value: number.value, unit: typed.unit };
}

/** The question about a comma, with every way to read it. */
export function commaQuestion(texts: readonly string[]): string {
  return `Do you mean ${texts.join(' or ')}?`;
}

/** The quantity with another unit; under a typed number the change is asked about. */
export function withUnit(typed: TypedQuantity, unit: string): TypedQuantity {
  const before = typed.unitBefore ?? typed.unit;
  const same = typed.text.trim() === '' || typedValue(typed.text) === null || before === unit;
  return same ? { text: typed.text, unit } : { text: typed.text, unit, unitBefore: before };
}

/** The number put into the new unit, at full precision without the noise of the last bits. */
export function convertedText(typed: TypedQuantity): string | null {
  const value = typedValue(typed.text);
  if (value === null || typed.unitBefore === undefined) return null;
  const converted = convert(value, typed.unitBefore, typed.unit);
  return converted === null || !Number.isFinite(converted)
    ? null
    : String(Number(converted.toPrecision(DIGITS)));
}
