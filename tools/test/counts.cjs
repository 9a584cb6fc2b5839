'use strict';
// Reads what the test runners report, and adds it up. A test that is skipped was not passed, and counts as failed.

/**
 * @typedef {{passed: number, failed: number, notes: string[]}} Counts
 */

/**
 * @param {Record<string, unknown>} report what `jest --json` writes
 * @returns {Counts}
 */
function countJest(report) {
  const skipped = number(report.numPendingTests) + number(report.numTodoTests);
  const broken = number(report.numRuntimeErrorTestSuites);
  const counts = {
    passed: number(report.numPassedTests),
    failed: number(report.numFailedTests) + skipped + broken,
    notes: [note(skipped, 'skipped'), note(broken, 'spec files that could not run')].filter(Boolean),
  };
  return orFailed(
    counts,
    report.success === true || counts.failed > 0,
    'the runner reported a failure without a failed test',
  );
}

/**
 * @param {{stats?: Record<string, number>, errors?: unknown[]}} report what Playwright's JSON reporter writes
 * @returns {Counts}
 */
function countPlaywright(report) {
  const stats = report.stats ?? {};
  const errors = (report.errors ?? []).length;
  const [skipped, flaky] = [number(stats.skipped), number(stats.flaky)];
  return {
    passed: number(stats.expected),
    failed: number(stats.unexpected) + skipped + flaky + errors,
    notes: [
      note(skipped, 'skipped'),
      note(flaky, 'passed only when repeated'),
      note(errors, 'errors outside a test'),
    ].filter(Boolean),
  };
}

/**
 * The counts of a kind, checked against how its program ended: a kind that ran nothing is not green.
 * @param {Counts | undefined} counts undefined when there was no report to read
 * @param {number} code the program's exit code
 * @returns {Counts}
 */
function settle(counts, code) {
  if (!counts) return { passed: 0, failed: 1, notes: ['no report was written'] };
  if (counts.passed + counts.failed === 0) return { ...counts, failed: 1, notes: [...counts.notes, 'no test was run'] };
  return orFailed(counts, code === 0 || counts.failed > 0, `the program ended with code ${code}`);
}

/**
 * @param {Counts[]} all
 * @returns {{passed: number, failed: number}}
 */
function total(all) {
  return all.reduce((sum, one) => ({ passed: sum.passed + one.passed, failed: sum.failed + one.failed }), {
    passed: 0,
    failed: 0,
  });
}

/** The line that a whole run ends with. */
const lastLine = ({ passed, failed }) => `${passed} passed, ${failed} failed`;

const number = (value) => (Number.isInteger(value) ? value : 0);
const note = (count, what) => (count > 0 ? `${count} ${what}` : '');
const orFailed = (counts, fine, why) =>
  fine ? counts : { ...counts, failed: counts.failed + 1, notes: [...counts.notes, why] };

module.exports = { countJest, countPlaywright, settle, total, lastLine };
