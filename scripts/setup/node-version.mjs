/** Kept to old syntax and no named imports of late additions: this file has to run on the Node it turns away. */
import { readFileSync } from 'node:fs'

/** The least version that package.json names, e.g. `20.19`. */
export function requiredNode() {
  const { engines } = JSON.parse(readFileSync(new URL('../../package.json', import.meta.url), 'utf8'))
  return engines.node.replace('>=', '')
}

/**
 * One line that says what is wrong with this Node, or null.
 * @param {string} version as in `process.version`
 */
export function nodeProblem(version, required = requiredNode()) {
  const [major, minor] = version.replace('v', '').split('.').map(Number)
  const [leastMajor, leastMinor] = required.split('.').map(Number)
  if (major > leastMajor || (major === leastMajor && minor >= leastMinor)) return null
  return `Longhence needs Node ${required} or later; this is ${version}.`
}
