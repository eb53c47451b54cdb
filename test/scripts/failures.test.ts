/** Shapes as vitest's and Playwright's JSON reporters document them. */
import { expect, test } from 'vitest'
import { failuresOfPlaywright, failuresOfVitest } from '../../scripts/setup/failures.mjs'

test('vitest: failed tests and files that did not load, with the reason', () => {
  const testResults = [
    { name: 'a.test.ts', status: 'failed', message: 'cannot be loaded', assertionResults: [] },
    {
      name: 'b.test.ts',
      status: 'failed',
      message: '',
      assertionResults: [
        { status: 'passed', fullName: 'one' },
        { status: 'failed', fullName: 'two', failureMessages: ['seed 5'] },
      ],
    },
  ]
  expect(failuresOfVitest({ testResults })).toEqual([
    'failed: a.test.ts\n    cannot be loaded',
    'failed: b.test.ts › two\n    seed 5',
  ])
})

test('Playwright: tests that failed, for good or at first, at any depth, and errors outside tests', () => {
  const spec = (title: string, status: string, message: string) => ({
    title,
    tests: [{ status, results: [{ error: { message } }, {}] }],
  })
  const inner = { file: 'x.spec.ts', specs: [spec('drag', 'flaky', '\u001b[31mlate\u001b[0m')] }
  const outer = {
    file: 'x.spec.ts',
    specs: [spec('load', 'expected', ''), spec('click', 'unexpected', 'gone')],
    suites: [inner],
  }
  expect(failuresOfPlaywright({ suites: [outer], errors: [{ message: 'no server' }] })).toEqual([
    'failed: x.spec.ts › click\n    gone',
    'failed at first only: x.spec.ts › drag\n    late',
    'failed: outside tests\n    no server',
  ])
})

test('where nothing failed there is nothing to tell', () => {
  expect(failuresOfVitest({ testResults: [{ status: 'passed', assertionResults: [{ status: 'passed' }] }] })).toEqual(
    [],
  )
  expect(failuresOfPlaywright({})).toEqual([])
})
