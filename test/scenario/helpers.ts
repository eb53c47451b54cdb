import { FAMILIES } from '../../lib/dark-energy'
import type { Family } from '../../lib/dark-energy/law'
import { readScenario } from '../../lib/scenario/read'
import type { Problem, Scenario } from '../../lib/scenario/scenario'

/** The value of `s` as a server sees it: decoded once, a plus as a blank (WHATWG URL, form-urlencoded parsing). */
export function decoded(code: string): string {
  return new URLSearchParams(`s=${code}`).get('s') ?? ''
}

export function opened(text: string, families: readonly Family[] = FAMILIES): Scenario {
  const reading = readScenario(text, 0, families)
  if (!reading.ok) throw new Error(`${text} does not open: ${JSON.stringify(reading.problems)}`)
  return reading.value
}

export function refused(text: string, families: readonly Family[] = FAMILIES): readonly Problem[] {
  const reading = readScenario(text, 0, families)
  if (reading.ok) throw new Error(`${text} opens`)
  return reading.problems
}
