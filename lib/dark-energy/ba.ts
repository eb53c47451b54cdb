import { exponential, logarithm, minus, plus, times } from '../numerics/twofold'
import { type Family, type Law, numberOf } from './law'
import { powerLaw } from './power-law'
import { rangeBetween, smoothLaw } from './smooth-law'
import { W_TODAY, wSlopeParameter } from './two-numbers'

/** z(1 + z)/(1 + z²) = (1 − a)/(2a² − 2a + 1): from 1 at a = 0 up to TOP, through 0 today, down to BOTTOM, back to 0 from below. */
function shape(N: number): number {
  const x = Math.exp(-Math.abs(N))
  const numerator = -Math.expm1(-Math.abs(N))
  return N <= 0 ? numerator / (1 - 2 * x * numerator) : (-x * numerator) / (1 + numerator * numerator)
}

/** d shape/dN = a (2a² − 4a + 1)/(2a² − 2a + 1)². */
function shapeSlope(N: number): number {
  const x = Math.exp(-Math.abs(N))
  if (N <= 0) return (x * (2 * x * x - 4 * x + 1)) / (1 - 2 * x * (1 - x)) ** 2
  return (x * (2 - 4 * x + x * x)) / (2 - 2 * x + x * x) ** 2
}

const TOP = { N: Math.log1p(-Math.SQRT1_2), value: (1 + Math.SQRT2) / 2 }
const BOTTOM = { N: Math.log1p(Math.SQRT1_2), value: (1 - Math.SQRT2) / 2 }

/** ln(1 + z²), which is −2N to the last digit far back. */
const logGrowth = (N: number): number => (N < -300 ? -2 * N : Math.log1p(Math.expm1(-N) ** 2))

function logGrowthChange(N: number, d: number): number {
  if (N < -300 || Math.abs(d) > 0.5) return logGrowth(N + d) - logGrowth(N)
  const z = Math.expm1(-N)
  const change = Math.exp(-N) * Math.expm1(-d)
  return Math.log1p((change / (1 + z * z)) * (2 * z + change))
}

/** f = a^(−3(1+w0)) (1 + z²)^((3/2) wa). */
function boundedInRedshift(w0: number, wa: number): Law {
  if (wa === 0) return powerLaw(w0)
  const n = 3 * (1 + w0)
  const w = (N: number) => w0 + wa * shape(N)
  return smoothLaw({
    logDensity: (N) => -n * N + 1.5 * wa * logGrowth(N),
    roughness: (N) =>
      4 * (3 * (1 + Math.abs(w0)) * Math.abs(N) + Math.abs(1.5 * wa) * (1 + 2 * Math.abs(logGrowth(N)))),
    preciseLogDensity: (N) => {
      const z = minus(exponential([-N, 0]), [1, 0])
      const slope = times([-3, 0], plus([1, 0], [w0, 0]))
      return plus(times(slope, [N, 0]), times(times([1.5, 0], [wa, 0]), logarithm(plus([1, 0], times(z, z)))))
    },
    logChange: (N, d) => -n * d + 1.5 * wa * logGrowthChange(N, d),
    w,
    wSlope: (N) => wa * shapeSlope(N),
    exponentRange: (from, to) => {
      const turns = [TOP, BOTTOM]
        .filter((one) => from < one.N && to > one.N)
        .map((one) => 3 * (1 + w0 + wa * one.value))
      const [low, high] = rangeBetween(w(from), w(to))
      return [Math.min(low, ...turns), Math.max(high, ...turns)]
    },
    // 1 + z² = a⁻² (1 − 2a + 2a²), and |3 wa a| < 1e-17.
    past: {
      kind: 'power',
      exponent: 3 * (1 + w0 + wa),
      logCoefficient: 0,
      settled: Math.log(1e-17 / Math.abs(3 * wa)),
    },
    // 1 + z² = 2 (1 − 1/a + 1/2a²), and |3 wa/2a| < 1e-17.
    future: {
      kind: 'power',
      exponent: n,
      logCoefficient: 1.5 * wa * Math.LN2,
      settled: Math.log(1.5e17 * Math.abs(wa)),
    },
  })
}

export const ba: Family = {
  key: 'ba',
  label: 'w bounded at all times',
  formula: 'w = w_0 + w_a z(1 + z)/(1 + z²)',
  meaning: 'w moves from w_0 + w_a in the early universe through w_0 today and returns to w_0 in the far future.',
  source: 'Barboza & Alcaniz 2008, Phys. Lett. B 666, 415',
  caution: 'That w returns to its value of today in the far future is a property of the formula, not of a measurement.',
  parameters: [W_TODAY, wSlopeParameter('dw/dz today, and by how much w was larger in the early universe.')],
  law: (values) => boundedInRedshift(numberOf(values, 'w0'), numberOf(values, 'wa')),
}
