import { QUANTITIES } from '../quantity/dictionary.js';
import type { DictionaryEntry, Sign } from '../quantity/dictionary-entry.js';
import { dimensionText, isDimensionless, sameDimension } from '../quantity/dimension.js';
import { measuresSame, readUnit, toSI, type Unit } from '../quantity/unit.js';
import type { CompiledSheet, PropertyLibrary } from '../sheet/compiled.js';
import type { EvaluationRequest, InputValue, Problem } from './outcome.js';

/** What a request gives, in SI: by symbol, and for a property equation by `filled.symbol`. */
export interface GivenValues {
  values: ReadonlyMap<string, number>;
  remarks: string[];
  problems: Problem[];
}

/** Reads the inputs of a request: known symbols, units of the right dimension, values that can be. */
export function readInputs(
  sheet: CompiledSheet,
  request: EvaluationRequest,
  library: PropertyLibrary,
): GivenValues {
  const values = new Map<string, number>();
  const remarks = new Set<string>();
  const problems: Problem[] = [];
  for (const [symbol, input] of Object.entries(request.inputs)) {
    const field = `inputs.${symbol}`;
    const target = targetOf(sheet, symbol, request, library);
    if (!target) {
      problems.push({
        code: 'unknown-symbol',
        field,
        message: `There is no quantity or group ${symbol} to give here.`,
      });
      continue;
    }
    const read = readValue(input, target, field);
    if (!read.ok) problems.push(read.problem);
    else {
      values.set(symbol, read.value);
      if (read.remark) remarks.add(read.remark);
    }
  }
  return { values, remarks: [...remarks], problems };
}

/** What a value is read as: its unit where none is said, the values it can have, and what it is called. */
export interface Target {
  unit: Unit;
  sign: Sign;
  title: string;
  entry: DictionaryEntry | null;
}

function targetOf(
  sheet: CompiledSheet,
  symbol: string,
  request: EvaluationRequest,
  library: PropertyLibrary,
): Target | null {
  const [head = '', inner, ...rest] = symbol.split('.');
  if (rest.length > 0) return null;
  if (inner !== undefined) {
    const slug = ownValue(request.equations, head);
    const equation = slug === undefined ? undefined : library(slug);
    return equation ? targetOf(equation.sheet, inner, { inputs: {} }, library) : null;
  }
  const quantity = sheet.quantities.get(head);
  if (quantity)
    return {
      unit: quantity.unit,
      sign: quantity.entry.sign,
      title: quantity.entry.title,
      entry: quantity.entry,
    };
  const line = sheet.lines.get(head);
  if (line?.line.kind !== 'group') return null;
  return { unit: line.unit, sign: 'non-negative', title: line.line.name, entry: null };
}

type ReadValue = { ok: true; value: number; remark?: string | undefined } | { ok: false; problem: Problem };

/** One number with its unit, in SI, or the problem with it at its field. */
export function readValue(input: InputValue, target: Target, field: string): ReadValue {
  const fault = (code: Problem['code'], message: string): ReadValue => ({
    ok: false,
    problem: { code, field, message },
  });
  if (typeof input.value !== 'number' || !Number.isFinite(input.value))
    return fault('malformed', `${target.title} must be a finite number.`);
  const reading = input.unit === undefined ? { ok: true as const, unit: target.unit } : readUnit(input.unit);
  if (!reading.ok) return fault('unit', `${reading.reason}.`);
  const { unit } = reading;
  if (!sameDimension(unit.dimension, target.unit.dimension))
    return fault(
      'unit',
      `${target.title} is measured in ${dimensionWord(target.unit)}; "${unit.text}" is ${dimensionWord(unit)}.`,
    );
  if (!measuresSame(unit, target.unit))
    return fault(
      'unit',
      target.unit.angular
        ? `${target.title} is an angular speed and "${unit.text}" is none: give it in rad/s or rpm.`
        : `"${unit.text}" is an angular speed and ${target.title.toLowerCase()} is none: give turns per minute as 1/min.`,
    );
  const difference = target.entry?.difference === true;
  if (unit.remark && target.entry?.absolutePressure !== true)
    return fault(
      'unit',
      `A gauge reading has no meaning for ${target.title.toLowerCase()}; give it in an absolute unit.`,
    );
  const value = difference ? input.value * unit.factor : toSI(input.value, unit);
  if (target.sign === 'positive' && value <= 0)
    return fault('domain', `${target.title} must be greater than zero.`);
  if (target.sign === 'non-negative' && value < 0)
    return fault('domain', `${target.title} cannot be negative.`);
  if (target.entry?.fraction === true && value > 1)
    return fault('domain', `${target.title} is a part of a whole: at most 1, which is 100 %.`);
  if (!Number.isFinite(value)) return fault('domain', `${target.title} is too large to be represented.`);
  return { ok: true, value, remark: unit.remark };
}

function dimensionWord(unit: Unit): string {
  return isDimensionless(unit.dimension) ? 'a plain number' : dimensionText(unit.dimension);
}

/** A target by dictionary name, for values that belong to no sheet (a driving force). */
export function targetByName(name: string): Target {
  const entry = QUANTITIES[name];
  const reading = readUnit(entry?.unit ?? '1');
  if (!entry || !reading.ok) throw new RangeError(`${name} is not in the quantity dictionary`);
  return { unit: reading.unit, sign: entry.sign, title: entry.title, entry };
}

export function ownValue<T>(record: Record<string, T> | undefined, key: string): T | undefined {
  return record && Object.hasOwn(record, key) ? record[key] : undefined;
}
