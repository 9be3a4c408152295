/** How much somebody thinks is wrong with a sheet. */
export const REPORT_SEVERITIES = ['question', 'error', 'unsafe'] as const;
export type ReportSeverity = (typeof REPORT_SEVERITIES)[number];

/** What became of a report. */
export const REPORT_OUTCOMES = ['no-fault', 'suspended', 'corrected'] as const;
export type ReportOutcome = (typeof REPORT_OUTCOMES)[number];
