/** The integrals of a tail, in closed form. */
import { integralOfExp } from './far'

export type TailIntegral = PowerIntegral | SlowIntegral

export interface PowerIntegral {
  readonly kind: 'power'
  /** 1/E₁, times e^(−N) for η. */
  readonly scale: number
  /** Decay rate of the integrand per unit of D; not positive where the integral to infinity diverges. */
  readonly kappa: number
  /** Of (1 + δ)^(−½), without the leading 1. */
  readonly terms: readonly Correction[]
}

/** Of e^(−decay D) (1 + rate D)^(−1 − excess): E² goes like a power of ln a, and nothing else counts. */
export interface SlowIntegral {
  readonly kind: 'slow'
  readonly scale: number
  readonly decay: number
  readonly rate: number
  readonly excess: number
}

export interface Correction {
  /** Size relative to the leading power where the tail begins. */
  readonly size: number
  /** Decay per unit of D relative to the leading power. */
  readonly rate: number
}

/** ∫ from the beginning of the tail out to D. */
export function elapsedIn(integral: TailIntegral, D: number): number {
  if (integral.kind === 'slow') return slowElapsed(integral, D)
  const { kappa, terms } = integral
  let sum = elapsedTerm(kappa, D)
  for (const { size, rate } of terms) sum += size * elapsedTerm(kappa + rate, D)
  return integral.scale * sum
}

const elapsedTerm = (kappa: number, D: number): number => (kappa === 0 ? D : -Math.expm1(-kappa * D) / kappa)

/** ∫ from D out to infinity; Infinity where it diverges. */
export function remainingIn(integral: TailIntegral, D: number): number {
  if (integral.kind === 'slow') return slowRemaining(integral, D)
  if (integral.kappa <= 0) return Number.POSITIVE_INFINITY
  const { kappa, terms } = integral
  let sum = Math.exp(-kappa * D) / kappa
  for (const { size, rate } of terms) sum += (size * Math.exp(-(kappa + rate) * D)) / (kappa + rate)
  return integral.scale * sum
}

const logSlow =
  ({ decay, rate, excess }: SlowIntegral) =>
  (D: number) =>
    -decay * D - (1 + excess) * Math.log1p(rate * D)

function slowElapsed(integral: SlowIntegral, D: number): number {
  const { scale, decay, rate, excess } = integral
  if (decay !== 0) return scale * integralOfExp(logSlow(integral), 0, D)
  const growth = Math.log1p(rate * D)
  return (scale / rate) * (excess === 0 ? growth : -Math.expm1(-excess * growth) / excess)
}

/** To infinity, or to where 1 + rate D vanishes and the law ends. */
function slowRemaining(integral: SlowIntegral, D: number): number {
  const { scale, decay, rate, excess } = integral
  if (decay < 0 && rate > 0) return Number.POSITIVE_INFINITY
  if (decay !== 0) return scale * integralOfExp(logSlow(integral), D, rate < 0 ? -1 / rate : Number.POSITIVE_INFINITY)
  if (!(excess * rate > 0)) return Number.POSITIVE_INFINITY
  return (scale * Math.exp(-excess * Math.log1p(rate * D))) / (rate * excess)
}
