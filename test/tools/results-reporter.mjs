import { mkdirSync, writeFileSync } from 'node:fs';
import { dirname } from 'node:path';

/**
 * Every test of a suite, nested suites included.
 * @param {import('@web/test-runner').TestSuiteResult | undefined} suite
 * @returns {import('@web/test-runner').TestResult[]}
 */
const testsOf = (suite) => (suite ? [...suite.tests, ...suite.suites.flatMap(testsOf)] : []);

/**
 * Counts of one finished run. A file that fails outside its tests (import error, time-out) counts
 * as one failed test, so that it cannot vanish from the totals.
 * @param {readonly import('@web/test-runner').TestSession[]} sessions
 */
export function countSessions(sessions) {
  const totals = { passed: 0, failed: 0, skipped: 0 };
  for (const session of sessions) {
    const tests = testsOf(session.testResults);
    const failed = tests.filter((test) => !test.passed && !test.skipped).length;
    totals.passed += tests.filter((test) => test.passed && !test.skipped).length;
    totals.skipped += tests.filter((test) => test.skipped).length;
    totals.failed += failed || (session.passed ? 0 : 1);
  }
  return totals;
}

/**
 * Writes the totals of the component tests to a file for the summary.
 * @param {string} path
 * @returns {import('@web/test-runner').Reporter}
 */
export const resultsReporter = (path) => ({
  onTestRunFinished({ sessions }) {
    mkdirSync(dirname(path), { recursive: true });
    writeFileSync(path, JSON.stringify(countSessions(sessions)));
  },
});
