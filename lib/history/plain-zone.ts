/** The zone in which ln a itself is the variable: anywhere E² stays well above zero. */
import { expansionAt, logExpansion, type Model } from '../model'
import { NODE_COUNT, NODES } from '../numerics/chebyshev'
import type { Direction } from './turning'
import { conditioningOf, LARGEST, SMALLEST, type Zone } from './zone'

const [places, inverseScales, squares] = Array.from({ length: 3 }, () => new Float64Array(NODE_COUNT))

/** s = m. */
export function plainZone(model: Model, direction: Direction, from: number, to: number): Zone {
  const quiet = quietUpTo(model, direction)
  const { stray } = model.law
  return {
    plain: true,
    from,
    to,
    width: WIDTH,
    distanceAt: (s) => s,
    variableAt: (m) => m,
    expansion: (s) => expansionAt(model, direction * s, Math.exp(-direction * s)),
    conditioning: (s) => {
      const N = direction * s
      const sum = model.signed ? conditioningOf(model.magnitude(N), expansionAt(model, N, Math.exp(-N))) : 2
      return sum + (s < quiet ? 0 : darkNoise(model, N)) + (model.law.noise?.(N) ?? 0)
    },
    stray: stray && ((s) => stray(direction * s) * darkShare(model, direction * s)),
    sampleInto(out, centre, half) {
      nodesInto(direction, centre, half)
      model.expansionsInto(squares, places, inverseScales, 0, NODE_COUNT)
      for (let k = 0; k < NODE_COUNT; k++) {
        const squared = squares[k]
        if (squared > SMALLEST && squared < LARGEST) {
          const rate = 1 / Math.sqrt(squared)
          out.time[k] = rate
          out.conformal[k] = inverseScales[k] * rate
        } else {
          // E² leaves the doubles before 1/E does, and 1/E before 1/(aE).
          const log = -0.5 * logExpansion(model, places[k])
          out.time[k] = Math.exp(log)
          out.conformal[k] = Math.exp(log - places[k])
        }
      }
    },
  }
}

const WIDTH = 0.4

/** N and a⁻¹ at the nodes: e^(−N) as a product, since rounding N itself would cost eps |N|; the nodes come in pairs ±x. */
function nodesInto(direction: Direction, centre: number, half: number): void {
  const central = Math.exp(-direction * centre)
  for (let k = 0; k < NODE_COUNT / 2; k++) {
    const offset = half * NODES[k]
    const factor = Math.exp(-direction * offset)
    const mirrored = NODE_COUNT - 1 - k
    places[k] = direction * (centre + offset)
    places[mirrored] = direction * (centre - offset)
    inverseScales[k] = central * factor
    inverseScales[mirrored] = central / factor
  }
}

/** Size of dark energy over E²: what an error of the law does to it. May be far above 1 where E² is small; 1 beyond the doubles. */
function darkShare(model: Model, N: number): number {
  const { budget, law } = model
  const density = law.density(N)
  const share = Math.abs(budget.dark * density) / model.expansionWith(N, density)
  return share >= 0 && share < 1e16 ? share : 1
}

/** Below this, rounding N and ln f is that of any sum. */
const LOUD = 16
/** In ln a: no farther is asked where a law stays quiet, and within it no law is loud. */
const [FAR, NEAR] = [16, 1]

/** A distance from today up to which a law is sure not to be loud, by the bounds of its exponent: neither |ln f| nor |n N| is above n N. */
function quietUpTo({ budget, law }: Model, direction: Direction): number {
  if (budget.dark === 0) return Number.POSITIVE_INFINITY
  const [low, high] = direction > 0 ? law.exponentRange(0, FAR) : law.exponentRange(-FAR, 0)
  const farthest = (0.49 * LOUD) / Math.max(Math.abs(low), Math.abs(high))
  return Math.min(FAR, Math.max(NEAR, farthest))
}

/** What rounding N and ln f does to f where exponents or densities are extreme, relative to E² in units of eps. */
function darkNoise(model: Model, N: number): number {
  const { law } = model
  const noise = Math.abs(law.logDensity(N)) + Math.abs(3 * (1 + law.w(N)) * N)
  return noise > LOUD && noise < 1e16 ? noise * darkShare(model, N) : 0
}
