import { servingQuantity } from '../quantity/dictionary.js';
import { fromSI, measuresSame, toSI } from '../quantity/unit.js';
import {
  unitOf,
  type CompiledEquation,
  type CompiledQuantity,
  type CompiledSheet,
  type PropertyLibrary,
} from '../sheet/compiled.js';
import { PROPERTY_ANSWER } from '../sheet/lines.js';
import { ownValue } from './given-values.js';
import type { EvaluationRequest, Problem } from './outcome.js';
import { Reckoner, type Supply } from './reckoner.js';

/** A property equation at work: the quantity it fills and its own reckoning. */
export interface FilledQuantity {
  symbol: string;
  equation: CompiledEquation;
  reckoner: Reckoner;
}

export interface Supplies {
  supply: Supply;
  /** Property equations used so far, in order. */
  filled: FilledQuantity[];
  /** Rows used so far, by table name. */
  rows: Map<string, string>;
  attach(reckoner: Reckoner): void;
}

/**
 * Where a sheet's quantities come from, in this order: the value given, the chosen row of a table,
 * the property equation that was asked for. Nothing is filled in unasked.
 */
export function suppliesFor(
  sheet: CompiledSheet,
  request: EvaluationRequest,
  given: ReadonlyMap<string, number>,
  library: PropertyLibrary,
): Supplies {
  const filled: FilledQuantity[] = [];
  const rows = new Map<string, string>();
  const inProgress = new Set<string>();
  const definitions = [...sheet.quantities.values()].map(({ definition }) => definition);
  let outer: Reckoner | null = null;

  const fromEquation = (quantity: CompiledQuantity, missing: Set<string>): number | null => {
    const { symbol } = quantity.definition;
    const slug = ownValue(request.equations, symbol);
    const equation = slug === undefined ? undefined : library(slug);
    if (!equation || !outer || inProgress.has(symbol)) return null;
    inProgress.add(symbol);
    const inner = new Reckoner(equation.sheet, innerSupply(symbol, equation, outer));
    const lacking = new Set<string>();
    const solved = inner.solve(PROPERTY_ANSWER, lacking);
    inProgress.delete(symbol);
    for (const name of lacking) missing.add(name);
    if (lacking.size > 0) return null;
    // An equation without a value here is kept too: its bounds and its gaps say why.
    if (!filled.some((other) => other.symbol === symbol)) filled.push({ symbol, equation, reckoner: inner });
    const faults = solved ? signFaults(quantity, equation, inner) : inner.faults;
    for (const fault of faults) outer.addFault({ ...fault, field: `${symbol}.${fault.field}` });
    return solved && faults.length === 0 ? inner.valueOf(PROPERTY_ANSWER) : null;
  };

  /** The equation's own inputs: given as `rho.T`, from its table's row, or the sheet's quantity of that name. */
  const innerSupply =
    (symbol: string, equation: CompiledEquation, sheetReckoner: Reckoner): Supply =>
    (wanted, missing) => {
      const inner = wanted.definition.symbol;
      const direct = given.get(`${symbol}.${inner}`);
      if (direct !== undefined) return direct;
      const row = rowValue(equation.sheet, wanted, request.rows, `${symbol}.`);
      if (row) {
        rows.set(row.name, row.key);
        return row.value;
      }
      const match = servingQuantity(definitions, wanted.definition.is)?.symbol;
      if (match === undefined || inProgress.has(match)) {
        missing.add(`${symbol}.${inner}`);
        return null;
      }
      return sheetReckoner.solve(match, missing) ? sheetReckoner.valueOf(match) : null;
    };

  const supply: Supply = (quantity, missing) => {
    const { symbol } = quantity.definition;
    const direct = given.get(symbol);
    if (direct !== undefined) return direct;
    const row = rowValue(sheet, quantity, request.rows, '');
    if (row) {
      rows.set(row.name, row.key);
      return row.value;
    }
    if (ownValue(request.equations, symbol) !== undefined) return fromEquation(quantity, missing);
    missing.add(symbol);
    return null;
  };

  return { supply, filled, rows, attach: (reckoner) => void (outer = reckoner) };
}

/** A property equation outside its range can give what no fluid has, such as a density below zero. */
function signFaults({ entry }: CompiledQuantity, equation: CompiledEquation, inner: Reckoner): Problem[] {
  const value = inner.valueOf(PROPERTY_ANSWER);
  if (entry.sign === 'any' || value > 0 || (entry.sign === 'non-negative' && value === 0)) return [];
  const shown = `${inner.shownValueOf(PROPERTY_ANSWER).toPrecision(4)} ${equation.definition.unit}`;
  return [
    {
      code: 'domain',
      field: PROPERTY_ANSWER,
      message: `${equation.definition.title} gives ${shown} here, which ${entry.title.toLowerCase()} cannot be.`,
    },
  ];
}

function rowValue(
  sheet: CompiledSheet,
  quantity: CompiledQuantity,
  rows: Record<string, string> | undefined,
  prefix: string,
): { value: number; name: string; key: string } | null {
  const { table: name, symbol } = quantity.definition;
  if (!name) return null;
  const key = ownValue(rows, `${prefix}${name}`) ?? ownValue(rows, name);
  const value = ownValue(sheet.tables.get(name)?.rows.find((row) => row.key === key)?.values, symbol);
  return value === undefined || key === undefined
    ? null
    : { value: toSI(value, quantity.unit), name: `${prefix}${name}`, key };
}

/** Tables, rows and equations a request names exist and are allowed on this sheet. */
export function checkChoices(
  sheet: CompiledSheet,
  request: EvaluationRequest,
  library: PropertyLibrary,
): Problem[] {
  return [...checkEquations(sheet, request, library), ...checkRows(sheet, request, library)];
}

function checkEquations(
  sheet: CompiledSheet,
  request: EvaluationRequest,
  library: PropertyLibrary,
): Problem[] {
  return Object.entries(request.equations ?? {}).flatMap(([symbol, slug]): Problem[] => {
    const field = `equations.${symbol}`;
    const quantity = sheet.quantities.get(symbol);
    if (!quantity)
      return [{ code: 'unknown-symbol', field, message: `There is no quantity ${symbol} to be filled.` }];
    const equation = library(slug);
    if (!quantity.definition.equations?.includes(slug) || !equation)
      return [
        {
          code: 'unknown-equation',
          field,
          message: `"${slug}" is not a property equation this sheet lists for ${symbol}.`,
        },
      ];
    const answer = unitOf(equation.sheet, PROPERTY_ANSWER);
    if (!answer || !measuresSame(answer, quantity.unit))
      return [
        {
          code: 'unknown-equation',
          field,
          message: `"${slug}" gives ${equation.definition.gives} in ${equation.definition.unit}, which is no value for ${symbol}.`,
        },
      ];
    if (Object.hasOwn(request.inputs, symbol))
      return [
        {
          code: 'over-determined',
          field,
          message: `${symbol} is given and also asked from a property equation: choose one.`,
        },
      ];
    if (rowValue(sheet, quantity, request.rows, ''))
      return [
        {
          code: 'over-determined',
          field,
          message: `${symbol} is filled by the chosen row and also asked from a property equation: choose one.`,
        },
      ];
    return [];
  });
}

function checkRows(sheet: CompiledSheet, request: EvaluationRequest, library: PropertyLibrary): Problem[] {
  return Object.entries(request.rows ?? {}).flatMap(([name, key]): Problem[] => {
    const field = `rows.${name}`;
    const table = tableOf(sheet, name, request, library);
    if (!table) return [{ code: 'unknown-row', field, message: `There is no table "${name}" here.` }];
    if (!table.rows.some((row) => row.key === key))
      return [{ code: 'unknown-row', field, message: `Table "${name}" has no row "${key}".` }];
    return [];
  });
}

function tableOf(sheet: CompiledSheet, name: string, request: EvaluationRequest, library: PropertyLibrary) {
  const [head = '', inner] = name.split('.');
  const own = sheet.tables.get(name);
  if (own) return own;
  const slugs = Object.entries(request.equations ?? {}).filter(
    ([symbol]) => inner === undefined || symbol === head,
  );
  for (const [, slug] of slugs) {
    const table = library(slug)?.sheet.tables.get(inner ?? head);
    if (table) return table;
  }
  return undefined;
}

/** A filled quantity's value as the sheet shows it. */
export function filledValue(
  sheet: CompiledSheet,
  { symbol, reckoner }: FilledQuantity,
): { value: number; unit: string } {
  const unit = sheet.quantities.get(symbol)?.unit;
  const si = reckoner.valueOf(PROPERTY_ANSWER);
  return unit ? { value: fromSI(si, unit), unit: unit.text } : { value: si, unit: '1' };
}
