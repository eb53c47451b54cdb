/** Arms of a history whose variable is the field's own τ, with dt = dτ/√(1 + H²): up to a turning point, back, and on to a crunch. */
import { type Model, modelOf } from '../../model'
import { NODE_COUNT, NODES } from '../../numerics/chebyshev'
import { valueIn } from '../../numerics/ode'
import type { Budget } from '../../scenario/budget'
import { type Arm, armFrom } from '../arm'
import { panelsOf } from '../panels'
import type { Direction, Search } from '../turning'
import type { Unfollowed } from '../whole'
import type { Samples, Zone } from '../zone'
import { fieldLaw } from './law'
import { clockRate, type Field, RATE, SCALE } from './motion'
import { intervalOf, type Leg, type TimedTrail, trailByTime } from './trail'
import { VOYAGE_ERROR } from './voyage'

export interface Route {
  readonly field: Field
  readonly budget: Budget
  /** The field's energy today. */
  readonly today: number
}

/** Values along legs in order of τ. */
function along(legs: readonly Leg[]): (unknown: number, tau: number) => number {
  const edges = Float64Array.from([...legs.map((one) => one.from), legs[legs.length - 1].to])
  let last = 0
  return (unknown, tau) => {
    last = intervalOf(edges, tau, last)
    return valueIn(legs[last].step, unknown, tau)
  }
}

/** Legs in order of τ; s runs outwards from today's size, with or against τ. */
interface Course {
  readonly legs: readonly Leg[]
  readonly forward: boolean
  readonly direction: Direction
  /** Relative error of what is integrated. */
  readonly error: number
}

function timedZone({ legs, forward, direction, error }: Course, time: (N: number) => number): Zone {
  const [first, last] = [legs[0].from, legs[legs.length - 1].to]
  const [origin, sign] = forward ? [first, 1] : [last, -1]
  const at = along(legs)
  const tau = (s: number) => origin + sign * s
  return {
    from: 0,
    to: last - first,
    width: 0.3,
    distanceAt: (s) => direction * at(SCALE, tau(s)),
    variableAt: (m) => sign * (time(direction * m) - origin),
    expansion: (s) => at(RATE, tau(s)) ** 2,
    conditioning: () => VOYAGE_ERROR / Number.EPSILON,
    stray: () => error / Number.EPSILON,
    sampleInto(out: Samples, centre, half) {
      for (let k = 0; k < NODE_COUNT; k++) {
        const moment = tau(centre + half * NODES[k])
        const rate = clockRate(at(RATE, moment))
        out.time[k] = rate
        out.conformal[k] = rate * Math.exp(-at(SCALE, moment))
      }
    },
  }
}

/** The arm along a course that leads outwards from today's size (`forward`) or back to it. */
export function timedArm(route: Route, course: Course, end: Search): Arm {
  const { legs, forward, direction } = course
  const trail = trailByTime(route.field, direction > 0 === forward ? legs : legs.toReversed())
  const panels = panelsOf(timedZone(course, trail.time), () => false)
  return armFrom(timedModel(route, trail, course.error), direction, end, panels, end.kind === 'root' ? 'end' : 'far')
}

/** E² is that of the integration, which stays right where the sum of densities cancels. */
function timedModel({ budget, today }: Route, trail: TimedTrail, error: number): Model {
  const outside = { before: 6, after: 6 }
  const model = modelOf(
    budget,
    fieldLaw(trail, { today, outside, breaks: [], least: () => VOYAGE_ERROR, error: () => error }),
  )
  const first = trail.edges[0]
  const expansion = (N: number, inverseScale: number) => {
    /* v8 ignore if -- beyond the trail the tail of its arm is asked, not the model */
    if (N < first) return model.expansion(N, inverseScale)
    return trail.rate(N) ** 2
  }
  return {
    ...model,
    expansion,
    expansionsInto: (out, places, inverseScales, from, to) => {
      for (let i = from; i < to; i++) out[i] = expansion(places[i], inverseScales[i])
    },
    expansionFrom: (anchor, d) => expansion(anchor.N + d, Math.exp(-anchor.N - d)),
  }
}

/** Time and conformal time along legs and on in the power law of a crunch, E² ∝ a⁻⁶, from N and H in `state`. */
export function restOf(legs: readonly Leg[], state: Float64Array, stray: number): Omit<Unfollowed, 'because'> {
  let time = 1 / (3 * Math.abs(state[RATE]))
  let conformal = Math.exp(-state[SCALE]) / (2 * Math.abs(state[RATE]))
  let error = stray * conformal
  const zone = timedZone({ legs, forward: true, direction: 1, error: stray }, () => Number.NaN)
  for (const panel of panelsOf(zone, () => false)) {
    time += panel.time.total
    conformal += panel.conformal.total
    error += panel.conformal.error
  }
  return { time, conformal, error }
}
