/** Where the field is at each scale factor of one stretch of the history. */
import { type Step, valueIn } from '../../numerics/ode'
import { brent } from '../../numerics/roots'
import { expansionOf, type Field, PHI, RATE, SCALE, SPEED, TIMED_PHI, TIMED_SPEED } from './motion'

export interface Trail {
  readonly field: Field
  /** Ascending values of N between which the trail is smooth; it holds from the first to the last. */
  readonly edges: Float64Array
  /** Writes φ and φ̇. */
  into(out: Float64Array, N: number): void
  /** H, negative while contracting. */
  rate(N: number): number
}

/** Index of the interval of ascending edges that holds the value; the nearest one outside. */
export function intervalOf(edges: Float64Array, value: number, guess: number): number {
  const last = edges.length - 2
  if (guess <= last && edges[guess] <= value && value <= edges[guess + 1]) return guess
  let [low, high] = [0, last + 1]
  while (high - low > 1) {
    const middle = (low + high) >> 1
    if (edges[middle] <= value) low = middle
    else high = middle
  }
  return low
}

/** From steps in N, ascending, while the universe expands; `end` lies in the last of them. */
export function trailByScale(field: Field, steps: readonly Step[], end: number): Trail {
  const edges = Float64Array.from([...steps.map((one) => one.from), end])
  let last = 0
  const stepAt = (N: number) => {
    last = intervalOf(edges, N, last)
    return steps[last]
  }
  return {
    field,
    edges,
    into(out, N) {
      const step = stepAt(N)
      out[0] = valueIn(step, PHI, N)
      out[1] = valueIn(step, SPEED, N)
    },
    rate(N) {
      const step = stepAt(N)
      return Math.sqrt(expansionOf(field, N, valueIn(step, PHI, N), valueIn(step, SPEED, N)))
    },
  }
}

/** Part of a step in τ on which N is monotonic. */
export interface Leg {
  readonly step: Step
  readonly from: number
  readonly to: number
}

/** N at τ. */
export const scaleIn = (leg: Leg, tau: number): number => valueIn(leg.step, SCALE, tau)

/** τ at N on a leg; its nearer end where N lies outside. */
export function timeAt(leg: Leg, N: number): number {
  const f = (tau: number) => scaleIn(leg, tau) - N
  const [left, right] = [f(leg.from), f(leg.to)]
  if (left === 0 || right === 0 || left > 0 === right > 0) return Math.abs(left) < Math.abs(right) ? leg.from : leg.to
  return brent(f, leg.from, leg.to)
}

export interface TimedTrail extends Trail {
  /** τ at N. */
  time(N: number): number
}

/** From legs in order of ascending N. */
export function trailByTime(field: Field, legs: readonly Leg[]): TimedTrail {
  const ends = legs.map((leg) => [scaleIn(leg, leg.from), scaleIn(leg, leg.to)] as const)
  const edges = Float64Array.from([...ends.map((pair) => Math.min(...pair)), Math.max(...ends[ends.length - 1])])
  let [last, place, tau] = [0, Number.NaN, 0]
  const find = (N: number) => {
    if (N === place) return
    last = intervalOf(edges, N, last)
    tau = timeAt(legs[last], N)
    place = N
  }
  return {
    field,
    edges,
    into(out, N) {
      find(N)
      out[0] = valueIn(legs[last].step, TIMED_PHI, tau)
      out[1] = valueIn(legs[last].step, TIMED_SPEED, tau)
    },
    rate(N) {
      find(N)
      return valueIn(legs[last].step, RATE, tau)
    },
    time(N) {
      find(N)
      return tau
    },
  }
}
