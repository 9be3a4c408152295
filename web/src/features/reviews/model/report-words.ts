import type { InspectionReport, InspectionTopic, Remark } from '@merestone/engine';

export const TOPIC_WORDS: Readonly<Record<InspectionTopic, string>> = {
  definition: 'Expressions and dimensions',
  checks: 'Worked checks',
  range: 'Over the range',
  seams: 'Seams of the pieces',
  bounds: 'Bounds',
  sources: 'Sources',
};

/** `No error. 3 warnings travel along; 5 points passed.` */
export function reportSummary({ remarks }: InspectionReport): string {
  const count = (verdict: Remark['verdict']) => remarks.filter((remark) => remark.verdict === verdict).length;
  const [errors, warnings, passed] = [count('error'), count('warning'), count('passed')];
  const errorWords = errors === 0 ? 'No error.' : errors === 1 ? 'One error.' : `${errors} errors.`;
  const warningWords =
    warnings === 0
      ? 'No warning'
      : warnings === 1
        ? 'One warning, for a reviewer to judge'
        : `${warnings} warnings, for a reviewer to judge`;
  return `${errorWords} ${warningWords}; ${passed === 1 ? 'one point' : `${passed} points`} passed.`;
}
