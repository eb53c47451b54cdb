/** f = a^(−n) with one exponent throughout: the law of a constant w, and what `beyond:hold` continues with. */
import type { Law } from './law'

/** Law of constant w, any finite w; exact but for the rounding of exp. */
export function powerLaw(w: number): Law {
  const n = 3 * (1 + w)
  const asymptote = { kind: 'power', exponent: n, logCoefficient: 0, settled: 0 } as const
  const range = [n, n] as const
  return {
    density: n === 0 ? () => 1 : (N) => Math.exp(-n * N),
    change: n === 0 ? () => 0 : (N, d) => Math.exp(-n * N) * Math.expm1(-n * d),
    w: () => w,
    wSlope: () => 0,
    exponentRange: () => range,
    past: asymptote,
    future: asymptote,
    breaks: [],
  }
}
