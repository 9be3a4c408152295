import { readFileSync } from 'node:fs';

/**
 * @typedef {object} Counts
 * @property {number} passed
 * @property {number} failed
 * @property {string[]} remarks what a reader of the last lines should know
 */

/**
 * @typedef {{ numPassedTests: number, numFailedTests: number, numPendingTests: number, numTodoTests: number,
 *   testResults: { name: string, status: string, assertionResults: unknown[] }[] }} VitestReport
 */

/**
 * Counts one run of Vitest strictly: a test that was passed over, a file that did not load and a run that ended badly
 * for any other reason all count as failed, and so does a run without a test.
 * @param {VitestReport | undefined} report Vitest's JSON report, undefined when it wrote none
 * @param {number} exitCode
 * @returns {Counts}
 */
export const countTests = (report, exitCode) => {
  if (report === undefined)
    return { passed: 0, failed: 1, remarks: [`ended with code ${String(exitCode)} and no report`] };
  const remarks = [];
  const skipped = report.numPendingTests + report.numTodoTests;
  if (skipped > 0) remarks.push(`${String(skipped)} passed over`);
  const broken = report.testResults.filter(
    (file) => file.status === 'failed' && file.assertionResults.length === 0,
  );
  for (const file of broken) remarks.push(`${file.name} did not load`);
  const passed = report.numPassedTests;
  let failed = report.numFailedTests + skipped + broken.length;
  if (passed + failed === 0) {
    failed = 1;
    remarks.push('no test was found');
  } else if (exitCode !== 0 && failed === 0) {
    failed = 1;
    remarks.push(`ended with code ${String(exitCode)}`);
  }
  return { passed, failed, remarks };
};

/**
 * @param {string} file
 * @returns {VitestReport | undefined}
 */
export const readReport = (file) => {
  try {
    return JSON.parse(readFileSync(file, 'utf8'));
  } catch {
    return undefined;
  }
};
