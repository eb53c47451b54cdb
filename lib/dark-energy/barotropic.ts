import { logarithm, minus, over, plus, times } from '../numerics/twofold'
import { type Edge, type Family, type Law, type Logarithmic, numberOf, type Part } from './law'
import { powerLaw } from './power-law'
import { smoothLaw } from './smooth-law'

/** f = u^(1/(1−α)), u = 1 + 3A(1 − α)N, from dρ/dN = 3Aρ_0 (ρ/ρ_0)^α; for α = 1 a power of a. */
function ofDensity(excess: number, alpha: number): Law {
  const rate = 3 * excess * (1 - alpha)
  if (rate === 0) return powerLaw(-1 - excess)
  return alpha === 0 ? linear(rate) : powerOfLogarithm(excess, alpha, rate)
}

/** Where u reaches zero the density diverges (α > 1), is used up (0 < α < 1), or is used up while the pressure diverges (α < 0). */
function powerOfLogarithm(excess: number, alpha: number, rate: number): Law {
  const power = 1 / (1 - alpha)
  const edge: Edge = { N: -1 / rate, kind: alpha > 0 && alpha < 1 ? 'empty' : 'singular' }
  const beyond = alpha > 1 ? Number.POSITIVE_INFINITY : 0
  const isBeyond = (N: number) => rate * N <= -1
  const u = (N: number) => 1 + rate * N
  const inside = smoothLaw({
    logDensity: (N) => power * Math.log1p(rate * N),
    roughness: (N) => 4 * Math.abs(power) * (Math.abs((rate * N) / u(N)) + 2 * Math.abs(Math.log1p(rate * N))),
    preciseLogDensity: (N) => {
      const rest = minus([1, 0], [alpha, 0])
      const exact = times(times([3, 0], [excess, 0]), rest)
      return over(logarithm(plus([1, 0], times(exact, [N, 0]))), rest)
    },
    logChange: (N, d) => power * Math.log1p((rate * d) / u(N)),
    w: (N) => -1 - excess / u(N),
    wSlope: (N) => (excess * rate) / u(N) ** 2,
    exponentRange: (from, to) => exponentsBetween(excess, u(from), u(to)),
    past: logarithmic(alpha, rate, rate > 0 ? edge : null),
    future: logarithmic(alpha, rate, rate < 0 ? edge : null),
    breaks: edge.kind === 'empty' ? [edge.N] : [],
  })
  const density = (N: number) => (isBeyond(N) ? beyond : inside.density(N))
  return {
    ...inside,
    density,
    logDensity: (N) => (isBeyond(N) ? Math.log(beyond) : inside.logDensity(N)),
    change: (N, d) => (isBeyond(N) || isBeyond(N + d) ? density(N + d) - density(N) : inside.change(N, d)),
    // From the edge itself the distance alone decides.
    bend: (N, d) => (N === edge.N ? Math.max(0, rate * d) ** power : inside.bend(N, d)),
    derivativesInto: (out, N) => {
      if (!isBeyond(N)) return inside.derivativesInto(out, N)
      out[0] = beyond
      out[1] = out[2] = 0
    },
    w: (N) => (isBeyond(N) ? Number.NaN : inside.w(N)),
  }
}

function logarithmic(alpha: number, rate: number, edge: Edge | null): Logarithmic {
  return { kind: 'logarithmic', rate, power: 1 / (1 - alpha), overTwo: (2 * alpha - 1) / (1 - alpha), edge }
}

/** n = −3A/u between two values of u, without bound where u reaches zero; beyond that there is none. */
function exponentsBetween(excess: number, from: number, to: number): readonly [number, number] {
  const [low, high] = [Math.max(0, Math.min(from, to)), Math.max(from, to)]
  if (high <= 0) return [0, 0]
  const [one, other] = [(-3 * excess) / low, (-3 * excess) / high]
  return one < other ? [one, other] : [other, one]
}

/** α = 0: f = u, of either sign. */
function linear(rate: number): Law {
  const u = (N: number) => 1 + rate * N
  const slow: Logarithmic = { kind: 'logarithmic', rate, power: 1, overTwo: -1, edge: null }
  return {
    density: u,
    logDensity: (N) => Math.log(Math.abs(u(N))),
    change: (_, d) => rate * d,
    bend: () => 0,
    derivativesInto: (out, N) => {
      out[0] = u(N)
      out[1] = rate
      out[2] = 0
    },
    w: (N) => -1 - rate / (3 * u(N)),
    exponentRange: (from, to) => {
      const [low, high] = [u(from), u(to)]
      if (low === 0 || high === 0 || low > 0 !== high > 0) return [Number.NEGATIVE_INFINITY, Number.POSITIVE_INFINITY]
      const [one, other] = [-rate / low, -rate / high]
      return one < other ? [one, other] : [other, one]
    },
    parts: (direction) => (direction * rate < 0 ? fallingParts(rate) : null),
    past: slow,
    future: slow,
    breaks: [],
  }
}

/** 1 − x = 2 − (1 + x), x = |rate N| outwards: two parts that keep their signs. */
function fallingParts(rate: number): readonly Part[] {
  const grown = (N: number) => 1 - rate * N
  return [
    { factor: 2, logDensity: () => 0, exponentRange: () => [0, 0] },
    {
      factor: -1,
      logDensity: (N) => Math.log(grown(N)),
      exponentRange: (from, to) => [rate / grown(from), rate / grown(to)],
    },
  ]
}

export const barotropic: Family = {
  key: 'barotropic',
  label: 'pressure follows density',
  formula: 'p = −ρ − A ρ_0 (ρ/ρ_0)^α',
  meaning: 'An excess pressure that hangs on the density alone: the density grows for A > 0 and falls for A < 0.',
  source:
    'Nojiri, Odintsov & Tsujikawa 2005, Phys. Rev. D 71, 063004; Frampton, Ludwick & Scherrer 2011, Phys. Rev. D 84, 063003',
  caution: 'Made to list what endings are possible (rip, little rip, sudden singularity), not drawn from measurements.',
  parameters: [
    {
      kind: 'number',
      key: 'excess',
      symbol: 'A',
      label: 'excess',
      unit: '',
      meaning: 'How far w today lies below −1.',
      min: -10,
      max: 10,
      fallback: 0,
      slider: { min: -0.5, max: 0.5, step: 0.01 },
    },
    {
      kind: 'number',
      key: 'alpha',
      symbol: 'α',
      label: 'exponent',
      unit: '',
      meaning:
        'Power of the density in the excess: up to 1/2 no rip, up to 1 a rip, above 1 a singularity at finite a.',
      min: -5,
      max: 5,
      fallback: 0.5,
      slider: { min: -1, max: 2, step: 0.01 },
    },
  ],
  positive: true,
  law: (values) => ofDensity(numberOf(values, 'excess'), numberOf(values, 'alpha')),
}
