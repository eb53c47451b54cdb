/**
 * Beyond the last panel: E² is one power of a with small corrections, or one power of ln a, and the integrals are closed forms.
 * With 1/E = e^(κ₀D)/E₁ · (1 − ½ Σ δ_i e^(−p_i D)), D the distance in ln a beyond the panel,
 * ∫ = 1/E₁ [I(κ) − ½ Σ δ_i I(κ + p_i)], I(κ) = (1 − e^(−κD))/κ. The next order is ⅜ δ² < 2e-18 of the leading one.
 */

import { asymptoteOf, type Component } from '../components'
import type { Logarithmic } from '../dark-energy/law'
import { logarithmicIn, type Model } from '../model'
import { integralOfExp } from './far'
import type { Direction } from './turning'

export type Clock = 'time' | 'conformal'

export interface Tail {
  /** Where it begins. */
  readonly N: number
  readonly direction: Direction
  readonly time: TailIntegral
  readonly conformal: TailIntegral
  /** E² beyond, at distance D. */
  expansion(D: number): number
}

export type TailIntegral = PowerIntegral | SlowIntegral

export interface PowerIntegral {
  readonly kind: 'power'
  /** 1/E₁, times e^(−N) for η. */
  readonly scale: number
  /** Decay rate of the integrand per unit of D; not positive where the integral to infinity diverges. */
  readonly kappa: number
  readonly corrections: readonly Correction[]
}

/** Of e^(−decay D) (1 + rate D)^(−1 − excess): E² goes like a power of ln a, and nothing else counts. */
export interface SlowIntegral {
  readonly kind: 'slow'
  readonly scale: number
  readonly decay: number
  readonly rate: number
  readonly excess: number
  readonly corrections: readonly Correction[]
}

interface Correction {
  /** Size relative to the leading power where the tail begins. */
  readonly size: number
  /** Decay per unit of D relative to the leading power. */
  readonly rate: number
}

/** Relative size of corrections from which the closed form is good to 1e-17. */
const SMALL = 2e-9
const NEGLIGIBLE = 1e-19

/** Does a component outgrow every power in this direction? Then there is no closed tail, and no need of one. */
export const explodes = (model: Model, direction: Direction): boolean =>
  model.acting.some((one) => asymptoteOf(one, direction).kind === 'exploding')

/** A power of ln a counts as exponent 0, unless it is used up at finite a. */
export function exponentIn(one: Component, direction: Direction): number | null {
  const asymptote = asymptoteOf(one, direction)
  if (asymptote.kind === 'power') return asymptote.exponent
  return asymptote.kind === 'logarithmic' && asymptote.edge?.kind !== 'empty' ? 0 : null
}

/** The exponent that wins in this direction, or null when no component follows a power. */
export function leadingExponent(model: Model, direction: Direction): number | null {
  let winner: number | null = null
  for (const one of model.acting) {
    const exponent = exponentIn(one, direction)
    if (exponent !== null && (winner === null || direction * exponent < direction * winner)) winner = exponent
  }
  return winner
}

/** Whether the integral to the far end is finite, from what wins there. */
export function converges(model: Model, direction: Direction, clock: Clock): boolean {
  if (explodes(model, direction)) return true
  const exponent = leadingExponent(model, direction)
  if (exponent === null) return false
  const slow = exponent === 0 ? logarithmicIn(model, direction) : null
  if (slow && clock === 'time') return slow.overTwo * slow.rate * direction > 0
  return -direction * exponent + (clock === 'conformal' ? 2 * direction : 0) > 0
}

/** The tail from N on, or null where corrections are still too large; `anyway`, at the end of the doubles, leaves them out. */
export function tailAt(model: Model, direction: Direction, N: number, anyway = false): Tail | null {
  const exponent = leadingExponent(model, direction)
  if (exponent === null || explodes(model, direction)) return null
  const leading: Component[] = []
  const others: Component[] = []
  for (const one of model.acting) {
    const asymptote = asymptoteOf(one, direction)
    const leads = exponentIn(one, direction) === exponent
    if (leads && asymptote.kind === 'power' && !anyway && direction * (N - asymptote.settled) < 0) return null
    ;(leads ? leading : others).push(one)
  }
  const density = leading.reduce((sum, one) => sum + one.density(N), 0)
  if (!(density > 0)) return null
  const slow = exponent === 0 ? logarithmicIn(model, direction) : null
  if (slow)
    return others.every((one) => Math.abs(one.density(N)) < NEGLIGIBLE * density)
      ? slowTail(N, direction, density, slow)
      : null
  const corrections = others.map((one) => correctionOf(one, direction, N, density, exponent))
  if (corrections.every((one) => one !== null && Math.abs(one.size) <= SMALL)) {
    return powerTail(
      N,
      direction,
      exponent,
      density,
      corrections.filter((one) => one !== null && one.size !== 0) as Correction[],
    )
  }
  return anyway ? powerTail(N, direction, exponent, density, []) : null
}

/** δ and p of one component, or null while it does not yet follow its power and still matters. */
function correctionOf(
  one: Component,
  direction: Direction,
  N: number,
  density: number,
  exponent: number,
): Correction | null {
  const asymptote = asymptoteOf(one, direction)
  const size = one.density(N) / density
  if (Math.abs(size) < NEGLIGIBLE) return { size: 0, rate: 1 }
  if (asymptote.kind !== 'power' || direction * (N - asymptote.settled) < 0) return null
  return { size, rate: direction * (asymptote.exponent - exponent) }
}

function powerTail(
  N: number,
  direction: Direction,
  exponent: number,
  density: number,
  corrections: readonly Correction[],
): Tail {
  const scale = 1 / Math.sqrt(density)
  const kappa = (-direction * exponent) / 2
  return {
    N,
    direction,
    time: { kind: 'power', scale, kappa, corrections },
    conformal: { kind: 'power', scale: scale * Math.exp(-N), kappa: kappa + direction, corrections },
    expansion: (D) => {
      const sum = corrections.reduce((total, one) => total + one.size * Math.exp(-one.rate * D), 1)
      return density * Math.exp(-direction * exponent * D) * sum
    },
  }
}

function slowTail(N: number, direction: Direction, density: number, law: Logarithmic): Tail {
  const scale = 1 / Math.sqrt(density)
  const rate = (direction * law.rate) / (1 + law.rate * N)
  const shape = { kind: 'slow', rate, excess: law.overTwo / 2, corrections: [] } as const
  return {
    N,
    direction,
    time: { ...shape, scale, decay: 0 },
    conformal: { ...shape, scale: scale * Math.exp(-N), decay: direction },
    expansion: (D) => density * Math.exp(law.power * Math.log1p(rate * D)),
  }
}

/** ∫ from the beginning of the tail out to D. */
export function elapsedIn(integral: TailIntegral, D: number): number {
  if (integral.kind === 'slow') return slowElapsed(integral, D)
  const term = (kappa: number) => (kappa === 0 ? D : -Math.expm1(-kappa * D) / kappa)
  return (
    integral.scale *
    integral.corrections.reduce(
      (sum, one) => sum - 0.5 * one.size * term(integral.kappa + one.rate),
      term(integral.kappa),
    )
  )
}

/** ∫ from D out to infinity; Infinity where it diverges. */
export function remainingIn(integral: TailIntegral, D: number): number {
  if (integral.kind === 'slow') return slowRemaining(integral, D)
  if (integral.kappa <= 0) return Number.POSITIVE_INFINITY
  const term = (kappa: number) => Math.exp(-kappa * D) / kappa
  return (
    integral.scale *
    integral.corrections.reduce(
      (sum, one) => sum - 0.5 * one.size * term(integral.kappa + one.rate),
      term(integral.kappa),
    )
  )
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
