/**
 * Beyond the last panel: E² is one power of a with small corrections, and the integrals are closed forms.
 * With 1/E = e^(κ₀D)/E₁ · (1 − ½ Σ δ_i e^(−p_i D)), D the distance in ln a beyond the panel,
 * ∫ = 1/E₁ [I(κ) − ½ Σ δ_i I(κ + p_i)], I(κ) = (1 − e^(−κD))/κ. The next order is ⅜ δ² < 2e-18 of the leading one.
 */
import type { Asymptote } from '../dark-energy/law'
import type { Component, Model } from '../model'
import type { Direction } from './turning'

export interface Tail {
  /** Where it begins. */
  readonly N: number
  readonly direction: Direction
  readonly time: PowerIntegral
  readonly conformal: PowerIntegral
  /** E² beyond, at distance D. */
  expansion(D: number): number
}

export interface PowerIntegral {
  /** 1/E₁, times e^(−N) for η. */
  readonly scale: number
  /** Decay rate of the integrand per unit of D; not positive where the integral to infinity diverges. */
  readonly kappa: number
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

const asymptoteOf = (one: Component, direction: Direction): Asymptote => (direction > 0 ? one.future : one.past)

/** Does a component outgrow every power in this direction? Then there is no closed tail, and no need of one. */
export const explodes = (model: Model, direction: Direction): boolean =>
  model.components.some((one) => asymptoteOf(one, direction).kind === 'exploding')

/** The exponent that wins in this direction, or null when no component follows a power. */
export function leadingExponent(model: Model, direction: Direction): number | null {
  const exponents = model.components.flatMap((one) => {
    const asymptote = asymptoteOf(one, direction)
    return asymptote.kind === 'power' ? [asymptote.exponent] : []
  })
  if (exponents.length === 0) return null
  return direction > 0 ? Math.min(...exponents) : Math.max(...exponents)
}

/** The tail from N on, or null where corrections are still too large (or `anyway`, at the end of the doubles). */
export function tailAt(model: Model, direction: Direction, N: number, anyway = false): Tail | null {
  const exponent = leadingExponent(model, direction)
  if (exponent === null || explodes(model, direction)) return null
  const leading: Component[] = []
  const others: Component[] = []
  for (const one of model.components) {
    const asymptote = asymptoteOf(one, direction)
    const leads = asymptote.kind === 'power' && asymptote.exponent === exponent
    if (leads && !anyway && direction * (N - asymptote.settled) < 0) return null
    ;(leads ? leading : others).push(one)
  }
  const density = leading.reduce((sum, one) => sum + Math.sign(one.omega) * Math.exp(one.logSize(N)), 0)
  const corrections = others.map((one) => correctionOf(one, direction, N, density, exponent))
  if (!anyway && corrections.some((one) => one === null || Math.abs(one.size) > SMALL)) return null
  return assemble(
    N,
    direction,
    exponent,
    density,
    corrections.filter((one) => one !== null && one.size !== 0) as Correction[],
  )
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
  const size = (Math.sign(one.omega) * Math.exp(one.logSize(N))) / density
  if (Math.abs(size) < NEGLIGIBLE) return { size: 0, rate: 1 }
  if (asymptote.kind !== 'power' || direction * (N - asymptote.settled) < 0) return null
  return { size, rate: direction * (asymptote.exponent - exponent) }
}

function assemble(
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
    time: { scale, kappa, corrections },
    conformal: { scale: scale * Math.exp(-N), kappa: kappa + direction, corrections },
    expansion: (D) => {
      const sum = corrections.reduce((total, one) => total + one.size * Math.exp(-one.rate * D), 1)
      return density * Math.exp(-direction * exponent * D) * sum
    },
  }
}

/** ∫ from the beginning of the tail out to D. */
export function elapsedIn(integral: PowerIntegral, D: number): number {
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
export function remainingIn(integral: PowerIntegral, D: number): number {
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
