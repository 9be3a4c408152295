import { commaQuestion } from '../../../shared/ui/quantity-field/typed-quantity';
import { parseTypedNumber } from '../../../shared/ui/quantity-field/parse-typed-number';

/** Something that keeps the form from being a sheet yet. */
export interface FormProblem {
  /** Path in the definition. */
  field: string;
  /** `empty`: nothing has been typed there so far; everything else is wrong as it stands. */
  code: string;
  message: string;
}

export const STILL_EMPTY = 'Still empty.';

/** Reads the texts of a form and notes down what is missing or cannot be read, each at its path. */
export class FormReading {
  readonly problems: FormProblem[] = [];

  /** A text that a sheet cannot be without. */
  text(field: string, typed: string): string {
    if (typed.trim() === '') this.problems.push({ field, code: 'empty', message: STILL_EMPTY });
    return typed;
  }

  /** A name or unit: no space around it counts. */
  name(field: string, typed: string): string {
    return this.text(field, typed.trim());
  }

  /** A number that a sheet cannot be without. */
  number(field: string, typed: string): number | undefined {
    if (typed.trim() === '') this.problems.push({ field, code: 'empty', message: STILL_EMPTY });
    return this.optionalNumber(field, typed);
  }

  optionalNumber(field: string, typed: string): number | undefined {
    const parsed = parseTypedNumber(typed);
    if (parsed.kind === 'number') return parsed.value;
    if (parsed.kind === 'ask') this.unreadable(field, commaQuestion(parsed.readings.map((r) => r.text)));
    if (parsed.kind === 'refused') this.unreadable(field, parsed.message);
    return undefined;
  }

  unreadable(field: string, message: string): void {
    this.problems.push({ field, code: 'unreadable', message });
  }
}

/** A text where there is one. */
export function optional(typed: string): string | undefined {
  return typed.trim() === '' ? undefined : typed;
}

/** The same without space around it, for names, symbols and units. */
export function optionalName(typed: string): string | undefined {
  return optional(typed.trim());
}

/** An object without the members that are undefined. */
export function compact<T extends Record<string, unknown>>(members: T): T {
  return Object.fromEntries(Object.entries(members).filter(([, value]) => value !== undefined)) as T;
}
