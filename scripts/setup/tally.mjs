/** Adds up what the test runners report in their JSON files. */

/**
 * @typedef {object} Tally
 * @property {number} passed
 * @property {number} failed
 * @property {number} skipped
 */

/**
 * A file that could not even be loaded has no tests that failed, so it counts as one itself.
 * @param {any} report of vitest
 * @returns {Tally}
 */
export function tallyVitest(report) {
  /** @type {any[]} */
  const files = report.testResults
  const broken = files.filter(
    ({ status, assertionResults }) =>
      status === 'failed' && !assertionResults.some((/** @type {any} */ test) => test.status === 'failed'),
  )
  return atLeastOneFailed(report.success, {
    passed: report.numPassedTests,
    failed: report.numFailedTests + broken.length,
    skipped: report.numPendingTests + report.numTodoTests,
  })
}

/**
 * A test that passed when tried again has passed; `failures.mjs` names it.
 * @param {any} report of Playwright
 * @returns {Tally}
 */
export function tallyPlaywright({ stats, errors }) {
  return {
    passed: stats.expected + stats.flaky,
    failed: stats.unexpected + errors.length,
    skipped: stats.skipped,
  }
}

/**
 * @param {boolean} success
 * @param {Tally} tally
 */
export function atLeastOneFailed(success, tally) {
  return success || tally.failed > 0 ? tally : { ...tally, failed: 1 }
}

/** @param {readonly Tally[]} tallies @returns {Tally} */
export function sum(tallies) {
  const add = (/** @type {keyof Tally} */ key) => tallies.reduce((total, tally) => total + tally[key], 0)
  return { passed: add('passed'), failed: add('failed'), skipped: add('skipped') }
}

/** @param {Tally} tally */
export function closingLine({ passed, failed, skipped }) {
  return `${passed} passed, ${failed} failed${skipped > 0 ? `, ${skipped} skipped` : ''}`
}
