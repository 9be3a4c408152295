import { convert, type Finding } from '@merestone/engine';
import type { EvaluatedSheet } from './evaluated-sheet';
import type { FilledValue } from './filled-values';
import { findingsOf, numbersOf, type Shown } from './shown-outcome';

export interface Readings {
  findings: Finding[];
  /** By symbol, in the symbol's unit on the sheet. */
  values: Record<string, { value: number; unit: string; given?: boolean }>;
}

/** What the sheet's strips and its table of symbols show of the duty: never a number that was refused. */
export function readingsOf(
  shown: Shown,
  inputs: Readonly<Record<string, { value: number; unit?: string | undefined }>>,
  filled: ReadonlyMap<string, FilledValue>,
  { definition }: EvaluatedSheet,
): Readings {
  const values: Readings['values'] = {};
  for (const { symbol, unit } of definition.quantities) {
    const computed = filled.get(symbol);
    const given = inputs[symbol] ?? (computed?.outside === undefined ? computed : undefined);
    const value = given ? convert(given.value, given.unit ?? unit, unit) : null;
    if (value !== null) values[symbol] = { value: tidy(value), unit, given: Object.hasOwn(inputs, symbol) };
  }
  const findings = findingsOf(shown);
  for (const { symbol, value, unit } of findings)
    if (value !== null && !values[symbol]) values[symbol] = { value, unit };
  const numbers = numbersOf(shown);
  if (numbers) {
    for (const [symbol, value] of Object.entries(numbers.groups)) values[symbol] = { value, unit: '1' };
    Object.assign(values, numbers.intermediates);
    for (const { result, coefficient } of numbers.parts) {
      values[result.symbol] = result;
      if (coefficient) values[coefficient.symbol] = coefficient;
    }
  }
  return { findings, values };
}

/** Without the noise that a change of unit leaves in the last bits. */
function tidy(value: number): number {
  return Number(value.toPrecision(12));
}
