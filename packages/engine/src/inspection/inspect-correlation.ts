import { runChecks, reckonCheck, type CheckReport } from '../evaluation/run-checks.js';
import type { Problem } from '../evaluation/outcome.js';
import { checkStructure } from '../sheet/check-structure.js';
import { compileCorrelation } from '../sheet/compile-sheet.js';
import type { CompiledCorrelation, PropertyLibrary } from '../sheet/compiled.js';
import { inspectRange } from './inspect-range.js';
import { inspectSeams } from './inspect-seams.js';
import { inspectSources } from './inspect-sources.js';
import type { Remark } from './remark.js';

/** What the machine found on a submitted sheet. It may go to reviewers when there is no error. */
export interface InspectionReport {
  passed: boolean;
  remarks: Remark[];
  checks: CheckReport[];
}

/**
 * The machine's check of a submission: form, symbols, dimensions, bounds, pieces and their seams, worked checks
 * reproduced, finite values all over the bounded range, sources complete.
 */
export function inspectCorrelation(value: unknown, library: PropertyLibrary): InspectionReport {
  const structure = checkStructure(value);
  if (!structure.ok) return broken(structure.problems);
  const compilation = compileCorrelation(structure.definition);
  if (!compilation.ok) return broken(compilation.problems);
  const { compiled } = compilation;
  const checks = runChecks(compiled, library);
  const remarks: Remark[] = [
    {
      verdict: 'passed',
      topic: 'definition',
      field: '',
      message: 'Every expression parses, every symbol resolves, every dimension closes.',
    },
    ...listedEquations(compiled, library),
    ...checkRemarks(checks),
    ...boundRemarks(compiled),
    ...overRange(compiled, library),
    ...inspectSources(compiled.definition),
  ];
  return { passed: remarks.every(({ verdict }) => verdict !== 'error'), remarks, checks };
}

function broken(problems: readonly Problem[]): InspectionReport {
  return {
    passed: false,
    checks: [],
    remarks: problems.map(({ field, message }) => ({
      verdict: 'error',
      topic: 'definition',
      field,
      message,
    })),
  };
}

function listedEquations({ definition }: CompiledCorrelation, library: PropertyLibrary): Remark[] {
  return definition.quantities.flatMap(({ equations = [] }, i) =>
    equations
      .filter((slug) => !library(slug))
      .map((slug): Remark => ({
        verdict: 'error',
        topic: 'definition',
        field: `quantities[${i}].equations`,
        message: `There is no property equation "${slug}" in use.`,
      })),
  );
}

function checkRemarks(checks: readonly CheckReport[]): Remark[] {
  const remarks = checks.flatMap((check, i): Remark[] => {
    const field = `checks[${i}]`;
    const off = check.values.filter(({ passed }) => !passed);
    if (!check.passed)
      return [
        {
          verdict: 'error',
          topic: 'checks',
          field,
          message: `"${check.title}" does not reproduce: ${[...off.map(differenceText), ...check.problems.map((p) => p.message)].join(' ')}`,
        },
      ];
    if (check.findings.length === 0) return [];
    const symbols = [...new Set(check.findings.map(({ symbol }) => symbol))].join(', ');
    return [
      {
        verdict: 'warning',
        topic: 'checks',
        field,
        message: `"${check.title}" lies outside the bounds of ${symbols}.`,
      },
    ];
  });
  if (!checks.some(({ kind }) => kind === 'published'))
    remarks.push({
      verdict: 'warning',
      topic: 'checks',
      field: 'checks',
      message: 'No worked check is a published one.',
    });
  if (checks.every(({ passed }) => passed))
    remarks.unshift({
      verdict: 'passed',
      topic: 'checks',
      field: 'checks',
      message: `All ${checks.length} worked checks reproduce.`,
    });
  return remarks;
}

function differenceText({ symbol, deviationPercent }: CheckReport['values'][number]): string {
  return deviationPercent === null
    ? `${symbol} has no value.`
    : `${symbol} is off by ${deviationPercent.toPrecision(3)} %.`;
}

function boundRemarks({ definition }: CompiledCorrelation): Remark[] {
  return definition.bounds.flatMap(({ on, basis }, i): Remark[] => {
    const field = `bounds[${i}]`;
    if (basis === 'none')
      return [{ verdict: 'warning', topic: 'bounds', field, message: `No bound is on record for ${on}.` }];
    if (basis === 'common-practice')
      return [
        {
          verdict: 'warning',
          topic: 'bounds',
          field,
          message: `The bound on ${on} is common practice, without a source.`,
        },
      ];
    return [];
  });
}

/** Sampled around the first worked check that reproduces; without one there is no point to start from. */
function overRange(compiled: CompiledCorrelation, library: PropertyLibrary): Remark[] {
  for (const check of compiled.definition.checks) {
    const point = reckonCheck(compiled.sheet, check, library);
    if (point) return [...inspectRange(compiled.sheet, point), ...inspectSeams(compiled.sheet, point)];
  }
  return [];
}
