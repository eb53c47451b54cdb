/** The scenarios that an address opens, solved: as written, else by their nearest good readings, else the demo. */
import { DEMO } from '../scenario/demo'
import { mendQuery } from '../scenario/mend'
import { readQuery } from '../scenario/query'
import type { Problem, Scenario } from '../scenario/scenario'
import type { Solution } from '../solve'
import { solved } from './question'

export interface Opened {
  /** At least one. */
  readonly solutions: readonly Solution[]
  /** What was wrong with the address; empty where it is shown as written. */
  readonly problems: readonly Problem[]
  /** What was changed to read it. */
  readonly changes: readonly string[]
  /** False where nothing of the address could be kept. */
  readonly kept: boolean
}

export function opened(codes: readonly string[]): Opened {
  const { scenarios, problems, changes } = read(codes)
  const outcomes = scenarios.map(solution)
  const solutions = outcomes.flatMap((one) => ('solution' in one ? [one.solution] : []))
  const all = [...problems, ...outcomes.flatMap((one) => ('problem' in one ? [one.problem] : []))]
  if (solutions.length > 0) return { solutions, problems: all, changes, kept: true }
  return { solutions: demoSolutions(), problems: all, changes: [], kept: false }
}

/** One scenario solved; null where the engine cannot. */
export function solutionOf(scenario: Scenario): Solution | null {
  const outcome = solution(scenario, 0)
  return 'solution' in outcome ? outcome.solution : null
}

interface Read {
  readonly scenarios: readonly Scenario[]
  readonly problems: readonly Problem[]
  readonly changes: readonly string[]
}

function read(codes: readonly string[]): Read {
  const reading = readQuery(codes)
  if (reading.ok) return { scenarios: reading.value, problems: [], changes: [] }
  const mended = mendQuery(codes) ?? []
  const changes = mended.flatMap((one) => one.changes)
  return { scenarios: mended.map((one) => one.scenario), problems: reading.problems, changes }
}

function solution(scenario: Scenario, index: number): { readonly solution: Solution } | { readonly problem: Problem } {
  const reading = solved([scenario], (one) => one)
  const [first] = reading.ok ? reading.value : []
  if (first) return { solution: first }
  const [problem] = reading.ok ? [] : reading.problems
  return { problem: { ...(problem as Problem), scenario: index } }
}

function demoSolutions(): readonly Solution[] {
  const demo = readQuery(DEMO.codes)
  const reading = demo.ok ? solved(demo.value, (one) => one) : demo
  if (!reading.ok) throw new Error('the demo can be read and solved')
  return reading.value
}
