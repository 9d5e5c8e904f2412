/**
 * Counting what ran, kept apart from running it so that the counting itself is tested.
 * @typedef {{ passed: number, failed: number, skipped: number }} Totals
 * @typedef {{ name: string, runsTests: boolean, exitCode: number, totals: Totals | null }} Outcome
 */

/**
 * Totals of a vitest JSON report. A file that could not be collected counts as one failed test.
 * @param {{ testResults: { status: string, assertionResults: { status: string }[] }[] }} report
 * @returns {Totals}
 */
export function countVitest(report) {
  const totals = { passed: 0, failed: 0, skipped: 0 };
  for (const file of report.testResults) {
    const count = (/** @type {string} */ status) =>
      file.assertionResults.filter((test) => test.status === status).length;
    const failed = count('failed');
    totals.passed += count('passed');
    totals.failed += failed || (file.status === 'failed' ? 1 : 0);
    totals.skipped += file.assertionResults.length - count('passed') - failed;
  }
  return totals;
}

/**
 * What one step adds to the sum. A step that fails without naming a failed test, and a test step
 * that ran no test, each count as one failure: silence is never success.
 * @param {Outcome} outcome
 * @returns {Totals}
 */
export function contribution({ runsTests, exitCode, totals }) {
  const { passed, failed, skipped } = totals ?? { passed: 0, failed: 0, skipped: 0 };
  const silent = runsTests && passed + failed === 0;
  const unexplained = exitCode !== 0 && failed === 0;
  return { passed, skipped, failed: failed + (silent || unexplained ? 1 : 0) };
}

/**
 * Sum over all steps.
 * @param {readonly Outcome[]} outcomes
 * @returns {Totals}
 */
export const sumOf = (outcomes) =>
  outcomes.map(contribution).reduce(
    (sum, add) => ({
      passed: sum.passed + add.passed,
      failed: sum.failed + add.failed,
      skipped: sum.skipped + add.skipped,
    }),
    { passed: 0, failed: 0, skipped: 0 },
  );
