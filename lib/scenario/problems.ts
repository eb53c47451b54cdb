/** Problems as they are found in one scenario: bounded in number and length, since the text comes from anywhere. */
import type { Problem } from './scenario'

const MOST = 50
const LONGEST = 200

/** A problem before it is known in which scenario it stands. */
export type Fault = Omit<Problem, 'scenario'>

/** The first part of a long text. */
export function clip(text: string): string {
  const start = [...text.slice(0, 2 * LONGEST)]
  return start.length <= LONGEST && text.length <= 2 * LONGEST ? text : `${start.slice(0, LONGEST - 1).join('')}…`
}

export function fault(parameter: string, value: string, allowed: string, message: string): Fault {
  return { parameter: clip(parameter), value: clip(value), allowed, message }
}

/** The first fifty faults, with the index of the scenario. */
export function problemsOf(faults: readonly Fault[], scenario: number | null): Problem[] {
  return faults.slice(0, MOST).map((one) => ({ ...one, scenario }))
}
