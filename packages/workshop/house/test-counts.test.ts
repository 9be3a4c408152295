import { describe, expect, it } from 'vitest';
import { countTests } from './test-counts.mjs';

const report = (numbers: Partial<Parameters<typeof countTests>[0]> = {}) => ({
  numPassedTests: 0,
  numFailedTests: 0,
  numPendingTests: 0,
  numTodoTests: 0,
  testResults: [],
  ...numbers,
});

describe('countTests', () => {
  it('counts what passed and failed', () => {
    expect(countTests(report({ numPassedTests: 7 }), 0)).toEqual({ passed: 7, failed: 0, remarks: [] });
    expect(countTests(report({ numPassedTests: 7, numFailedTests: 2 }), 1)).toMatchObject({
      passed: 7,
      failed: 2,
    });
  });

  it('counts a test that was passed over as failed', () => {
    const counts = countTests(report({ numPassedTests: 7, numPendingTests: 1, numTodoTests: 1 }), 0);
    expect(counts).toEqual({ passed: 7, failed: 2, remarks: ['2 passed over'] });
  });

  it('counts a file that did not load', () => {
    const testResults = [{ name: 'x.test.ts', status: 'failed', assertionResults: [] }];
    expect(countTests(report({ numPassedTests: 7, testResults }), 1)).toEqual({
      passed: 7,
      failed: 1,
      remarks: ['x.test.ts did not load'],
    });
  });

  it('counts an empty run, a run without a report and a bad end as failed', () => {
    expect(countTests(report(), 0)).toEqual({ passed: 0, failed: 1, remarks: ['no test was found'] });
    expect(countTests(undefined, 137)).toMatchObject({ passed: 0, failed: 1 });
    expect(countTests(report({ numPassedTests: 7 }), 1)).toEqual({
      passed: 7,
      failed: 1,
      remarks: ['ended with code 1'],
    });
  });
});
