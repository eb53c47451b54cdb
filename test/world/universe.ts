/** A scenario code, solved, with the few things that tests ask of it. Times in 1/H₀ and lengths in c/H₀ unless the name says so. */
import {
  type Branch,
  type Event,
  eventAtScale,
  eventAtTime,
  type Found,
  isEvent,
  sinceNow,
} from '../../lib/history/event'
import { transverseDistance } from '../../lib/measures/distances'
import type { Missing } from '../../lib/measures/outcome'
import { hubbleRate } from '../../lib/measures/rates'
import { comovingDistance } from '../../lib/measures/sight'
import type { MeasureKey } from '../../lib/quantities/measures'
import { readScenario } from '../../lib/scenario/read'
import { type Solution, solve } from '../../lib/solve'
import { hubbleLengthGly, hubbleLengthMpc, hubbleTimeGyr } from '../../lib/units'

export function universe(code: string): Solution {
  const reading = readScenario(code, 0)
  if (!reading.ok) throw new Error(`${code} does not open: ${JSON.stringify(reading.problems)}`)
  return solve(reading.value)
}

/** A measure that must have a value, in the units of the page. */
export function measure(solution: Solution, key: MeasureKey): number {
  const answer = solution.measures[key]
  if (answer.value === null) throw new Error(`${key}: ${answer.because}`)
  return answer.value
}

export const gyr = ({ scenario }: Solution): number => hubbleTimeGyr(scenario.h0)
export const gly = ({ scenario }: Solution): number => hubbleLengthGly(scenario.h0)
export const mpc = ({ scenario }: Solution): number => hubbleLengthMpc(scenario.h0)

export function known(found: Found): Event {
  if (!isEvent(found)) throw new Error(found.because)
  return found
}

export function sure(value: number | Missing): number {
  if (typeof value !== 'number') throw new Error(value.because)
  return value
}

export const atScale = ({ history }: Solution, a: number, branch: Branch = 'expanding'): Event =>
  known(eventAtScale(history, Math.log(a), branch))
export const atRedshift = ({ history }: Solution, z: number): Event =>
  known(eventAtScale(history, -Math.log1p(z), 'expanding'))
export const scaleAtTime = ({ history }: Solution, time: number): number =>
  Math.exp(known(eventAtTime(history, time)).place.N)

export const timeAtScale = (solution: Solution, a: number, branch: Branch = 'expanding'): number =>
  sinceNow(solution.history, atScale(solution, a, branch), 'time')
export const lookback = (solution: Solution, z: number): number =>
  -sinceNow(solution.history, atRedshift(solution, z), 'time')
export const comoving = (solution: Solution, z: number): number =>
  sure(comovingDistance(solution.history, atRedshift(solution, z)))
export const transverse = (solution: Solution, z: number): number =>
  transverseDistance(comoving(solution, z), solution.budget.curvature)
/** E = H/H₀. */
export const rate = (solution: Solution, z: number): number => hubbleRate(atRedshift(solution, z))
