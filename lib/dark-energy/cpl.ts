import { exponential, minus, plus, times } from '../numerics/twofold'
import { type Asymptote, type Family, type Law, numberOf } from './law'
import { powerLaw } from './power-law'
import { rangeBetween, smoothLaw } from './smooth-law'
import { W_TODAY, wSlopeParameter } from './two-numbers'

/** f = a^(−3(1+w0+wa)) e^(−3wa(1−a)): closed form of Linder 2003, Phys. Rev. Lett. 90, 091301, eq. 7. */
function linearInScale(w0: number, wa: number): Law {
  if (wa === 0) return powerLaw(w0)
  const early = 3 * (1 + w0 + wa)
  const w = (N: number) => w0 - wa * Math.expm1(N)
  const past: Asymptote = {
    kind: 'power',
    exponent: early,
    logCoefficient: -3 * wa,
    // |3 wa a| < 1e-17
    settled: Math.log(1e-17 / Math.abs(3 * wa)),
  }
  return smoothLaw({
    logDensity: (N) => -early * N + 3 * wa * Math.expm1(N),
    densitiesInto(out, places, inverseScales, from, to) {
      for (let i = from; i < to; i++) out[i] = Math.exp(3 * wa * (1 / inverseScales[i] - 1) - early * places[i])
    },
    roughness: (N) => 4 * (3 * (1 + Math.abs(w0) + Math.abs(wa)) * Math.abs(N) + Math.abs(3 * wa * Math.expm1(N))),
    preciseLogDensity: (N) => {
      const early = times([-3, 0], plus([1, 0], plus([w0, 0], [wa, 0])))
      const growth = minus(exponential([N, 0]), [1, 0])
      return plus(times(early, [N, 0]), times(times([3, 0], [wa, 0]), growth))
    },
    logChange: (N, d) => -early * d + 3 * wa * Math.exp(N) * Math.expm1(d),
    w,
    wSlope: (N) => -wa * Math.exp(N),
    exponentRange: (from, to) => rangeBetween(w(from), w(to)),
    past,
    future: { kind: wa > 0 ? 'exploding' : 'vanishing' },
  })
}

export const cpl: Family = {
  key: 'cpl',
  label: 'w linear in a',
  formula: 'w = w_0 + w_a (1 − a)',
  meaning: 'w moves from w_0 + w_a in the early universe through w_0 today, and on without bound in the future.',
  source: 'Chevallier & Polarski 2001, Int. J. Mod. Phys. D 10, 213; Linder 2003, Phys. Rev. Lett. 90, 091301',
  caution: 'The law describes the past; beyond today w runs away linearly in a, which no measurement supports.',
  parameters: [W_TODAY, wSlopeParameter('−dw/da: by how much w was larger in the early universe than today.')],
  law: (values) => linearInScale(numberOf(values, 'w0'), numberOf(values, 'wa')),
}
