import type { CheckReport, InspectionReport, Remark } from '@merestone/engine';

/** A report as it lies in the database. Before there were remarks, the reports on the worked checks alone were kept. */
export function keptInspection(report: unknown): InspectionReport {
  if (!Array.isArray(report)) return report as InspectionReport;
  return { passed: true, remarks: [], checks: report as CheckReport[] };
}

/** How many remarks say that something is wrong, or may be. */
export function countRemarks({ remarks }: InspectionReport): { warnings: number; errors: number } {
  const of = (verdict: Remark['verdict']) => remarks.filter((remark) => remark.verdict === verdict).length;
  return { warnings: of('warning'), errors: of('error') };
}
