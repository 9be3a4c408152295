import type { ReportOutcome, ReportSeverity } from '../../../shared/api/types';

export const SEVERITIES: readonly { value: ReportSeverity; label: string; hint: string }[] = [
  { value: 'question', label: 'A question', hint: 'Something is not clear.' },
  {
    value: 'error',
    label: 'An error',
    hint: 'Something on the sheet is not as in its source, or not right.',
  },
  { value: 'unsafe', label: 'Unsafe', hint: 'A design made with it may do harm.' },
];

export const SEVERITY_WORDS: Readonly<Record<ReportSeverity, string>> = {
  question: 'asks',
  error: 'reports an error',
  unsafe: 'reports it as unsafe',
};

export const OUTCOMES: readonly { value: ReportOutcome; label: string; hint: string }[] = [
  { value: 'no-fault', label: 'No fault', hint: 'The sheet is right as it stands.' },
  { value: 'corrected', label: 'Corrected', hint: 'A next revision puts it right.' },
  { value: 'suspended', label: 'Suspended', hint: 'It is out of use while the problem is looked into.' },
];

export const OUTCOME_WORDS: Readonly<Record<ReportOutcome, string>> = {
  'no-fault': 'found no fault',
  corrected: 'had it corrected',
  suspended: 'suspended the sheet',
};

const SHORTEST = 10;

/** What is wrong with the words of a report or of its answer; undefined where nothing is. */
export function wordsFault(text: string): string | undefined {
  const { length } = text.trim();
  return length < SHORTEST ? `Write ${SHORTEST} characters at least.` : undefined;
}
