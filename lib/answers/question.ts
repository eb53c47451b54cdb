/** A request to the interface, read: what it asks in canonical form, and how to answer it. */
import { isUnsolvable } from '../history/field/unsolvable'
import { type Fault, problemsOf } from '../scenario/problems'
import { readQuery } from '../scenario/query'
import type { Problem, Reading, Scenario } from '../scenario/scenario'
import { writeScenario } from '../scenario/write'
import { type Solution, solve } from '../solve'
import { lately } from './lately'
import { isSane } from './sane'

export type Pairs = Iterable<readonly [string, string]>

export interface Question<T> {
  /** The request in one canonical text, ready for an address: equal texts have equal answers. */
  readonly canonical: string
  /** The answer, or why these legal scenarios have none. */
  answer(): Reading<T>
}

/** The scenarios, unless they or other parameters are at fault. */
export function scenariosOf(codes: readonly string[], faults: readonly Fault[]): Reading<readonly Scenario[]> {
  const reading = readQuery(codes)
  if (reading.ok && faults.length === 0) return reading
  return { ok: false, problems: [...(reading.ok ? [] : reading.problems), ...problemsOf(faults, null)] }
}

/** What comes of each scenario. One that cannot be solved is a problem, not a failure of the server. */
export function solved<T>(scenarios: readonly Scenario[], use: (solution: Solution) => T): Reading<readonly T[]> {
  const problems: Problem[] = []
  const value: T[] = []
  scenarios.forEach((scenario, index) => {
    try {
      value.push(use(solvedSanely(scenario)))
    } catch (error) {
      problems.push(unsolved(scenario, index, error))
    }
  })
  return problems.length > 0 ? { ok: false, problems } : { ok: true, value }
}

const solvedSanely = lately(writeScenario, (scenario: Scenario): Solution => {
  const solution = solve(scenario)
  if (!isSane(solution)) throw new RangeError('its numbers leave the range of floating-point numbers')
  return solution
})

function unsolved(scenario: Scenario, index: number, error: unknown): Problem {
  const code = writeScenario(scenario)
  if (isUnsolvable(error)) {
    const { parameter, message } = error
    return { parameter, scenario: index, value: valueIn(code, parameter), allowed: 'what has a solution', message }
  }
  const why = error instanceof RangeError ? error.message : 'the engine met a case that it does not handle'
  const message = `This scenario has no solution here: ${why}.`
  return { parameter: 's', scenario: index, value: code, allowed: 'what has a solution', message }
}

/** The text of a key in a code; empty where it has its default. */
const valueIn = (code: string, key: string): string =>
  code
    .split(',')
    .find((pair) => pair.startsWith(`${key}:`))
    ?.slice(key.length + 1) ?? ''

export const mapped = <T, U>(reading: Reading<T>, make: (value: T) => U): Reading<U> =>
  reading.ok ? { ok: true, value: make(reading.value) } : reading

/** As text in an address: a plus sign would mean a blank. */
export const numberText = (value: number): string => String(value).replace('+', '%2B')
