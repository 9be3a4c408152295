import { Injectable } from '@nestjs/common';
import { inspectCorrelation, runPropertyChecks, type InspectionReport, type Remark } from '@merestone/engine';
import { ApiProblem, type FieldProblem } from '../common/problem.js';
import { PropertyLibraryService } from '../property-equations/property-library.service.js';
import { DefinitionsService } from '../revisions/definitions.service.js';
import type { RevisionRecord } from '../revisions/revision-record.js';

/** The check that comes before any reviewer's. Its errors stop a submission; its warnings travel along. */
@Injectable()
export class MachineCheckService {
  constructor(
    private readonly definitions: DefinitionsService,
    private readonly libraries: PropertyLibraryService,
  ) {}

  /** The report, to be kept with the iteration. Throws `machine-check` with every error at its field. */
  pass(record: RevisionRecord): InspectionReport {
    const report = this.inspect(record);
    if (report.passed) return report;
    const fields = report.remarks.filter(({ verdict }) => verdict === 'error').map(fieldProblem);
    const detail = fields.map(({ message }) => message).join(' ');
    throw new ApiProblem('machine-check', detail, { fields, inspection: report });
  }

  private inspect(record: RevisionRecord): InspectionReport {
    if (record.kind === 'correlation') {
      const { library } = this.libraries.approvedOrLatest();
      return inspectCorrelation(this.definitions.definition(record), library);
    }
    const checks = runPropertyChecks(this.definitions.equation(record));
    const remarks = checks.flatMap(({ title, passed }, i): Remark[] =>
      passed
        ? []
        : [
            {
              verdict: 'error',
              topic: 'checks',
              field: `checks[${i}]`,
              message: `"${title}" does not reproduce.`,
            },
          ],
    );
    return { passed: remarks.length === 0, remarks, checks };
  }
}

function fieldProblem({ field, message, topic }: Remark): FieldProblem {
  return { field: field === '' ? 'definition' : `definition.${field}`, code: topic, message };
}
