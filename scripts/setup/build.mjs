/** Builds the application, when its sources are not those of the build in .next/. */
import { rmSync } from 'node:fs'
import { join } from 'node:path'
import { Refusal, ROOT, runNode } from './project.mjs'
import { clearStamp, filesUnder, hashOf, isFresh, setStamp } from './stamp.mjs'

const OUTPUT = join(ROOT, '.next')
const STAMP = join(OUTPUT, '.built')

/** What no page or route is made from. A list of exceptions, so that a new source folder cannot be forgotten. */
const APART = new Set(['node_modules', 'test', 'e2e', 'test-results', 'playwright-report', 'coverage'])

/** @param {string} path from the project's folder */
export function isSource(path) {
  const [top] = path.split('/')
  return !(top.startsWith('.') || APART.has(top) || /\.(md|tsbuildinfo)$/.test(path) || path === 'next-env.d.ts')
}

/**
 * Settings that a build may take into its output.
 * @param {import('./project.mjs').Environment} env
 */
export function builtIn(env) {
  return Object.entries(env)
    .filter(([key]) => key.startsWith('NEXT_PUBLIC_') || key === 'PUBLIC_URL')
    .map(([key, value]) => `${key}=${value}`)
    .sort()
}

export function ensureBuilt() {
  const hash = hashOf(ROOT, filesUnder(ROOT, isSource), [process.version, ...builtIn(process.env)])
  if (isFresh(STAMP, hash)) return
  console.log('Building.')
  clearStamp(STAMP)
  // Types left by the development server describe pages that may be gone.
  rmSync(join(OUTPUT, 'dev'), { recursive: true, force: true })
  const code = runNode('next/dist/bin/next', ['build'], {
    NODE_ENV: 'production',
    NEXT_TELEMETRY_DISABLED: '1',
    // What a browser kept of one build is not used for another.
    NEXT_PUBLIC_BUILD: hash.slice(0, 12),
  })
  if (code !== 0) throw new Refusal('The build failed; its messages stand above.')
  setStamp(STAMP, hash)
}
