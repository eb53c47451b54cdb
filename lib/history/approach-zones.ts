/** Zones up to a place in ln a that is approached for ever in their variable: a static state, the edge of a law, a turn beside one. */
import type { Logarithmic } from '../dark-energy/law'
import type { Anchor, Model } from '../model'
import { NODE_COUNT, NODES } from '../numerics/chebyshev'
import { STATIC_NEAREST } from './tail'
import type { Direction } from './turning'
import { conditioningOf, type Zone } from './zone'

/** Where s = −ln(m_e − m) leads to a point at distance m_e that is reached only as s → ∞. */
const approach = (farthest: number, nearest: number, from: number, to: number) => ({
  from: -Math.log(farthest - from),
  to: -Math.log(Math.max(nearest, farthest - to)),
  distanceAt: (s: number) => farthest - Math.exp(-s),
  variableAt: (m: number) => -Math.log(Math.max(nearest, farthest - m)),
})

/** s = −ln(m_s − m): up to a static state at N, which is reached only after infinite time, like dN/E ∝ ds. */
export function staticZone(model: Model, direction: Direction, N: number, from: number, to: number): Zone {
  const offset = (s: number) => -direction * Math.exp(-s)
  const expansion = (s: number) => model.bendFrom(N, offset(s))
  return {
    width: 0.5,
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
    ...approach(Math.abs(N), STATIC_NEAREST, from, to),
  }
}

/** Far below anything that an integral up to an edge could still gain. */
const EDGE_NEAREST = 1e-60

/** s = −ln(m_e − m): up to the edge of a law at m_e = `edge`, where f goes like a power of the distance that remains. */
export function edgeZone(
  model: Model,
  direction: Direction,
  law: Logarithmic,
  edge: number,
  from: number,
  to: number,
): Zone {
  const scaleOf = (s: number) => direction * edge - direction * Math.exp(-s)
  const density = (s: number) => (Math.abs(law.rate) * Math.exp(-s)) ** law.power
  const others = model.acting.filter((one) => one.key !== 'dark')
  const { dark } = model.budget
  const expansion = (s: number) => model.expansionWith(scaleOf(s), density(s))
  return {
    width: 0.5,
    expansion,
    conditioning: (s) => {
      const sizes = others.reduce((sum, one) => sum + Math.abs(one.density(scaleOf(s))), Math.abs(dark) * density(s))
      return conditioningOf(sizes, expansion(s))
    },
    sampleInto(out, centre, half) {
      for (let k = 0; k < NODE_COUNT; k++) {
        const s = centre + half * NODES[k]
        const rate = Math.exp(-s) / Math.sqrt(expansion(s))
        out.time[k] = rate
        out.conformal[k] = rate * Math.exp(-scaleOf(s))
      }
    },
    ...approach(edge, EDGE_NEAREST, from, to),
  }
}

/**
 * Up to a turning point so near to the edge of a law that N alone tells them badly apart: s_t = −ln of the distance between them
 * follows from Ω f = −(all else), and the variable is −√(s_t − s) with s as in edgeZone.
 */
export function edgeTurningZone(
  model: Model,
  direction: Direction,
  law: Logarithmic,
  farthest: number,
  from: number,
): Zone {
  const edge = direction * farthest
  const { density: least, distance } = nearestToEdge(model, direction, law, edge)
  const last = -Math.log(distance)
  const anchor: Anchor = { N: edge - direction * distance, value: 0 }
  const inverseScale = Math.exp(-anchor.N)
  const offset = (x: number) => -direction * distance * Math.expm1(x * x)
  const inDark = (x: number) => least * Math.expm1(law.power * x * x)
  const expansion = (x: number) => model.expansionFromWith(anchor, offset(x), inDark(x))
  const variableAt = (m: number) => -Math.sqrt(Math.max(0, last + Math.log(Math.max(farthest - m, distance))))
  return {
    from: variableAt(from),
    to: 0,
    width: 0.3,
    distanceAt: (x) => farthest - distance * Math.exp(x * x),
    variableAt,
    expansion,
    conditioning: (x) => conditioningOf(4 * model.magnitudeFrom(anchor, offset(x)), expansion(x)),
    sampleInto(out, centre, half) {
      for (let k = 0; k < NODE_COUNT; k++) {
        const x = centre + half * NODES[k]
        const rate = (2 * Math.abs(x) * distance * Math.exp(x * x)) / Math.sqrt(expansion(x))
        out.time[k] = rate
        out.conformal[k] = rate * inverseScale * Math.exp(-offset(x))
      }
    },
  }
}

/** Nothing happens between here and a turning point that is still nearer. */
const EDGE_LEAST = 1e-290

/** The distance from the edge at which Ω f makes up for all else, which hardly varies there: a fixed point. */
function nearestToEdge(model: Model, direction: Direction, law: Logarithmic, edge: number) {
  let [density, distance] = [0, 0]
  for (let step = 0; step < 20; step++) {
    density = -model.expansionWith(edge - direction * distance, 0) / model.budget.dark
    distance = Math.max(EDGE_LEAST, density ** (1 / law.power) / Math.abs(law.rate))
  }
  return { density: (Math.abs(law.rate) * distance) ** law.power, distance }
}
