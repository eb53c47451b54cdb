import { exponential, minus, plus, times } from '../numerics/twofold'
import { type Family, type Law, numberOf } from './law'
import { powerLaw } from './power-law'
import { rangeBetween, smoothLaw } from './smooth-law'
import { W_TODAY, wSlopeParameter } from './two-numbers'

/** f = a^(−3(1+w0)) e^((3/2) wa (1−a)²). */
function quadraticInScale(w0: number, wa: number): Law {
  if (wa === 0) return powerLaw(w0)
  const n = 3 * (1 + w0)
  // a (1 − a), which is largest at a = 1/2.
  const hump = (N: number) => -Math.exp(N) * Math.expm1(N)
  const w = (N: number) => w0 + wa * hump(N)
  return smoothLaw({
    logDensity: (N) => -n * N + 1.5 * wa * Math.expm1(N) ** 2,
    roughness: (N) => 4 * (3 * (1 + Math.abs(w0)) * Math.abs(N) + Math.abs(1.5 * wa) * Math.expm1(N) ** 2),
    preciseLogDensity: (N) => {
      const growth = minus(exponential([N, 0]), [1, 0])
      const slope = times([-3, 0], plus([1, 0], [w0, 0]))
      return plus(times(slope, [N, 0]), times(times([1.5, 0], [wa, 0]), times(growth, growth)))
    },
    logChange: (N, d) => {
      const [a, growth] = [Math.exp(N), Math.expm1(d)]
      return -n * d + 1.5 * wa * a * growth * (a * (growth + 2) - 2)
    },
    w,
    wSlope: (N) => wa * Math.exp(N) * (1 - 2 * Math.exp(N)),
    exponentRange: (from, to) => {
      const [low, high] = rangeBetween(w(from), w(to))
      if (!(from < -Math.LN2 && to > -Math.LN2)) return [low, high]
      const top = 3 * (1 + w0 + wa / 4)
      return [Math.min(low, top), Math.max(high, top)]
    },
    // |3 wa a| < 1e-17
    past: {
      kind: 'power',
      exponent: n,
      logCoefficient: 1.5 * wa,
      settled: Math.log(1e-17 / Math.abs(3 * wa)),
    },
    future: { kind: wa > 0 ? 'exploding' : 'vanishing' },
  })
}

export const jbp: Family = {
  key: 'jbp',
  label: 'w quadratic in a',
  formula: 'w = w_0 + w_a a (1 − a)',
  meaning: 'w is w_0 both in the early universe and today, off by w_a/4 at a = 1/2, and runs away like −w_a a² beyond.',
  source: 'Jassal, Bagla & Padmanabhan 2005, Mon. Not. R. Astron. Soc. 356, L11',
  caution: 'The law describes the past; beyond today w runs away with the square of a, which no measurement supports.',
  parameters: [W_TODAY, wSlopeParameter('−dw/da today; w at a = 1/2 differs from w_0 by a quarter of it.')],
  law: (values) => quadraticInScale(numberOf(values, 'w0'), numberOf(values, 'wa')),
}
