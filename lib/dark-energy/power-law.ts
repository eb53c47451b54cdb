/** f = a^(−n) with one exponent throughout: the law of a constant w, and what `beyond:hold` continues with. */
import { plus, times } from '../numerics/twofold'
import type { Law } from './law'
import { smoothLaw } from './smooth-law'

/** Law of constant w, any finite w; exact but for rounding. */
export function powerLaw(w: number): Law {
  const n = 3 * (1 + w)
  const asymptote = { kind: 'power', exponent: n, logCoefficient: 0, settled: 0 } as const
  const range = [n, n] as const
  const precise = times([-3, 0], plus([1, 0], [w, 0]))
  const law = smoothLaw({
    exponent: n,
    logDensity: n === 0 ? () => 0 : (N) => -n * N,
    preciseLogDensity: (N) => times(precise, [N, 0]),
    logChange: (_, d) => -n * d,
    w: () => w,
    wSlope: () => 0,
    exponentRange: () => range,
    past: asymptote,
    future: asymptote,
  })
  return n === 0 ? { ...law, density: () => 1, change: () => 0, bend: () => 0 } : law
}
