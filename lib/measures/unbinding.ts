/**
 * When a bound system is torn apart on the way to a rip: ä/a = (2π/P)² for a system of period P.
 * An order of magnitude: a circular orbit loses its bound state already at ä/a = (27/256)(2π/P)².
 * Compare Caldwell, Kamionkowski & Weinberg 2003, Phys. Rev. Lett. 91, 071301: t_rip − t ≈ P √(2|1+3w|)/(6π|1+w|).
 */

import { JULIAN_YEAR } from '../constants'
import type { Arm } from '../history/arm'
import { integralOfExp } from '../history/far'
import type { History } from '../history/history'
import { fromToday, type Place, placeAt, toEnd } from '../history/place'
import { logExpansion, type Model } from '../model'
import { brent } from '../numerics/roots'
import { hubbleTimeGyr } from '../units'

const YEAR = JULIAN_YEAR
const MINUTE = 60

/** Periods: common practice, no source; the atom's is the classical period of the electron of hydrogen. */
export const UNBOUND_SYSTEMS = [
  { kind: 'unbinding-cluster', label: 'clusters of galaxies come apart', period: 3.6e9 * YEAR },
  { kind: 'unbinding-galaxy', label: 'large galaxies come apart', period: 225e6 * YEAR },
  { kind: 'unbinding-planet', label: 'planets leave their stars', period: YEAR },
  { kind: 'unbinding-earth', label: 'rocky planets break up', period: 90 * MINUTE },
  { kind: 'unbinding-atom', label: 'atoms are torn apart', period: 1.5e-16 },
] as const
export type UnboundSystem = (typeof UNBOUND_SYSTEMS)[number]

const DESTRUCTIVE: readonly History['end']['kind'][] = ['rip', 'little-rip', 'singular']

export interface Unbinding {
  /** From now, and left to the end, in 1/H₀; null where rounding of ln a leaves too little of what is left. */
  readonly time: number
  readonly remaining: number | null
  /** ln a. */
  readonly N: number
}

/** Null when the universe does not end that way, or the system is never bound after today. */
export function unbinding(history: History, h0: number, { period }: UnboundSystem): Unbinding | null {
  if (!DESTRUCTIVE.includes(history.end.kind)) return null
  const { future } = history
  const periods = (hubbleTimeGyr(h0) * 1e9 * YEAR) / period
  const threshold = 2 * Math.log(2 * Math.PI * periods)
  const excess = (N: number) => logAcceleration(future.model, N) - threshold
  if (excess(0) >= 0) return null
  const far = firstAbove(excess)
  if (far === null) return null
  const N = brent(excess, 0, far)
  const { total } = future.time
  const place = placeAt(future, N)
  if (place) {
    // Rounding alone must not put it behind the end.
    return { time: Math.min(fromToday(place, 'time'), total), remaining: remainingFrom(future, place), N }
  }
  if (future.end.kind !== 'none') return null
  // Farther than times from today are followed: next to all of the time has passed.
  const remaining = remainingAt(future, N)
  return { time: total - remaining, remaining, N }
}

/**
 * What is left of time. Where dark energy outgrows every power, the panels end when they add nothing to the whole time, which is too
 * early for what is left: it is integrated on its own.
 */
function remainingFrom(future: Arm, place: Place): number | null {
  const { end } = future
  if (end.kind !== 'none') {
    const left = toEnd(place, 'time')
    const blurred = Math.abs(end.N - place.N) < BLURRED * Math.abs(end.N) || left < BLURRED * future.time.total
    return blurred ? null : left
  }
  if (future.tail !== null) return toEnd(place, 'time')
  return remainingAt(future, place.N)
}

const remainingAt = ({ model }: Arm, from: number): number => integralOfExp((N) => -0.5 * logExpansion(model, N), from)

/** Part of ln a, or of the whole time, that eps blurs by a millionth. */
const BLURRED = 1e6 * Number.EPSILON

/** Doubling steps until the system is unbound; null where ln a grows beyond all numbers that the law can be asked for. */
function firstAbove(excess: (N: number) => number): number | null {
  for (let N = 1; N < 1e300; N *= 2) if (excess(N) > 0) return N
  return null
}

const [logs, weights]: [number[], number[]] = [[], []]

/** ln of ä/a in H₀², −∞ where it is not positive; by logarithms, for E² leaves the doubles before an atom breaks. */
function logAcceleration({ components }: Model, N: number): number {
  let largest = Number.NEGATIVE_INFINITY
  components.forEach((one, i) => {
    const [low, high] = one.exponentRange(N, N)
    const sign = one.terms ? Math.sign(one.density(N)) : Math.sign(one.omega)
    logs[i] = one.logSize(N)
    weights[i] = sign * (1 - (low + high) / 4)
    largest = Math.max(largest, logs[i])
  })
  if (largest === Number.POSITIVE_INFINITY) return largest
  const sum = components.reduce((before, _, i) => before + weights[i] * Math.exp(logs[i] - largest), 0)
  return largest + Math.log(Math.max(0, sum))
}
