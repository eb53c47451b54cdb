/** Shapes as vitest's and Playwright's JSON reporters document them. */
import { expect, test } from 'vitest'
import { atLeastOneFailed, closingLine, sum, tallyPlaywright, tallyVitest } from '../../scripts/setup/tally.mjs'

const vitest = {
  numPassedTests: 7,
  numFailedTests: 0,
  numPendingTests: 1,
  numTodoTests: 1,
  success: true,
  testResults: [],
}

test('vitest: skipped and planned tests are skipped', () => {
  expect(tallyVitest(vitest)).toEqual({ passed: 7, failed: 0, skipped: 2 })
})

test('vitest: a file that did not load has failed', () => {
  const testResults = [
    { status: 'failed', assertionResults: [] },
    { status: 'failed', assertionResults: [{ status: 'failed' }] },
    { status: 'passed', assertionResults: [{ status: 'passed' }] },
  ]
  expect(tallyVitest({ ...vitest, numFailedTests: 1, success: false, testResults }).failed).toBe(2)
})

test('vitest: no success is at least one failure', () => {
  expect(tallyVitest({ ...vitest, success: false }).failed).toBe(1)
})

test('Playwright: what passed at the second try has passed, errors outside tests have failed', () => {
  const stats = { expected: 3, unexpected: 1, flaky: 1, skipped: 2 }
  expect(tallyPlaywright({ stats, errors: [{}] })).toEqual({ passed: 4, failed: 2, skipped: 2 })
})

test('a runner that ended badly has failed something', () => {
  expect(atLeastOneFailed(false, { passed: 3, failed: 0, skipped: 0 }).failed).toBe(1)
  expect(atLeastOneFailed(false, { passed: 3, failed: 2, skipped: 0 }).failed).toBe(2)
})

test('the closing line', () => {
  const one = { passed: 3, failed: 0, skipped: 0 }
  expect(closingLine(sum([one, one]))).toBe('6 passed, 0 failed')
  expect(closingLine({ ...one, skipped: 2 })).toBe('3 passed, 0 failed, 2 skipped')
})
