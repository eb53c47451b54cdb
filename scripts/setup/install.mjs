/** Installs the packages of the lockfile, when they are not the ones in node_modules/. */
import { join } from 'node:path'
import { Refusal, ROOT, run } from './project.mjs'
import { clearStamp, hashOf, isFresh, setStamp } from './stamp.mjs'

const STAMP = join(ROOT, 'node_modules', '.installed')

/**
 * The npm that runs us, else the one on the path. Other package managers set `npm_execpath` too; they do not read our
 * lockfile.
 * @param {import('./project.mjs').Environment} env
 * @returns {readonly [string, ...string[]]}
 */
export function npmCommand(env) {
  const path = env.npm_execpath
  return path && /npm-cli\.[cm]?js$/.test(path) ? [process.execPath, path] : ['npm']
}

export function ensureInstalled() {
  // Some packages choose a binary by Node's version and the platform.
  const hash = hashOf(ROOT, ['package-lock.json'], [process.version, process.platform, process.arch])
  if (isFresh(STAMP, hash)) return
  console.log('Installing packages.')
  clearStamp(STAMP)
  const [command, ...args] = npmCommand(process.env)
  // The build needs TypeScript, which NODE_ENV=production would leave out.
  const code = run(command, [...args, 'ci', '--include=dev'])
  if (code !== 0) throw new Refusal('Installing packages failed; npm says why above.')
  setStamp(STAMP, hash)
}
