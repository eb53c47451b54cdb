/**
 * Beyond the last panel: E² is one power of a with small corrections, or one power of ln a, and the integrals are closed forms.
 * With E² = E₁² e^(−2κ₀D) (1 + δ), δ = Σ δ_i e^(−p_i D), D the distance in ln a beyond the panel, 1/E is a sum of exponentials by
 * the binomial series of (1 + δ)^(−½), and each is integrated by I(κ) = (1 − e^(−κD))/κ.
 */

import { asymptoteOf, type Component } from '../components'
import type { Asymptote, Logarithmic, Power } from '../dark-energy/law'
import { logarithmicIn, type Model } from '../model'
import type { Correction, TailIntegral } from './tail-integral'
import type { Direction } from './turning'

export type Clock = 'time' | 'conformal'

export interface Tail {
  /** Where it begins. */
  readonly N: number
  readonly time: TailIntegral
  readonly conformal: TailIntegral
  /** Of E². */
  readonly corrections: readonly Correction[]
  /** Relative error of both integrands: what the series leaves out. */
  readonly left: number
  /** E² beyond, at distance D. */
  expansion(D: number): number
}

/** (1 + δ)^(−½) = Σ c_k δ^k. */
const BINOMIAL = [1, -1 / 2, 3 / 8, -5 / 16, 35 / 128, -63 / 256, 231 / 1024]
const ORDERS = BINOMIAL.length - 2
/** Sum of the sizes of all corrections from which the series leaves out less than 2e-17. */
const SMALL = 2e-3
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

/** Whether the integral to the far end is finite, from what wins there, where nothing outgrows every power. */
export function converges(model: Model, direction: Direction, clock: Clock): boolean {
  const exponent = leadingExponent(model, direction)
  /* v8 ignore next -- a logarithmic law has a tail wherever its density is positive, and then nobody asks */
  const slow = exponent === 0 ? logarithmicIn(model, direction) : null
  /* v8 ignore next -- as above */
  if (slow && clock === 'time') return slow.overTwo * slow.rate * direction > 0
  return exponent !== null && -direction * exponent + (clock === 'conformal' ? 2 * direction : 0) > 0
}

/** The tail from N on, or null where corrections are still too large; `anyway`, at the end of the doubles, leaves them out. */
export const tailAt = (model: Model, direction: Direction, N: number, anyway = false): Tail | null =>
  tailsOf(model, direction)(N, anyway)

/** The tail at many places: what leads in this direction is asked once. */
export function tailsOf(model: Model, direction: Direction): (N: number, anyway?: boolean) => Tail | null {
  const exponent = leadingExponent(model, direction)
  if (exponent === null || explodes(model, direction)) return () => null
  const slow = exponent === 0 ? logarithmicIn(model, direction) : null
  const leading = model.acting.filter((one) => exponentIn(one, direction) === exponent)
  const others = model.acting.filter((one) => !leading.includes(one))
  return (N, anyway = false) => {
    const density = densityOf(leading, direction, N, anyway)
    if (!(density > 0)) return null
    const corrections = correctionsAt(leading, others, direction, N, exponent, density)
    if (slow) return corrections?.length === 0 ? slowTail(N, direction, density, slow) : null
    if (corrections && sumOfSizes(corrections) <= SMALL) return powerTail(N, direction, exponent, density, corrections)
    return anyway ? powerTail(N, direction, exponent, density, []) : null
  }
}

const sumOfSizes = (list: readonly Correction[]): number => list.reduce((sum, one) => sum + Math.abs(one.size), 0)

/** Sum of the pure powers that win; 0 where one of them is not yet known as a power. */
function densityOf(leading: readonly Component[], direction: Direction, N: number, anyway: boolean): number {
  let sum = 0
  for (const one of leading) {
    if (!anyway && !isSettled(asymptoteOf(one, direction), direction, N)) return 0
    sum += powerPart(one, direction, N)
  }
  return sum
}

const isSettled = (asymptote: Asymptote, direction: Direction, N: number): boolean =>
  asymptote.kind !== 'power' || direction * (N - asymptote.settled) >= 0

/** Density at N over what the asymptote adds to its leading power. */
function powerPart(one: Component, direction: Direction, N: number): number {
  const density = one.density(N)
  const asymptote = asymptoteOf(one, direction)
  if (asymptote.kind !== 'power' || !asymptote.corrections) return density
  return (
    density / asymptote.corrections.reduce((sum, { size, rate }) => sum + size * Math.exp(-direction * rate * N), 1)
  )
}

/** δ and p of all components, or null while one that matters does not yet follow its power, or is too large. */
function correctionsAt(
  leading: readonly Component[],
  others: readonly Component[],
  direction: Direction,
  N: number,
  exponent: number,
  density: number,
): readonly Correction[] | null {
  const list: Correction[] = []
  for (const one of others) {
    const size = powerPart(one, direction, N) / density
    if (Math.abs(size) < NEGLIGIBLE) continue
    const asymptote = asymptoteOf(one, direction)
    if (asymptote.kind !== 'power' || !isSettled(asymptote, direction, N) || Math.abs(size) > SMALL) return null
    const rate = direction * (asymptote.exponent - exponent)
    list.push({ size, rate })
    pushCorrections(list, asymptote, size, rate, direction, N)
  }
  for (const one of leading) {
    const asymptote = asymptoteOf(one, direction)
    if (asymptote.kind === 'power' && asymptote.corrections)
      pushCorrections(list, asymptote, powerPart(one, direction, N) / density, 0, direction, N)
  }
  return merged(list)
}

/** Those of the power itself. */
function pushCorrections(
  list: Correction[],
  { corrections = [] }: Power,
  size: number,
  rate: number,
  direction: Direction,
  N: number,
): void {
  for (const more of corrections)
    list.push({ size: size * more.size * Math.exp(-direction * more.rate * N), rate: rate + more.rate })
}

/** Those of one rate added up. */
function merged(list: readonly Correction[]): readonly Correction[] {
  const sums: Correction[] = []
  for (const { size, rate } of list) {
    const at = sums.findIndex((one) => one.rate === rate)
    if (at < 0) sums.push({ size, rate })
    else sums[at] = { size: sums[at].size + size, rate }
  }
  return sums
}

/** (1 + δ)^(−½) − 1 as a sum of exponentials: products of up to five δ_i, each once, with its multinomial coefficient. */
function inverseRoot(corrections: readonly Correction[]): readonly Correction[] {
  const terms: Correction[] = []
  const multiply = (order: number, size: number, rate: number, first: number, repeated: number): void => {
    for (let i = first; i < corrections.length; i++) {
      const times = i === first ? repeated + 1 : 1
      const product = (size * corrections[i].size * order) / times
      if (Math.abs(product) < NEGLIGIBLE) continue
      const sum = rate + corrections[i].rate
      terms.push({ size: BINOMIAL[order] * product, rate: sum })
      if (order < ORDERS) multiply(order + 1, product, sum, i, times)
    }
  }
  multiply(1, 1, 0, 0, 0)
  return terms
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
  const terms = inverseRoot(corrections)
  return {
    N,
    time: { kind: 'power', scale, kappa, terms },
    conformal: { kind: 'power', scale: scale * Math.exp(-N), kappa: kappa + direction, terms },
    corrections,
    left: BINOMIAL[ORDERS + 1] * sumOfSizes(corrections) ** (ORDERS + 1),
    expansion: (D) => {
      const sum = corrections.reduce((total, one) => total + one.size * Math.exp(-one.rate * D), 1)
      return density * Math.exp(-direction * exponent * D) * sum
    },
  }
}

/** Nearest approach in ln a to a static state that is followed; nearer, a is that of the static state to all its digits. */
export const STATIC_NEAREST = 1e-16

/**
 * Next to a static state at N, E = κ d at the distance d in ln a: D counts by how many powers of e nearer it comes still. At the edge of
 * a law, where E² has no such form, it is at rest by then, and D is the time.
 */
export function staticTail({ derivatives }: Model, N: number): Tail {
  const steep = Math.sqrt(derivatives(N).second / 2)
  const kappa = steep > 0 && Number.isFinite(steep) ? steep : null
  const integral = (scale: number): TailIntegral => ({ kind: 'power', scale, kappa: 0, terms: [] })
  return {
    N,
    time: integral(1 / (kappa ?? 1)),
    conformal: integral(Math.exp(-N) / (kappa ?? 1)),
    corrections: [],
    left: 0,
    expansion: (D) => ((kappa ?? 0) * STATIC_NEAREST * Math.exp(-D)) ** 2,
  }
}

function slowTail(N: number, direction: Direction, density: number, law: Logarithmic): Tail {
  const scale = 1 / Math.sqrt(density)
  const rate = (direction * law.rate) / (1 + law.rate * N)
  const excess = law.overTwo / 2
  return {
    N,
    time: { kind: 'slow', rate, excess, scale, decay: 0 },
    conformal: { kind: 'slow', rate, excess, scale: scale * Math.exp(-N), decay: direction },
    corrections: [],
    left: 0,
    expansion: (D) => density * Math.exp(law.power * Math.log1p(rate * D)),
  }
}
