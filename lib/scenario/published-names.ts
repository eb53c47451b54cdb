/** Names of published sets, which stay with their very numbers. */
import { PUBLISHED_SETS } from './presets'
import { readScenario } from './read'
import type { Scenario } from './scenario'
import { writeScenario } from './write'

/** Canonical codes with their names. */
const PUBLISHED: ReadonlySet<string> = new Set(
  PUBLISHED_SETS.flatMap(({ code }) => {
    const reading = readScenario(code ?? '', null)
    return code !== null && reading.ok ? [writeScenario(reading.value)] : []
  }),
)

/** What becomes of a published set once a number is another: a scenario without its name, unless it was given a new one. */
export function renamed(before: Scenario, after: Scenario): Scenario {
  const code = writeScenario(before)
  const isOther = after.name === before.name && writeScenario(after) !== code
  return isOther && PUBLISHED.has(code) ? { ...after, name: null } : after
}
