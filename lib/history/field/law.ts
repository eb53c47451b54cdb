/** A field on its way as a law of dark energy: ρ = φ̇²/6 + U, dρ/dN = −φ̇², and powers of a where the trail begins and ends. */
import type { Asymptote, Law } from '../../dark-energy/law'
import { coefficientsInto, NODE_COUNT, NODES } from '../../numerics/chebyshev'
import { gaussLegendre } from '../../numerics/gauss-legendre'
import { energyOf } from './motion'
import { intervalOf, type Trail } from './trail'

/** The exponents of the powers of a before and after the trail. */
export interface Outside {
  readonly before: number
  readonly after: number
}

/** What a law is told beside its trail. */
export interface Told {
  /** The field's energy today, the unit of the density. */
  readonly today: number
  readonly outside: Outside
  /** Where a derivative jumps. */
  readonly breaks: readonly number[]
  /** Relative error of ρ that the steps leave where none of them grows. */
  least(N: number): number
  /** Relative error of ρ at N. */
  error(N: number): number
}

/** n on the way to ρ = 0, and for ρ < 0, where ln ρ counts as −∞. */
const FALLING: readonly [number, number] = [1000, Number.POSITIVE_INFINITY]

export function fieldLaw(trail: Trail, { today, outside, breaks, least, error }: Told): Law {
  const { field, edges } = trail
  const [first, last] = [edges[0], edges[edges.length - 1]]
  const at = new Float64Array(2)
  /** f, f′ and f″ on the trail. */
  const inside = (out: Float64Array, N: number) => {
    trail.into(at, N)
    const [phi, speed, H] = [at[0], at[1], trail.rate(N)]
    const speedSlope = -3 * (speed + (field.height * field.potential.slope(phi)) / H)
    out[0] = energyOf(field, phi, speed) / today
    out[1] = (-speed * speed) / today
    out[2] = (-2 * speed * speedSlope) / today
  }
  const density = (N: number): number => {
    if (N < first) return before(N)
    if (N > last) return after(N)
    trail.into(at, N)
    return energyOf(field, at[0], at[1]) / today
  }
  const power = (N0: number, n: number) => {
    const f0 = density(N0)
    return (N: number) =>
      f0 === 0
        ? /* v8 ignore next -- an energy of exactly 0 at the end of a trail: by chance alone */ 0
        : f0 * Math.exp(-n * (N - N0))
  }
  const [before, after] = [power(first, outside.before), power(last, outside.after)]
  const logDensity = (N: number) => {
    if (N < first) return logBefore - outside.before * (N - first)
    if (N > last) return logAfter - outside.after * (N - last)
    return logOf(density(N))
  }
  const [logBefore, logAfter] = [logOf(density(first)), logOf(density(last))]
  const derivativesInto = (out: Float64Array, N: number) => {
    if (N >= first && N <= last) return inside(out, N)
    const n = N < first ? outside.before : outside.after
    out[0] = density(N)
    out[1] = -n * out[0]
    out[2] = n * n * out[0]
  }
  const energies = new Float64Array(3)
  const slope = (N: number) => {
    derivativesInto(energies, N)
    return energies[1]
  }
  const bending = (N: number) => {
    derivativesInto(energies, N)
    return energies[2]
  }
  const exponent = (N: number) => {
    derivativesInto(energies, N)
    return -energies[1] / energies[0]
  }
  /** Within about one interval a quadrature keeps the digits that a difference would lose. */
  const near = (N: number, d: number) => {
    const i = intervalOf(edges, N, 0)
    return Math.abs(d) <= edges[i + 1] - edges[i]
  }
  return {
    density,
    logDensity,
    change: (N, d) => (near(N, d) ? gaussLegendre((t) => slope(N + t), 0, d) : density(N + d) - density(N)),
    bend: (N, d) => gaussLegendre((t) => (d - t) * bending(N + t), 0, d),
    derivativesInto,
    w: (N) => exponent(N) / 3 - 1,
    exponentRange: rangesOf(edges, exponent, outside),
    past: asymptote(outside.before, logBefore, first),
    future: asymptote(outside.after, logAfter, last),
    breaks,
    noise: (N) => {
      const place = Math.min(last, Math.max(first, N))
      return (least(N) / Number.EPSILON) * Math.min(1, (Math.abs(density(place)) * today) / trail.rate(place) ** 2)
    },
    stray: (N) => error(N) / Number.EPSILON,
  }
}

const logOf = (f: number): number => (f > 0 ? Math.log(f) : Number.NEGATIVE_INFINITY)

const asymptote = (exponent: number, log: number, settled: number): Asymptote => ({
  kind: 'power',
  exponent,
  logCoefficient: log + exponent * settled,
  settled,
})

/** Bounds of n, interval by interval, from the sizes of its Chebyshev coefficients there; made when first asked for. */
function rangesOf(edges: Float64Array, exponent: (N: number) => number, outside: Outside): Law['exponentRange'] {
  const known: (readonly [number, number] | undefined)[] = []
  const rangeOf = (i: number) => {
    const found = known[i] ?? rangeOver(exponent, edges[i], edges[i + 1])
    known[i] = found
    return found
  }
  const [first, last] = [edges[0], edges[edges.length - 1]]
  return (from, to) => {
    if (from === to) {
      const n = exponent(from)
      return [n, n]
    }
    let [low, high] = [Number.POSITIVE_INFINITY, Number.NEGATIVE_INFINITY]
    const add = ([least, most]: readonly [number, number]) => {
      low = Math.min(low, least)
      high = Math.max(high, most)
    }
    if (from < first) add([outside.before, outside.before])
    if (to > last) add([outside.after, outside.after])
    if (to < first || from > last) return [low, high]
    const end = intervalOf(edges, to, 0)
    for (let i = intervalOf(edges, from, 0); i <= end; i++) add(rangeOf(i))
    return [low, high]
  }
}

const samples = new Float64Array(NODE_COUNT)
const coefficients = new Float64Array(NODE_COUNT)

/** c₀ ± Σ|c_j| where ρ > 0: every value of the interpolant lies inside. */
function rangeOver(f: (N: number) => number, from: number, to: number): readonly [number, number] {
  const [centre, half] = [(from + to) / 2, (to - from) / 2]
  for (let k = 0; k < NODE_COUNT; k++) samples[k] = f(centre + half * NODES[k])
  coefficientsInto(coefficients, samples)
  let spread = 1e-12
  for (let j = 1; j < NODE_COUNT; j++) spread += Math.abs(coefficients[j])
  if (samples.every((n) => n >= 0 && n < FALLING[0])) return [coefficients[0] - spread, coefficients[0] + spread]
  // ρ passes zero here, and n runs from its least value to infinity.
  const least = samples.reduce((low, n) => (n >= 0 ? Math.min(low, n) : low), FALLING[0])
  return [0.9 * least, FALLING[1]]
}
