/** Names what failed, at first or for good, with the first lines of why, from the JSON files of the test runners. */

const COLOUR = new RegExp(`${String.fromCharCode(27)}\\[[0-9;]*m`, 'g')
const MOST_LINES = 12

/**
 * @param {any} report of vitest
 * @returns {string[]}
 */
export function failuresOfVitest({ testResults }) {
  return testResults.flatMap((/** @type {any} */ file) => {
    const failed = file.assertionResults.filter((/** @type {any} */ test) => test.status === 'failed')
    if (file.status === 'failed' && failed.length === 0) return [told(file.name, file.message)]
    return failed.map((/** @type {any} */ test) =>
      told(`${file.name} › ${test.fullName}`, (test.failureMessages ?? []).join('\n')),
    )
  })
}

/**
 * @param {any} report of Playwright
 * @returns {string[]}
 */
export function failuresOfPlaywright({ suites = [], errors = [] }) {
  return [...suites.flatMap(inSuite), ...errors.map((/** @type {any} */ error) => told('outside tests', error.message))]
}

/** @param {any} suite @returns {string[]} */
function inSuite({ file, specs = [], suites = [] }) {
  const own = specs.flatMap((/** @type {any} */ { title, tests }) =>
    tests
      .filter((/** @type {any} */ { status }) => status === 'unexpected' || status === 'flaky')
      .map((/** @type {any} */ { status, results }) => {
        const { error } = results.find((/** @type {any} */ result) => result.error) ?? {}
        return told(`${file} › ${title}`, error?.message ?? 'no message', status === 'flaky' ? 'at first only' : '')
      }),
  )
  return [...own, ...suites.flatMap(inSuite)]
}

/** @param {string} name @param {string} [why] @param {string} [when] */
function told(name, why = '', when = '') {
  const lines = why.replace(COLOUR, '').split('\n').slice(0, MOST_LINES)
  return [`failed${when && ` ${when}`}: ${name}`, ...lines.map((line) => `    ${line}`)].join('\n')
}
