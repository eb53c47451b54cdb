/**
 * A dark-energy law: density and equation of state as functions of N = ln a, with N = 0 today.
 * n = 3(1 + w) = −d ln f/dN is the local exponent: f ∝ a^(−n).
 */
import type { Parameter, ParameterValues } from '../parameter'

/** What a law tends to as N → −∞ (past) or N → +∞ (future). */
export type Asymptote =
  /** f → coefficient · e^(−exponent·N); from `settled` on (outwards) the relative difference is below 1e-17. */
  | { readonly kind: 'power'; readonly exponent: number; readonly logCoefficient: number; readonly settled: number }
  /** Faster to zero than every power of a. */
  | { readonly kind: 'vanishing' }
  /** Faster to infinity than every power of a. */
  | { readonly kind: 'exploding' }

export interface Law {
  /** ln f(N) with f = ρ/ρ_today; f(0) = 1. */
  logDensity(N: number): number
  /** ln f(N + d) − ln f(N), without cancellation for small d. */
  logChange(N: number, d: number): number
  /** w(N). */
  w(N: number): number
  /** dw/dN. */
  wSlope(N: number): number
  /** Bounds of n = 3(1 + w) over from ≤ N ≤ to; either end may be infinite. Every value lies inside. */
  exponentRange(from: number, to: number): readonly [number, number]
  readonly past: Asymptote
  readonly future: Asymptote
  /** Values of N where a derivative of the law jumps; empty for an analytic law. */
  readonly breaks: readonly number[]
}

/** A family of laws: one file, one line in the list (index.ts). Form, URL keys, method page and tests follow from it. */
export interface Family {
  /** The word after `eos:`. */
  readonly key: string
  /** As a menu shows it. */
  readonly label: string
  /** w(a) or p(ρ) in the markup of labels. */
  readonly formula: string
  /** One sentence. */
  readonly meaning: string
  /** Publication of the law. */
  readonly source: string
  /** Where the law was fitted or meant to hold; one sentence, shown beside an extrapolation. */
  readonly caution: string
  readonly parameters: readonly Parameter[]
  /** Conditions that tie parameters together: the key at fault and what is allowed, or null. */
  readonly conflict?: (values: ParameterValues) => { readonly key: string; readonly allowed: string } | null
  readonly law: (values: ParameterValues) => Law
}

/** A number among a family's values: the reader has checked kind and limits before. */
export function numberOf(values: ParameterValues, key: string): number {
  const value = values[key]
  if (typeof value !== 'number') throw new TypeError(`the parameter ${key} is not a number`)
  return value
}
