/** A law from its logarithm: all that follows from ln f, its differences, w and w′, for a density that never vanishes. */
import { relativeBend } from '../numerics/bend'
import type { Twofold } from '../numerics/twofold'
import type { Asymptote, Law } from './law'

export interface Logarithm extends Pick<Law, 'densitiesInto' | 'exponent'> {
  logDensity(N: number): number
  roughness?(N: number): number
  preciseLogDensity?(N: number): Twofold
  /** ln f(N + d) − ln f(N), without cancellation for small d. */
  logChange(N: number, d: number): number
  w(N: number): number
  /** dw/dN. */
  wSlope(N: number): number
  exponentRange(from: number, to: number): readonly [number, number]
  readonly past: Asymptote
  readonly future: Asymptote
  readonly breaks?: readonly number[]
}

export function smoothLaw(log: Logarithm): Law {
  const {
    exponent,
    densitiesInto,
    logDensity,
    roughness,
    preciseLogDensity,
    logChange,
    w,
    wSlope,
    exponentRange,
    past,
    future,
    breaks = [],
  } = log
  return {
    exponent,
    density: (N) => Math.exp(logDensity(N)),
    densitiesInto,
    logDensity,
    roughness,
    preciseLogDensity,
    change: (N, d) => {
      const [log, change] = [logDensity(N), logChange(N, d)]
      // A density too small for doubles may grow into them.
      return change > 1 ? Math.exp(log + change) - Math.exp(log) : Math.exp(log) * Math.expm1(change)
    },
    bend: (N, d) => {
      const [log, change] = [logDensity(N), logChange(N, d)]
      if (change > 1) return Math.exp(log + change) - Math.exp(log) * (1 - 3 * (1 + w(N)) * d)
      return Math.exp(log) * relativeBend(change, d, (t) => 3 * wSlope(N + t))
    },
    derivativesInto(out, N) {
      const n = 3 * (1 + w(N))
      out[0] = Math.exp(logDensity(N))
      out[1] = -n * out[0]
      out[2] = (n * n - 3 * wSlope(N)) * out[0]
    },
    w,
    exponentRange,
    past,
    future,
    breaks,
  }
}

/** Bounds of 3(1 + w) where w runs monotonically from one end to the other. */
export function rangeBetween(one: number, other: number): readonly [number, number] {
  const [a, b] = [3 * (1 + one), 3 * (1 + other)]
  return a < b ? [a, b] : [b, a]
}
