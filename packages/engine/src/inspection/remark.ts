export const INSPECTION_TOPICS = ['definition', 'checks', 'range', 'seams', 'bounds', 'sources'] as const;
export type InspectionTopic = (typeof INSPECTION_TOPICS)[number];

/** One line of the machine's report. Errors stop a submission; warnings travel along to the reviewers. */
export interface Remark {
  verdict: 'passed' | 'warning' | 'error';
  topic: InspectionTopic;
  /** Path in the definition, or empty. */
  field: string;
  message: string;
}
