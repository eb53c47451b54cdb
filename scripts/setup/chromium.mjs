/** The browser for the tests: one that is there, else Debian's, where we may install it. */
import { existsSync } from 'node:fs'
import { Refusal, run } from './project.mjs'

const PLACES = [
  '/usr/bin/chromium',
  '/usr/bin/chromium-browser',
  '/usr/bin/google-chrome-stable',
  '/usr/bin/google-chrome',
  '/snap/bin/chromium',
  '/Applications/Chromium.app/Contents/MacOS/Chromium',
  '/Applications/Google Chrome.app/Contents/MacOS/Google Chrome',
]

/**
 * CHROMIUM_PATH, else the first known place that exists, else undefined.
 * @param {import('./project.mjs').Environment} env
 * @param {(path: string) => boolean} [exists]
 */
export function findChromium(env, exists = existsSync) {
  const named = env.CHROMIUM_PATH
  if (!named) return PLACES.find(exists)
  if (!exists(named)) throw new Refusal(`CHROMIUM_PATH names ${named}, and nothing is there.`)
  return named
}

export function ensureChromium() {
  const found = findChromium(process.env) ?? (installWithApt() ? findChromium(process.env) : undefined)
  if (!found) throw new Refusal('The browser tests need Chromium: install it, or set CHROMIUM_PATH to one.')
  return found
}

function installWithApt() {
  if (process.getuid?.() !== 0 || !existsSync('/usr/bin/apt-get')) return false
  console.log('Installing Chromium.')
  const env = { DEBIAN_FRONTEND: 'noninteractive' }
  run('apt-get', ['update', '-q'], env)
  return run('apt-get', ['install', '-qy', '--no-install-recommends', 'chromium'], env) === 0
}
