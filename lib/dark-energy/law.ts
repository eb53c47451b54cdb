/**
 * A dark-energy law: density and equation of state as functions of N = ln a, with N = 0 today.
 * n = 3(1 + w) = −d ln f/dN is the local exponent: f ∝ a^(−n).
 */
import type { Twofold } from '../numerics/twofold'
import type { Parameter, ParameterValues } from '../parameter'
import type { Potential } from './potential'

/** What a law tends to as N → −∞ (past) or N → +∞ (future). */
export type Asymptote =
  | Power
  /** Faster to zero than every power of a. */
  | { readonly kind: 'vanishing' }
  /** Faster to infinity than every power of a. */
  | { readonly kind: 'exploding' }
  | Logarithmic

/**
 * f → coefficient · e^(−exponent·N), times 1 + Σ size e^(∓rate·N), − for the future and + for the past, where there are corrections;
 * from `settled` on (outwards) the relative difference is below 1e-17.
 */
export interface Power {
  readonly kind: 'power'
  readonly exponent: number
  readonly logCoefficient: number
  readonly settled: number
  readonly corrections?: readonly { readonly size: number; readonly rate: number }[]
}

/** f = (1 + rate N)^power exactly: it varies like a power of ln a, more slowly than every power of a. */
export interface Logarithmic {
  readonly kind: 'logarithmic'
  readonly rate: number
  readonly power: number
  /** power − 2, free of cancellation: above 0, all of time is finite where f grows. */
  readonly overTwo: number
  /** Where 1 + rate N reaches zero in this direction, and what that means; null where it never does. */
  readonly edge: Edge | null
}

export interface Edge {
  readonly N: number
  /** The density or the pressure diverges and the law ends; or f = 0 from there on. */
  readonly kind: 'singular' | 'empty'
}

/** A part of f that keeps its sign, for arguments about roots. */
export interface Part {
  /** With the sign of the part. */
  readonly factor: number
  /** ln of the part over its factor. */
  logDensity(N: number): number
  /** As `roughness` of a law. */
  roughness?(N: number): number
  exponentRange(from: number, to: number): readonly [number, number]
}

export interface Law {
  /** f(N) = ρ/ρ_today; f(0) = 1. */
  density(N: number): number
  /** f at many places with a⁻¹ given, where that is quicker than one by one. */
  densitiesInto?(out: Float64Array, places: Float64Array, inverseScales: Float64Array, from: number, to: number): void
  /** ln |f(N)|, −∞ where f = 0. */
  logDensity(N: number): number
  /**
   * Bound of the rounding error of logDensity in units of eps, beyond four times its own size: from the sizes of what it is the sum
   * of, four each. Absent where nothing cancels.
   */
  roughness?(N: number): number
  /** ln f(N) to twice the digits, for N inside the law; absent where only doubles are known. */
  preciseLogDensity?(N: number): Twofold
  /** f(N + d) − f(N), without cancellation for small d. */
  change(N: number, d: number): number
  /** f(N + d) − f(N) − d f′(N), without cancellation for small d. */
  bend(N: number, d: number): number
  /** f, f′ and f″ by N. */
  derivativesInto(out: Float64Array, N: number): void
  /** Present where n is the same at all times. */
  readonly exponent?: number
  /** w(N). */
  w(N: number): number
  /** Bounds of n = 3(1 + w) over from ≤ N ≤ to; either end may be infinite. Every value lies inside. */
  exponentRange(from: number, to: number): readonly [number, number]
  /** f as a sum of parts, where f itself changes sign outwards; absent where it never does. */
  readonly parts?: (direction: 1 | -1) => readonly Part[] | null
  readonly past: Asymptote
  readonly future: Asymptote
  /** Values of N where a derivative of the law jumps; empty for an analytic law. */
  readonly breaks: readonly number[]
  /** Where the law is the result of steps: what they leave in E² at least, relative to it and in units of eps, so that no panel resolves more. */
  readonly noise?: (N: number) => number
  /** The error of such a law, relative to f and in units of eps; absent where that is rounding. */
  readonly stray?: (N: number) => number
}

/** The error that a law has beside rounding, relative to f and in units of eps. */
export const strayOf = (law: Law, N: number): number => law.stray?.(N) ?? 0

/** A family of laws: one file, one line in the list (index.ts). Form, URL keys, method page and tests follow from it. */
export interface Family {
  /** The word after `eos:`. */
  readonly key: string
  /** As a menu shows it. */
  readonly label: string
  /** w(a) or p(ρ) in the markup of labels. */
  readonly formula: string
  /** What dark energy does by it, where `follows` and the formula make no sentence. */
  readonly clause?: string
  /** One sentence. */
  readonly meaning: string
  /** Publication of the law. */
  readonly source: string
  /** Where the law was fitted or meant to hold; one sentence, shown beside an extrapolation. */
  readonly caution: string
  readonly parameters: readonly Parameter[]
  /** Conditions that tie parameters together: the key at fault and what is allowed, or null. */
  readonly conflict?: (values: ParameterValues) => { readonly key: string; readonly allowed: string } | null
  /** The law is defined for a positive density only. */
  readonly positive?: true
  /** Of a scalar field, `law` knows the bounds of n alone. */
  readonly law: (values: ParameterValues) => Law
  /** Present where dark energy is a trajectory: the history follows the field on this potential instead of a law. */
  readonly potential?: (values: ParameterValues) => Potential
}

/** A number among a family's values: the reader has checked kind and limits before. */
export function numberOf(values: ParameterValues, key: string): number {
  const value = values[key]
  if (typeof value !== 'number') throw new TypeError(`the parameter ${key} is not a number`)
  return value
}

/** A list among a family's values. */
export function listOf(values: ParameterValues, key: string): readonly number[] {
  const value = values[key]
  if (!Array.isArray(value)) throw new TypeError(`the parameter ${key} is not a list`)
  return value
}
