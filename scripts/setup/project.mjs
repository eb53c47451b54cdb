/** Where the project lies, and how its commands run other commands and give up. */
import { spawnSync } from 'node:child_process'
import { fileURLToPath } from 'node:url'

/** @typedef {Readonly<Record<string, string | undefined>>} Environment */

export const ROOT = fileURLToPath(new URL('../../', import.meta.url))

/** A mistake that one line explains; anything else that is thrown keeps its stack. */
export class Refusal extends Error {}

/**
 * Ends the process with what is wrong.
 * @param {unknown} problem
 * @returns {never}
 */
export function fail(problem) {
  console.error(problem instanceof Refusal ? problem.message : problem)
  process.exit(1)
}

/**
 * Runs a command in the project's folder, its output shown, and returns its exit code (1 where a signal ended it).
 * @param {string} command
 * @param {readonly string[]} args
 * @param {Record<string, string>} [env] added to our own
 */
export function run(command, args, env = {}) {
  const { status, error } = spawnSync(command, args, { cwd: ROOT, stdio: 'inherit', env: { ...process.env, ...env } })
  if (error) throw new Refusal(`Cannot run ${command}: ${error.message}`)
  return status ?? 1
}

/**
 * The same for a Node program inside node_modules, without going through npx.
 * @param {string} path from node_modules
 * @param {readonly string[]} args
 * @param {Record<string, string>} [env]
 */
export function runNode(path, args, env) {
  return run(process.execPath, [`${ROOT}node_modules/${path}`, ...args], env)
}
