/**
 * `npm test`: installs, then checks types and style, runs the unit tests, builds, and runs the browser tests against the
 * build. Every step runs even if an earlier one failed; the last line counts the tests, and a failed step as one more.
 */
import { nodeProblem } from './setup/node-version.mjs'

const problem = nodeProblem(process.version)
if (problem) {
  console.error(problem)
  process.exit(1)
}

const { mkdtempSync, readFileSync, rmSync } = await import('node:fs')
const { tmpdir } = await import('node:os')
const { join } = await import('node:path')
const { fail, Refusal, run, runNode } = await import('./setup/project.mjs')
const { ensureInstalled, npmCommand } = await import('./setup/install.mjs')
const { ensureBuilt } = await import('./setup/build.mjs')
const { ensureChromium, FIREFOX, findOrInstall } = await import('./setup/browsers.mjs')
const { probePort } = await import('./setup/port.mjs')
const { atLeastOneFailed, closingLine, sum, tallyPlaywright, tallyVitest } = await import('./setup/tally.mjs')
const { failuresOfPlaywright, failuresOfVitest } = await import('./setup/failures.mjs')

/** @typedef {import('./setup/tally.mjs').Tally} Tally */

const FAILED = { passed: 0, failed: 1, skipped: 0 }
const NOTHING = { passed: 0, failed: 0, skipped: 0 }
/** @type {string[]} */
const failures = []
const reports = mkdtempSync(join(tmpdir(), 'longhence-'))

/** @returns {Tally} */
function check() {
  const [command, ...args] = npmCommand(process.env)
  return run(command, [...args, 'run', 'check']) === 0 ? NOTHING : failed('failed: types, lint or format')
}

/** @returns {Tally} */
function unitTests() {
  const report = join(reports, 'unit.json')
  const args = ['run', '--config', 'test/vitest.config.ts', '--reporter=default', '--reporter=json']
  const code = runNode('vitest/vitest.mjs', [...args, `--outputFile.json=${report}`])
  return atLeastOneFailed(code === 0, read(report, tallyVitest, failuresOfVitest))
}

/** @returns {Tally} */
function build() {
  try {
    ensureBuilt()
    return NOTHING
  } catch (error) {
    if (!(error instanceof Refusal)) throw error
    return failed(error.message)
  }
}

/**
 * @param {string} chromium
 * @returns {Promise<Tally>}
 */
async function browserTests(chromium) {
  const report = join(reports, 'browser.json')
  const code = runNode('@playwright/test/cli.js', ['test', '--config', 'e2e/playwright.config.ts'], {
    CHROMIUM_PATH: chromium,
    PLAYWRIGHT_JSON_OUTPUT_FILE: report,
    PORT: String(await probePort(0)),
  })
  return atLeastOneFailed(code === 0, read(report, tallyPlaywright, failuresOfPlaywright))
}

/**
 * @param {string} file
 * @param {(report: any) => Tally} tally
 * @param {(report: any) => string[]} told
 */
function read(file, tally, told) {
  try {
    const report = JSON.parse(readFileSync(file, 'utf8'))
    failures.push(...told(report))
    return tally(report)
  } catch (error) {
    return failed(`No report of the tests: ${error instanceof Error ? error.message : error}`)
  }
}

/** @param {string} why */
function failed(why) {
  failures.push(why)
  return FAILED
}

try {
  ensureInstalled()
  const chromium = ensureChromium()
  // Its tests are left out, and counted as such, where it cannot be had.
  findOrInstall(FIREFOX)
  const tallies = [check(), unitTests()]
  const built = build()
  // Without a build there is nothing to browse, and the failed build is counted.
  tallies.push(built, built.failed > 0 ? NOTHING : await browserTests(chromium))
  const total = sum(tallies)
  // Once more at the end, where the first look goes.
  for (const failure of failures) console.log(failure)
  console.log(closingLine(total))
  process.exitCode = total.failed > 0 || total.passed === 0 ? 1 : 0
} catch (error) {
  fail(error)
} finally {
  rmSync(reports, { recursive: true, force: true })
}
