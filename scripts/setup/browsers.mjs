/** The browsers of the tests: those that are there, else Debian's, where we may install them. */
import { existsSync } from 'node:fs'
import { Refusal, run } from './project.mjs'

/**
 * @typedef {object} Browser
 * @property {string} name
 * @property {string} variable of the environment, names another place
 * @property {string} debian its package there
 * @property {readonly string[]} places
 */

/** @type {Browser} */
export const CHROMIUM = {
  name: 'Chromium',
  variable: 'CHROMIUM_PATH',
  debian: 'chromium',
  places: [
    '/usr/bin/chromium',
    '/usr/bin/chromium-browser',
    '/usr/bin/google-chrome-stable',
    '/usr/bin/google-chrome',
    '/snap/bin/chromium',
    '/Applications/Chromium.app/Contents/MacOS/Chromium',
    '/Applications/Google Chrome.app/Contents/MacOS/Google Chrome',
  ],
}

/** @type {Browser} */
export const FIREFOX = {
  name: 'Firefox',
  variable: 'FIREFOX_PATH',
  debian: 'firefox-esr',
  places: [
    '/usr/bin/firefox-esr',
    '/usr/bin/firefox',
    '/snap/bin/firefox',
    '/Applications/Firefox.app/Contents/MacOS/firefox',
  ],
}

/**
 * The one that the environment names, else the first known place that exists, else undefined.
 * @param {Browser} browser
 * @param {import('./project.mjs').Environment} env
 * @param {(path: string) => boolean} [exists]
 */
export function find({ variable, places }, env, exists = existsSync) {
  const named = env[variable]
  if (!named) return places.find(exists)
  if (!exists(named)) throw new Refusal(`${variable} names ${named}, and nothing is there.`)
  return named
}

/**
 * As `find`, after an attempt to install it where it is missing.
 * @param {Browser} browser
 */
export const findOrInstall = (browser) =>
  find(browser, process.env) ?? (installWithApt(browser) ? find(browser, process.env) : undefined)

export function ensureChromium() {
  const found = findOrInstall(CHROMIUM)
  if (!found) throw new Refusal('The browser tests need Chromium: install it, or set CHROMIUM_PATH to one.')
  return found
}

/** @param {Browser} browser */
function installWithApt({ name, debian }) {
  if (process.getuid?.() !== 0 || !existsSync('/usr/bin/apt-get')) return false
  console.log(`Installing ${name}.`)
  const env = { DEBIAN_FRONTEND: 'noninteractive' }
  run('apt-get', ['update', '-q'], env)
  return run('apt-get', ['install', '-qy', '--no-install-recommends', debian], env) === 0
}
