/** All `s` of an address: one to six scenarios, or the demo. */
import { FAMILIES } from '../dark-energy'
import type { Family } from '../dark-energy/law'
import { DEMO } from './demo'
import { QUERY } from './given'
import { fault, problemsOf } from './problems'
import { readScenario } from './read'
import type { Problem, Reading, Scenario } from './scenario'

export const MOST_SCENARIOS = 6

/** `values` are those of every `s`, decoded once, in order. */
export function readQuery(
  values: readonly string[],
  families: readonly Family[] = FAMILIES,
): Reading<readonly Scenario[]> {
  if (values.length === 0) return readQuery(DEMO.codes, FAMILIES)
  const readings = values.slice(0, MOST_SCENARIOS).map((text, index) => readScenario(text, index, families))
  const problems = [...readings.flatMap((one) => (one.ok ? [] : one.problems)), ...tooMany(values)]
  if (problems.length > 0) return { ok: false, problems }
  return { ok: true, value: readings.flatMap((one) => (one.ok ? [one.value] : [])) }
}

function tooMany(values: readonly string[]): Problem[] {
  if (values.length <= MOST_SCENARIOS) return []
  const message = `There are ${values.length} scenarios.`
  const one = fault(QUERY, values[MOST_SCENARIOS], `at most ${MOST_SCENARIOS}`, message)
  return problemsOf([one], MOST_SCENARIOS)
}
