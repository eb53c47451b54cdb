/**
 * The two integrands of every time and distance, dt = dN/E and dη = dN/(aE), in variables in which they are smooth.
 * A zone is a stretch of one direction from today; s grows outwards, and m = |N| is the distance from today in ln a.
 */
import { type Anchor, expansionAt, type Model } from '../model'
import { NODE_COUNT, NODES } from '../numerics/chebyshev'
import type { Direction } from './turning'

export interface Samples {
  readonly time: Float64Array
  readonly conformal: Float64Array
}

export interface Zone {
  readonly from: number
  readonly to: number
  /** First panel width to try. */
  readonly width: number
  distanceAt(s: number): number
  variableAt(m: number): number
  /** E² at s, in the form that rounds least here. */
  expansion(s: number): number
  /** Rounding error of E² at s relative to E², in units of eps. */
  conditioning(s: number): number
  /** dt/ds and dη/ds at the sixteen nodes of the panel centre ± half. */
  sampleInto(out: Samples, centre: number, half: number): void
}

/** s = m: anywhere E² stays well above zero. */
export function plainZone(model: Model, direction: Direction, from: number, to: number): Zone {
  return {
    from,
    to,
    width: 0.4,
    distanceAt: (s) => s,
    variableAt: (m) => m,
    expansion: (s) => expansionAt(model, direction * s, Math.exp(-direction * s)),
    conditioning: (s) =>
      model.signed
        ? 1 + model.magnitude(direction * s) / expansionAt(model, direction * s, Math.exp(-direction * s))
        : 2,
    sampleInto(out, centre, half) {
      const central = Math.exp(-direction * centre)
      for (let k = 0; k < NODE_COUNT; k++) {
        const offset = half * NODES[k]
        // e^(−N) as a product: rounding N itself would cost eps |N|.
        const inverseScale = central * Math.exp(-direction * offset)
        const rate = 1 / Math.sqrt(expansionAt(model, direction * (centre + offset), inverseScale))
        out.time[k] = rate
        out.conformal[k] = inverseScale * rate
      }
    },
  }
}

/** s = −√(m_t − m): up to a turning point at N, where E² goes to zero linearly and dN/E like d√(m_t − m). */
export function turningZone(model: Model, direction: Direction, N: number, from: number): Zone {
  const anchor: Anchor = { N, value: 0 }
  const inverseScale = Math.exp(-N)
  const offset = (s: number) => -direction * s * s
  const expansion = (s: number) => model.expansionFrom(anchor, offset(s))
  const farthest = Math.abs(N)
  return {
    from: -Math.sqrt(farthest - from),
    to: 0,
    width: 0.3,
    distanceAt: (s) => farthest - s * s,
    variableAt: (m) => -Math.sqrt(Math.max(0, farthest - m)),
    expansion,
    conditioning: (s) => 1 + model.magnitudeFrom(anchor, offset(s)) / expansion(s),
    sampleInto(out, centre, half) {
      for (let k = 0; k < NODE_COUNT; k++) {
        const s = centre + half * NODES[k]
        const rate = (2 * Math.abs(s)) / Math.sqrt(expansion(s))
        out.time[k] = rate
        out.conformal[k] = rate * inverseScale * Math.exp(-offset(s))
      }
    },
  }
}

/** s = −ln(m_s − m): up to a static state at N, which is reached only after infinite time, like dN/E ∝ ds. */
export function staticZone(model: Model, direction: Direction, N: number, from: number, nearest: number): Zone {
  const farthest = Math.abs(N)
  const offset = (s: number) => -direction * Math.exp(-s)
  const expansion = (s: number) => model.bendFrom(N, offset(s))
  return {
    from: -Math.log(farthest - from),
    to: -Math.log(nearest),
    width: 0.5,
    distanceAt: (s) => farthest - Math.exp(-s),
    variableAt: (m) => -Math.log(Math.max(nearest, farthest - m)),
    expansion,
    conditioning: (s) => 1 + (model.magnitude(N) * offset(s) ** 2) / expansion(s),
    sampleInto(out, centre, half) {
      for (let k = 0; k < NODE_COUNT; k++) {
        const s = centre + half * NODES[k]
        const rate = Math.exp(-s) / Math.sqrt(expansion(s))
        out.time[k] = rate
        out.conformal[k] = rate * Math.exp(-N - offset(s))
      }
    },
  }
}
