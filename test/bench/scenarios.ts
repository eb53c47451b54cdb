/** Scenarios for the benchmarks, read before the clock runs. */
import { readScenario } from '../../lib/scenario/read'
import type { Scenario } from '../../lib/scenario/scenario'

/** The standard model: densities of Planck Collaboration 2020, A&A 641, A6, table 2, last column. */
export const STANDARD = 'matter:0.3111'
/** The same with massless neutrinos only. */
export const MASSLESS = `${STANDARD},masses:0`

export function read(code: string): Scenario {
  const reading = readScenario(code, 0)
  if (!reading.ok) throw new Error(reading.problems.map(({ message }) => message).join(' '))
  return reading.value
}

const VARIANTS = 64

/** A scenario in many values of H₀, so that no run repeats the numbers of the one before. */
export const variants = (code: string): readonly Scenario[] =>
  Array.from({ length: VARIANTS }, (_, i) => read(`h0:${(67 + i / 100).toFixed(2)},${code}`))

/** A function that takes the next of a list in each run, over and over. */
export function inTurn<T>(list: readonly T[], run: (one: T) => unknown): () => unknown {
  let runs = 0
  return () => run(list[runs++ % list.length])
}

/** Numbers evenly distributed between two ends, the same in every run (Numerical Recipes' quick generator, 1992, section 7.1). */
export function numbers(): (from: number, to: number) => number {
  let state = 1
  return (from, to) => {
    state = (Math.imul(state, 1664525) + 1013904223) >>> 0
    return from + (to - from) * (state / 2 ** 32)
  }
}
