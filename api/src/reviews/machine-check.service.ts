import { Injectable } from '@nestjs/common';
import { runChecks, runPropertyChecks, type CheckReport, type Quantity } from '@merestone/engine';
import { ApiProblem, type FieldProblem } from '../common/problem.js';
import { PropertyLibraryService } from '../property-equations/property-library.service.js';
import { DefinitionsService } from '../revisions/definitions.service.js';
import type { RevisionRecord } from '../revisions/revision-record.js';

/** The check that comes before any reviewer's: the sheet compiles and reproduces its own worked checks. */
@Injectable()
export class MachineCheckService {
  constructor(
    private readonly definitions: DefinitionsService,
    private readonly libraries: PropertyLibraryService,
  ) {}

  /** The report on each worked check. Throws `checks-failed`, naming each that does not reproduce. */
  pass(record: RevisionRecord): CheckReport[] {
    const { reports, fields } =
      record.kind === 'correlation' ? this.ofCorrelation(record) : this.ofEquation(record);
    fields.push(...reports.flatMap((report, i) => (report.passed ? [] : [failure(report, i)])));
    if (fields.length === 0) return reports;
    const detail = fields.map(({ message }) => message).join(' ');
    throw new ApiProblem('checks-failed', detail, { fields });
  }

  private ofCorrelation(record: RevisionRecord): { reports: CheckReport[]; fields: FieldProblem[] } {
    const compiled = this.definitions.correlation(record);
    const { library } = this.libraries.approvedOrLatest();
    const fields = unknownEquations(compiled.definition.quantities, (slug) => library(slug) !== undefined);
    return { reports: runChecks(compiled, library), fields };
  }

  private ofEquation(record: RevisionRecord): { reports: CheckReport[]; fields: FieldProblem[] } {
    return { reports: runPropertyChecks(this.definitions.equation(record)), fields: [] };
  }
}

function unknownEquations(
  quantities: readonly Quantity[],
  isKnown: (slug: string) => boolean,
): FieldProblem[] {
  return quantities.flatMap(({ equations = [] }, i) =>
    equations.flatMap((slug, j) =>
      isKnown(slug)
        ? []
        : [
            {
              field: `definition.quantities[${i}].equations[${j}]`,
              code: 'unknown-equation',
              message: `There is no property equation "${slug}" in the register.`,
            },
          ],
    ),
  );
}

function failure({ title, values, problems }: CheckReport, place: number): FieldProblem {
  const off = values
    .filter(({ passed }) => !passed)
    .map(({ symbol, expected, found }) => `${symbol} is ${found ?? 'nothing'} and should be ${expected}`);
  const why = [...problems.map(({ message }) => message), ...off].join('; ');
  const message = `The worked check "${title}" does not reproduce: ${why}.`;
  return { field: `definition.checks[${place}]`, code: 'check-failed', message };
}
