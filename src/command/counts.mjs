/**
 * How many tests passed, failed and were skipped.
 *
 * @typedef {{ passed: number, failed: number, skipped: number }} Counts
 */

/**
 * The counts in a JSON report of vitest.
 *
 * @param {string} text
 * @returns {Counts}
 */
export function countsOfVitest(text) {
  const report = JSON.parse(text)
  return {
    passed: report.numPassedTests,
    failed: report.numFailedTests,
    skipped: report.numPendingTests + report.numTodoTests,
  }
}

/**
 * The counts in a JSON report of Playwright. A test that failed at first and then passed counts as
 * failed.
 *
 * @param {string} text
 * @returns {Counts}
 */
export function countsOfPlaywright(text) {
  const { stats } = JSON.parse(text)
  return {
    passed: stats.expected,
    failed: stats.unexpected + stats.flaky,
    skipped: stats.skipped,
  }
}

/**
 * @param {Counts} a
 * @param {Counts} b
 * @returns {Counts}
 */
export function addCounts(a, b) {
  return {
    passed: a.passed + b.passed,
    failed: a.failed + b.failed,
    skipped: a.skipped + b.skipped,
  }
}

/**
 * The last line of a run: `12 passed, 0 failed`, and the skipped ones where there are any.
 *
 * @param {Counts} counts
 */
export function formatCounts({ passed, failed, skipped }) {
  return `${passed} passed, ${failed} failed${skipped > 0 ? `, ${skipped} skipped` : ''}`
}
