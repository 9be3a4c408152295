import { fromSI, readUnit, toSI } from '../quantity/unit.js';
import {
  unitOf,
  type CompiledCorrelation,
  type CompiledEquation,
  type CompiledSheet,
  type PropertyLibrary,
} from '../sheet/compiled.js';
import type { WorkedCheck } from '../sheet/common-schema.js';
import { PROPERTY_ANSWER } from '../sheet/lines.js';
import { findingsOf } from './findings-of.js';
import { readInputs } from './given-values.js';
import type { EvaluationRequest, Finding, Problem } from './outcome.js';
import { reckon } from './reckon.js';
import type { Reckoner } from './reckoner.js';
import { checkChoices } from './supplies.js';

export interface CheckedValue {
  symbol: string;
  expected: number;
  found: number | null;
  deviationPercent: number | null;
  unit: string;
  passed: boolean;
}

/** What became of one worked check. */
export interface CheckReport {
  title: string;
  kind: WorkedCheck['kind'];
  source: string | null;
  note: string | null;
  tolerancePercent: number;
  passed: boolean;
  values: CheckedValue[];
  /** Where the check itself lies outside a bound: published examples sometimes do. */
  findings: Finding[];
  problems: Problem[];
}

/**
 * Recomputes a sheet's worked checks. Bounds are reported and do not refuse here: the question is whether the formula
 * is written down right, not whether it may be used.
 */
export function runChecks(compiled: CompiledCorrelation, library: PropertyLibrary): CheckReport[] {
  return compiled.definition.checks.map((check) => runCheck(compiled.sheet, check, library));
}

export function runPropertyChecks(compiled: CompiledEquation): CheckReport[] {
  return compiled.definition.checks.map((check) => runCheck(compiled.sheet, check, () => undefined));
}

function runCheck(sheet: CompiledSheet, check: WorkedCheck, library: PropertyLibrary): CheckReport {
  const request: EvaluationRequest = { inputs: check.inputs, rows: check.rows, equations: check.equations };
  const given = readInputs(sheet, request, library);
  const problems = [...given.problems, ...checkChoices(sheet, request, library)];
  const work = reckon(sheet, request, given.values, library);
  const values = Object.entries(check.expected).map(([symbol, expected]): CheckedValue => {
    const missing = new Set<string>();
    const solved = problems.length === 0 && work.reckoner.solve(symbol, missing);
    if (!solved) problems.push(...unsolved(symbol, missing, work.reckoner.faults));
    return compare(
      sheet,
      symbol,
      expected,
      solved ? work.reckoner.valueOf(symbol) : null,
      check.tolerancePercent,
    );
  });
  const parts = new Set([...sheet.lines.values()].flatMap(({ line }) => line.part ?? []));
  const findings = problems.length > 0 ? [] : findingsOf(work.reckoner, work.supplies.filled, parts);
  return {
    title: check.title,
    kind: check.kind,
    source: check.source ?? null,
    note: check.note ?? null,
    tolerancePercent: check.tolerancePercent,
    passed: problems.length === 0 && values.every(({ passed }) => passed),
    values,
    findings: findings.filter(
      ({ kind }) => kind === 'outside' || kind === 'past-reach' || kind === 'between',
    ),
    problems,
  };
}

/** The point of a worked check with every part worked out that can be; null where its inputs cannot be used. */
export function reckonCheck(
  sheet: CompiledSheet,
  check: WorkedCheck,
  library: PropertyLibrary,
): Reckoner | null {
  const request: EvaluationRequest = { inputs: check.inputs, rows: check.rows, equations: check.equations };
  const given = readInputs(sheet, request, library);
  if (given.problems.length > 0 || checkChoices(sheet, request, library).length > 0) return null;
  return reckon(sheet, request, given.values, library).reckoner;
}

function unsolved(symbol: string, missing: ReadonlySet<string>, faults: readonly Problem[]): Problem[] {
  if (faults.length > 0) return [...faults];
  const lacking = [...missing].join(', ') || 'no piece of the equation covers the inputs';
  return [{ code: 'missing', field: symbol, message: `${symbol} cannot be worked out: ${lacking}.` }];
}

function compare(
  sheet: CompiledSheet,
  symbol: string,
  expected: WorkedCheck['expected'][string],
  found: number | null,
  tolerancePercent: number,
): CheckedValue {
  const own = unitOf(sheet, symbol);
  const reading = expected.unit === undefined ? undefined : readUnit(expected.unit);
  const unit = reading?.ok ? reading.unit : own;
  const expectedSI = unit ? toSI(expected.value, unit) : expected.value;
  const deviation = found === null ? null : deviationOf(found, expectedSI);
  return {
    symbol,
    expected: expected.value,
    found: found === null || !unit ? found : fromSI(found, unit),
    deviationPercent: deviation,
    unit: unit?.text ?? '1',
    passed: deviation !== null && Math.abs(deviation) <= tolerancePercent,
  };
}

function deviationOf(found: number, expected: number): number {
  if (expected === 0) return found === 0 ? 0 : Number.POSITIVE_INFINITY;
  return (found / expected - 1) * 100;
}

/** Value of a property equation at given inputs, in its unit; null with the problems where it has none. */
export function propertyValue(
  compiled: CompiledEquation,
  request: EvaluationRequest,
): { value: number; findings: Finding[] } | { value: null; problems: Problem[] } {
  const none = () => undefined;
  const given = readInputs(compiled.sheet, request, none);
  if (given.problems.length > 0) return { value: null, problems: given.problems };
  const work = reckon(compiled.sheet, request, given.values, none);
  const missing = new Set<string>();
  if (!work.reckoner.solve(PROPERTY_ANSWER, missing))
    return { value: null, problems: unsolved(PROPERTY_ANSWER, missing, work.reckoner.faults) };
  return {
    value: work.reckoner.shownValueOf(PROPERTY_ANSWER),
    findings: findingsOf(work.reckoner, [], new Set()),
  };
}
