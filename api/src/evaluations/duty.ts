import {
  servingQuantity,
  type CompiledCorrelation,
  type EvaluationRequest,
  type InputValue,
} from '@merestone/engine';

/** An operating point that no sheet is bound to: keyed by names of the quantity dictionary. */
export interface Duty {
  /** Values by dictionary name, each with its unit. */
  readonly values: ReadonlyMap<string, Required<InputValue>>;
  /** Groups by symbol, with what they mean; they serve a sheet that defines the same group. */
  readonly groups: readonly { symbol: string; meaning: string; value: InputValue }[];
  /** Property equations by dictionary name of what they fill, with the inputs that were given for them alone. */
  readonly equations: ReadonlyMap<string, { slug: string; inputs: ReadonlyMap<string, InputValue> }>;
  /** Chosen rows by table. */
  readonly rows: Readonly<Record<string, string>>;
}

/** A request to one sheet, put into words that other sheets understand. */
export function dutyOf({ definition }: CompiledCorrelation, request: EvaluationRequest): Duty {
  const values = new Map<string, Required<InputValue>>();
  const equations = new Map<string, { slug: string; inputs: ReadonlyMap<string, InputValue> }>();
  for (const { symbol, is, unit } of definition.quantities) {
    const given = own(request.inputs, symbol);
    if (given) values.set(is, { value: given.value, unit: given.unit ?? unit });
    const slug = own(request.equations, symbol);
    if (slug !== undefined) equations.set(is, { slug, inputs: inputsOfEquation(request, symbol) });
  }
  const groups = definition.groups.flatMap(({ symbol, expression }) => {
    const value = own(request.inputs, symbol);
    return value ? [{ symbol, meaning: meaningOf(definition, expression), value }] : [];
  });
  return { values, groups, equations, rows: request.rows ?? {} };
}

/** What of a duty a sheet can use, by its own symbols. */
export function requestFor({ definition, sheet }: CompiledCorrelation, duty: Duty): EvaluationRequest {
  const inputs: Record<string, InputValue> = {};
  const equations: Record<string, string> = {};
  for (const { symbol, is, equations: offered = [] } of definition.quantities) {
    const value = servingValue(duty, is);
    if (value) {
      inputs[symbol] = value;
      continue;
    }
    const choice = duty.equations.get(is);
    if (choice === undefined || !offered.includes(choice.slug)) continue;
    equations[symbol] = choice.slug;
    for (const [inner, given] of choice.inputs) inputs[`${symbol}.${inner}`] = given;
  }
  for (const { symbol, expression } of definition.groups) {
    const given = duty.groups.find((group) => group.symbol === symbol);
    if (given?.meaning === meaningOf(definition, expression)) inputs[symbol] = given.value;
  }
  const rows = Object.fromEntries(
    Object.entries(duty.rows).filter(([table, key]) =>
      sheet.tables.get(table)?.rows.some((row) => row.key === key),
    ),
  );
  return { inputs, equations, rows };
}

function servingValue({ values }: Duty, wanted: string): InputValue | undefined {
  const named = [...values].map(([is, value]) => ({ is, value }));
  return servingQuantity(named, wanted)?.value;
}

function inputsOfEquation({ inputs }: EvaluationRequest, symbol: string): ReadonlyMap<string, InputValue> {
  const prefix = `${symbol}.`;
  return new Map(
    Object.entries(inputs)
      .filter(([key]) => key.startsWith(prefix))
      .map(([key, value]) => [key.slice(prefix.length), value]),
  );
}

/** A group's expression with dictionary names for its symbols: equal for sheets that mean the same by it. */
function meaningOf({ quantities }: CompiledCorrelation['definition'], expression: string): string {
  const names = new Map(quantities.map(({ symbol, is }) => [symbol, is]));
  return expression
    .replaceAll(/\s+/g, '')
    .replaceAll(/[A-Za-z][A-Za-z0-9_]*/g, (symbol) => `<${names.get(symbol) ?? symbol}>`);
}

function own<T>(record: Readonly<Record<string, T>> | undefined, key: string): T | undefined {
  return record && Object.hasOwn(record, key) ? record[key] : undefined;
}
