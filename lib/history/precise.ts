/** E² to twice the digits of a double, with an error bound: for places where its terms cancel to less than a double can hold. */
import type { Component } from '../components'
import type { Model } from '../model'
import { exponential, minus, plus, TWOFOLD_EPSILON, type Twofold, times } from '../numerics/twofold'

export interface Precise {
  readonly value: Twofold
  /** Absolute, of rounding alone: the densities of today count as exact. */
  readonly error: number
}

/** Farther out powers of a leave what twofold numbers hold, and nothing is as close as that there. */
const FARTHEST = 150
const UNKNOWN: Precise = { value: [Number.NaN, 0], error: Number.POSITIVE_INFINITY }
const ROUNDINGS = 256

/** E² at N by all digits that are known of its terms. */
export function preciseExpansion(model: Model, N: number): Precise {
  if (!(Math.abs(N) < FARTHEST)) return UNKNOWN
  const { photons, masslessNeutrinos, coldMatter, coldRemainder, curvature, closes, closingRemainder } = model.budget
  const x = exponential([-N, 0])
  const square = times(x, x)
  const parts = [
    times(plus([photons, 0], [masslessNeutrinos, 0]), times(square, square)),
    times([coldMatter, coldRemainder], times(square, x)),
    times([curvature, closes === 'curvature' ? closingRemainder : 0], square),
  ]
  let error = 0
  for (const part of parts) error += Math.abs(part[0]) * TWOFOLD_EPSILON * (ROUNDINGS + 8 * Math.abs(N))
  let value = plus(plus(parts[0], parts[1]), parts[2])
  for (const { part, error: own } of [darkEnergy(model, N, x), ...neutrinos(model, N)]) {
    value = plus(value, part)
    error += own
  }
  return Number.isFinite(value[0]) ? { value, error } : UNKNOWN
}

interface Part {
  readonly part: Twofold
  readonly error: number
}

function darkEnergy({ budget, law, components, acting }: Model, N: number, x: Twofold): Part {
  const { dark, closes, closingRemainder } = budget
  const own = components.find((one) => one.key === 'dark')
  if (!own) return { part: [0, 0], error: 0 }
  const omega: Twofold = [dark, closes === 'dark' ? closingRemainder : 0]
  // Counted as radiation, matter or curvature.
  if (law.exponent !== undefined && !acting.includes(own))
    return { part: times(omega, power(x, law.exponent)), error: Math.abs(dark) * TWOFOLD_EPSILON * ROUNDINGS }
  const log = law.preciseLogDensity?.(N)
  if (!log) return inDoubles(own, N)
  const part = times(omega, exponential(log))
  const sizes = Math.abs(log[0]) + (law.roughness?.(N) ?? 0)
  return { part, error: Math.abs(part[0]) * TWOFOLD_EPSILON * (ROUNDINGS + 8 * sizes) }
}

/** x^n for a small whole n. */
function power(x: Twofold, n: number): Twofold {
  let result: Twofold = [1, 0]
  for (let i = 0; i < n; i++) result = times(result, x)
  return result
}

const neutrinos = ({ acting }: Model, N: number): readonly Part[] =>
  acting.filter((one) => one.key === 'neutrino').map((one) => inDoubles(one, N))

function inDoubles(one: Component, N: number): Part {
  const density = one.density(N)
  const rounding = one.rounding(N, one.logSize(N)) + 8
  return { part: [density, 0], error: Math.abs(density) * Number.EPSILON * rounding }
}

/** Distance in ln a over which the slope is taken: what its difference loses, and what the bend rounds, are equally small. */
const REACH = 1e-8

/** dE²/dN at N, right to some 1e-22 where the terms are of order one: from a difference, less what E² bends meanwhile. */
export function preciseSlope(model: Model, N: number): number {
  const other = N + REACH
  const d = other - N
  const change = minus(preciseExpansion(model, other).value, preciseExpansion(model, N).value)
  return (change[0] - model.bendFrom(N, d)) / d
}
