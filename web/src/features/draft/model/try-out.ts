import {
  QUANTITIES,
  evaluate,
  symbolTex,
  unitsFor,
  type CompiledCorrelation,
  type EvaluationRequest,
  type Outcome,
  type PropertyLibrary,
} from '@merestone/engine';
import { readQuantity, type TypedQuantity } from '../../../shared/ui/quantity-field/typed-quantity';
import type { CheckRow } from './draft-form';

/** Numbers put in to see what the draft makes of them; nothing of it is kept. */
export interface TryOutInput {
  typed: Readonly<Record<string, TypedQuantity>>;
  rows: Readonly<Record<string, string>>;
}

export interface TryOutField {
  symbol: string;
  label: string;
  tex: string;
  unit: string;
  units: string[];
  optional: boolean;
}

export type TriedOut =
  { state: 'empty' } | { state: 'outcome'; outcome: Outcome } | { state: 'problems'; messages: string[] };

/**
 * The fields to try the draft with: groups that were given, and the quantities. A quantity that a chosen row fills is
 * not asked for.
 */
export function tryOutFields(
  { definition }: CompiledCorrelation,
  { rows, typed }: TryOutInput,
): TryOutField[] {
  const filled = new Set(
    (definition.tables ?? []).flatMap((table) =>
      Object.keys(table.rows.find(({ key }) => key === rows[table.name])?.values ?? {}),
    ),
  );
  const groups = definition.groups
    .filter(({ symbol }) => typed[symbol] !== undefined)
    .map(({ symbol, name, tex }) => ({
      symbol,
      label: name,
      tex: symbolTex(symbol, tex),
      unit: '1',
      units: ['1'],
      optional: true,
    }));
  const quantities = definition.quantities
    .filter(({ symbol }) => !filled.has(symbol))
    .map(({ symbol, is, unit, tex, role }) => ({
      symbol,
      label: QUANTITIES[is]?.title ?? is,
      tex: symbolTex(symbol, tex),
      unit,
      units: unitsFor(unit, QUANTITIES[is]),
      optional: role === 'state',
    }));
  return [...groups, ...quantities];
}

/** What the draft gives for the numbers put in. */
export function tryOut(
  compiled: CompiledCorrelation,
  library: PropertyLibrary,
  input: TryOutInput,
): TriedOut {
  const { typed, rows } = input;
  const inputs: EvaluationRequest['inputs'] = {};
  for (const { symbol, unit } of tryOutFields(compiled, input)) {
    const reading = readQuantity(typed[symbol] ?? { text: '', unit });
    if (reading.kind === 'problem') return { state: 'problems', messages: [`${symbol}: ${reading.message}`] };
    if (reading.kind === 'value') inputs[symbol] = { value: reading.value, unit: reading.unit };
  }
  if (Object.keys(inputs).length === 0) return { state: 'empty' };
  const chosen = Object.fromEntries(Object.entries(rows).filter(([, key]) => key !== ''));
  const evaluation = evaluate(compiled, { inputs, rows: chosen }, library);
  return evaluation.ok
    ? { state: 'outcome', outcome: evaluation.outcome }
    : { state: 'problems', messages: [...new Set(evaluation.problems.map(({ message }) => message))] };
}

/** The numbers of a worked check, to start a try-out from. */
export function inputOfCheck(check: CheckRow, { definition }: CompiledCorrelation): TryOutInput {
  const units = new Map([
    ...definition.groups.map(({ symbol }) => [symbol, '1'] as const),
    ...definition.quantities.map(({ symbol, unit }) => [symbol, unit] as const),
  ]);
  return {
    typed: Object.fromEntries(
      check.inputs.flatMap(({ symbol, value, unit }) => {
        const own = units.get(symbol);
        return own === undefined ? [] : [[symbol, { text: value, unit: unit || own }] as const];
      }),
    ),
    rows: Object.fromEntries(check.rows.map(({ name, key }) => [name, key])),
  };
}
