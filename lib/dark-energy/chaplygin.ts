import { exponential, logarithm, minus, over, plus, times } from '../numerics/twofold'
import { type Family, type Law, numberOf } from './law'
import { powerLaw } from './power-law'
import { smoothLaw } from './smooth-law'

/**
 * f = [B + (1 − B) a^(−k)]^(1/(1+α)), k = 3(1 + α). The part of the bracket that falls is g = 1/(1 + (B/(1 − B)) a^k),
 * and w = −(1 − g).
 */
function generalisedChaplygin(b: number, alpha: number): Law {
  if (b === 1) return powerLaw(-1)
  if (b === 0) return powerLaw(0)
  const k = 3 * (1 + alpha)
  const [logConstant, logDust] = [Math.log(b), Math.log1p(-b)]
  const odds = (N: number) => logConstant - logDust + k * N
  const falling = (N: number) => 1 / (1 + Math.exp(odds(N)))
  const constant = (N: number) => 1 / (1 + Math.exp(-odds(N)))
  const bracketChange = (N: number, d: number): number => {
    const [g, rest, growth] = [falling(N), constant(N), -k * d]
    if (growth > 1) return growth + Math.log(g + rest * Math.exp(-growth))
    return growth < -1 ? Math.log(rest + g * Math.exp(growth)) : Math.log1p(g * Math.expm1(growth))
  }
  const n = (N: number) => 3 * falling(N)
  // Where the smaller part of the bracket, over the larger and over 1 + α, is 1e-17.
  const settled = Math.log(1e-17 * Math.min(1, 1 + alpha))
  return smoothLaw({
    logDensity: (N) => bracketChange(0, N) / (1 + alpha),
    roughness: (N) => (8 * (4 + Math.abs(k * N))) / (1 + alpha),
    preciseLogDensity: (N) => {
      const whole = plus([1, 0], [alpha, 0])
      const dust = times(minus([1, 0], [b, 0]), exponential(times(times([-3, 0], whole), [N, 0])))
      return over(logarithm(plus([b, 0], dust)), whole)
    },
    logChange: (N, d) => bracketChange(N, d) / (1 + alpha),
    w: (N) => -constant(N),
    wSlope: (N) => -k * falling(N) * constant(N),
    exponentRange: (from, to) => [n(to), n(from)],
    past: {
      kind: 'power',
      exponent: 3,
      logCoefficient: logDust / (1 + alpha),
      settled: (settled - logConstant + logDust) / k,
    },
    future: {
      kind: 'power',
      exponent: 0,
      logCoefficient: logConstant / (1 + alpha),
      settled: (logDust - logConstant - settled) / k,
    },
  })
}

export const chaplygin: Family = {
  key: 'chaplygin',
  label: 'generalised Chaplygin gas',
  formula: 'ρ/ρ_0 = [B + (1 − B) a^(−3(1+α))]^(1/(1+α))',
  meaning: 'A gas that thins out like dust early and keeps a constant density late; B is −w today.',
  source:
    'Kamenshchik, Moschella & Pasquier 2001, Phys. Lett. B 511, 265; Bento, Bertolami & Sen 2002, Phys. Rev. D 66, 043507',
  caution: 'Below B = 1 the gas carries dust of its own; where it stands for all dark matter, matter is baryons alone.',
  parameters: [
    {
      kind: 'number',
      key: 'b',
      symbol: 'B',
      label: 'constant part',
      unit: '',
      meaning: 'Constant part of the bracket, equal to −w today: 1 is a cosmological constant, 0 is dust.',
      min: 0,
      max: 1,
      fallback: 0.8,
      slider: { min: 0, max: 1, step: 0.001 },
    },
    {
      kind: 'number',
      key: 'alpha',
      symbol: 'α',
      label: 'exponent',
      unit: '',
      meaning: 'Pressure goes like −ρ^{−α}: 1 is the Chaplygin gas proper, 0 a cosmological constant with dust.',
      min: -0.99,
      max: 20,
      fallback: 0,
      slider: { min: -0.5, max: 1, step: 0.01 },
    },
  ],
  law: (values) => generalisedChaplygin(numberOf(values, 'b'), numberOf(values, 'alpha')),
}
