import { minus, plus, times } from '../numerics/twofold'
import { type Asymptote, type Family, type Law, numberOf } from './law'
import { powerLaw } from './power-law'
import { rangeBetween, smoothLaw } from './smooth-law'
import { W_TODAY, wSlopeParameter } from './two-numbers'

/** f = e^(−3(1+w0)N + (3/2) wa N²). */
function linearInLogarithm(w0: number, wa: number): Law {
  if (wa === 0) return powerLaw(w0)
  const n = 3 * (1 + w0)
  const w = (N: number) => w0 - wa * N
  const both: Asymptote = { kind: wa > 0 ? 'exploding' : 'vanishing' }
  return smoothLaw({
    logDensity: (N) => N * (1.5 * wa * N - n),
    roughness: (N) => 4 * (Math.abs(1.5 * wa * N * N) + 3 * (1 + Math.abs(w0)) * Math.abs(N)),
    preciseLogDensity: (N) => {
      const bend = times(times([1.5, 0], [wa, 0]), [N, 0])
      return times(minus(bend, times([3, 0], plus([1, 0], [w0, 0]))), [N, 0])
    },
    logChange: (N, d) => d * (1.5 * wa * (2 * N + d) - n),
    w,
    wSlope: () => -wa,
    exponentRange: (from, to) => rangeBetween(w(from), w(to)),
    past: both,
    future: both,
  })
}

export const logarithmic: Family = {
  key: 'log',
  label: 'w linear in ln a',
  formula: 'w = w_0 − w_a ln a',
  meaning: 'w changes by the same amount in every e-fold, without bound in both directions.',
  source: 'Efstathiou 1999, Mon. Not. R. Astron. Soc. 310, 842',
  caution:
    'The law was meant for redshifts up to about 4; with w_a > 0 the density outgrows all else far back and ahead.',
  parameters: [W_TODAY, wSlopeParameter('−dw/d ln a: by how much w was larger one e-fold ago than today.')],
  law: (values) => linearInLogarithm(numberOf(values, 'w0'), numberOf(values, 'wa')),
}
