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
import { type Leg, scaleIn, timeAt, trailByTime } from './trail'
import { VOYAGE_ERROR } from './voyage'

export interface Route {
  readonly field: Field
  readonly budget: Budget
  /** The field's energy today. */
  readonly today: number
}

/** s runs outwards from today's size, with or against τ. */
function timedZone({ step, from, to }: Leg, forward: boolean, direction: Direction, origin: number): Zone {
  const sign = forward ? 1 : -1
  const tau = (s: number) => origin + sign * s
  const edges = [sign * (from - origin), sign * (to - origin)]
  const leg = { step, from, to }
  return {
    from: Math.min(...edges),
    to: Math.max(...edges),
    width: to - from,
    distanceAt: (s) => direction * scaleIn(leg, tau(s)),
    variableAt: (m) => sign * (timeAt(leg, direction * m) - origin),
    expansion: (s) => valueIn(step, RATE, tau(s)) ** 2,
    conditioning: () => VOYAGE_ERROR / Number.EPSILON,
    sampleInto(out: Samples, centre, half) {
      for (let k = 0; k < NODE_COUNT; k++) {
        const at = tau(centre + half * NODES[k])
        const rate = clockRate(valueIn(step, RATE, at))
        out.time[k] = rate
        out.conformal[k] = rate * Math.exp(-valueIn(step, SCALE, at))
      }
    },
  }
}

/** The arm along legs in order of τ, which lead outwards from today's size (`forward`) or back to it. */
export function timedArm(route: Route, legs: readonly Leg[], forward: boolean, direction: Direction, end: Search): Arm {
  const outwards = forward ? legs : legs.toReversed()
  const origin = forward ? outwards[0].from : outwards[0].to
  const model = timedModel(route, direction > 0 ? outwards : outwards.toReversed())
  const panels = outwards.flatMap((leg) => panelsOf(timedZone(leg, forward, direction, origin), () => false))
  return armFrom(model, direction, end, panels, end.kind === 'root' ? 'end' : 'far')
}

/** E² is that of the integration, which stays right where the sum of densities cancels. */
function timedModel({ field, budget, today }: Route, ascending: readonly Leg[]): Model {
  const trail = trailByTime(field, ascending)
  const model = modelOf(
    budget,
    fieldLaw(trail, { today, outside: { before: 6, after: 6 }, breaks: [], error: () => VOYAGE_ERROR }),
  )
  const first = trail.edges[0]
  const expansion = (N: number, inverseScale: number) => {
    if (N < first) return model.expansion(N, inverseScale)
    return trail.rate(N) ** 2
  }
  return { ...model, expansion, expansionFrom: (anchor, d) => expansion(anchor.N + d, Math.exp(-anchor.N - d)) }
}

/** Time and conformal time along legs and on in the power law of a crunch, E² ∝ a⁻⁶, from N and H in `state`. */
export function restOf(legs: readonly Leg[], state: Float64Array): Omit<Unfollowed, 'because'> {
  let time = 1 / (3 * Math.abs(state[RATE]))
  let conformal = Math.exp(-state[SCALE]) / (2 * Math.abs(state[RATE]))
  let error = VOYAGE_ERROR * conformal
  for (const leg of legs) {
    for (const panel of panelsOf(timedZone(leg, true, 1, leg.from), () => false)) {
      time += panel.time.total
      conformal += panel.conformal.total
      error += panel.conformal.error
    }
  }
  return { time, conformal, error }
}
