/**
 * The two integrands of every time and distance, dt = dN/E and dη = dN/(aE), in variables in which they are smooth.
 * A zone is a stretch of one direction from today; s grows outwards, and m = |N| is the distance from today in ln a.
 */
import type { Logarithmic } from '../dark-energy/law'
import { type Anchor, logExpansion, type Model } from '../model'
import { NODE_COUNT, NODES } from '../numerics/chebyshev'
import type { Narrow } from './search'
import type { Direction } from './turning'

export interface Samples {
  readonly time: Float64Array
  readonly conformal: Float64Array
}

export interface Zone {
  readonly from: number
  readonly to: number
  /** Is s the distance m itself, and E² what the model gives at N = ±m? */
  readonly plain?: true
  /** First panel width to try. */
  readonly width: number
  distanceAt(s: number): number
  variableAt(m: number): number
  /** E² at s, in the form that rounds least here. */
  expansion(s: number): number
  /** Rounding error of E² at s relative to E², in units of eps. */
  conditioning(s: number): number
  /** What the error of a law of steps adds to that; absent where there is none. */
  stray?(s: number): number
  /** dt/ds and dη/ds at the sixteen nodes of the panel centre ± half. */
  sampleInto(out: Samples, centre: number, half: number): void
}

/** Where E² and its reciprocal are doubles with all their digits. */
export const [SMALLEST, LARGEST] = [1e-290, 1e290]

/** Rounding of a sum of this magnitude relative to its value; where both leave the doubles nothing cancels. */
export function conditioningOf(magnitude: number, value: number): number {
  const ratio = magnitude / value
  return ratio >= 0 && ratio < 1e16 ? 1 + ratio : 2
}

/** Within this of a place where E² and its slope nearly vanish, its second differences tell it; farther off its first ones do as well. */
const BENT = 0.05

/** E² about an anchor at which its slope is known. */
function expansionAbout(model: Model, anchor: Anchor, slope: number, d: number): number {
  if (Math.abs(d) > BENT) return model.expansionFrom(anchor, d)
  return anchor.value + slope * d + model.bendFrom(anchor.N, d)
}

/**
 * d = √(2A/B) sinh s: past a minimum of E² that is A = `value` there, hardly above zero, so that E² = A + slope d + ½B d² + …
 * and dN/E ∝ ds.
 */
export function narrowZone(model: Model, direction: Direction, narrow: Narrow, from: number, to: number): Zone {
  const centre = Math.abs(narrow.N)
  const inverseScale = Math.exp(-narrow.N)
  const width = Math.sqrt((2 * narrow.value) / model.derivatives(narrow.N).second)
  const variableAt = (m: number) => Math.asinh((m - centre) / width)
  const offset = (s: number) => direction * width * Math.sinh(s)
  const squared = (d: number) => expansionAbout(model, narrow, narrow.slope, d)
  return {
    from: variableAt(from),
    to: variableAt(to),
    width: 0.5,
    distanceAt: (s) => centre + width * Math.sinh(s),
    variableAt,
    expansion: (s) => squared(offset(s)),
    conditioning: (s) => 2 + (model.magnitude(narrow.N) * offset(s) ** 2) / squared(offset(s)),
    sampleInto(out, middle, half) {
      for (let k = 0; k < NODE_COUNT; k++) {
        const s = middle + half * NODES[k]
        const d = offset(s)
        const rate = (width * Math.cosh(s)) / Math.sqrt(squared(d))
        out.time[k] = rate
        out.conformal[k] = rate * inverseScale * Math.exp(-d)
      }
    },
  }
}

/**
 * What the error δ of a law of steps does next to a turning point, relative to E² and in units of eps. E² = B + Ω f vanishes where
 * B = −Ω f, so that δ moves that place by x = δ Ω f/(dE²/dN), and E² at a distance from it by d (δ (Ω f)′ + x (E²)″) to first order in
 * d: by δ ((Ω f)′ + Ω f (E²)″/(E²)′)/(E²)′ of itself. The distance to today changes by x too, and with it, at most, 1/E by as much.
 */
function shakenBy(model: Model, N: number): number {
  const { law, budget } = model
  if (!law.stray) return 0
  const { first, second } = model.derivatives(N)
  const f = new Float64Array(3)
  law.derivativesInto(f, N)
  const [density, slope] = [Math.abs(budget.dark * f[0]), Math.abs(budget.dark * f[1])]
  const shift = density / Math.abs(first)
  return law.stray(N) * (shift + (slope + shift * Math.abs(second)) / Math.abs(first))
}

/**
 * s = −√(m_t − m): up to a turning point at N, where E² goes to zero linearly and dN/E like d√(m_t − m). With its slope there given,
 * next to a double root, from what E² bends.
 */
export function turningZone(
  model: Model,
  direction: Direction,
  N: number,
  slope: number | undefined,
  from: number,
  to: number,
): Zone {
  const anchor: Anchor = { N, value: 0 }
  const inverseScale = Math.exp(-N)
  const offset = (s: number) => -direction * s * s
  const expansion = (s: number) => {
    const d = offset(s)
    return slope === undefined ? model.expansionFrom(anchor, d) : expansionAbout(model, anchor, slope, d)
  }
  const size = slope === undefined ? null : model.magnitude(N)
  const shaken = shakenBy(model, N)
  const farthest = Math.abs(N)
  return {
    from: -Math.sqrt(farthest - from),
    to: -Math.sqrt(farthest - to),
    width: 0.3,
    distanceAt: (s) => farthest - s * s,
    variableAt: (m) => -Math.sqrt(Math.max(0, farthest - m)),
    expansion,
    // Four roundings in each term.
    conditioning: (s) =>
      size === null
        ? conditioningOf(4 * model.magnitudeFrom(anchor, offset(s)), expansion(s))
        : 2 + (size * offset(s) ** 2) / expansion(s),
    stray: () => shaken,
    sampleInto(out, centre, half) {
      for (let k = 0; k < NODE_COUNT; k++) {
        const s = centre + half * NODES[k]
        const squared = expansion(s)
        const root =
          squared < LARGEST
            ? 1 / Math.sqrt(squared)
            : /* v8 ignore next -- a turning point among densities near the end of the doubles */ Math.exp(
                -0.5 * logExpansion(model, N + offset(s)),
              )
        const rate = 2 * Math.abs(s) * root
        out.time[k] = rate
        out.conformal[k] = rate * inverseScale * Math.exp(-offset(s))
      }
    },
  }
}

/** Where s = −ln(m_e − m) leads to a point at distance m_e that is reached only as s → ∞. */
const approach = (farthest: number, nearest: number, from: number, to: number) => ({
  from: -Math.log(farthest - from),
  to: -Math.log(Math.max(nearest, farthest - to)),
  distanceAt: (s: number) => farthest - Math.exp(-s),
  variableAt: (m: number) => -Math.log(Math.max(nearest, farthest - m)),
})

/** Nearest approach in ln a to a static state that is followed; nearer, a is that of the static state to all its digits. */
const STATIC_NEAREST = 1e-16

/** s = −ln(m_s − m): up to a static state at N, which is reached only after infinite time, like dN/E ∝ ds. */
export function staticZone(model: Model, direction: Direction, N: number, from: number, to: number): Zone {
  const offset = (s: number) => -direction * Math.exp(-s)
  const expansion = (s: number) => model.bendFrom(N, offset(s))
  return {
    ...approach(Math.abs(N), STATIC_NEAREST, from, to),
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
    ...approach(edge, EDGE_NEAREST, from, to),
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
