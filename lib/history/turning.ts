/**
 * Turning points of a ↦ E²(a), found by steps that cannot pass over one.
 *
 * Split E² = P − M into its positive and its negative terms. Going outwards by s, with every exponent n held at its worst value on
 * the step, ln P falls by at most s · ⟨n⟩_P (Jensen: P is a sum of exponentials) and ln M rises by at most s times its largest growth.
 * So no root lies nearer than h/D, h = ln P − ln M, D the sum of the two: the step is its own certificate. For constant exponents
 * and one negative term this is Newton's step on a convex function. Where D ≤ 0 on all that is left, there is no root.
 */

import type { Term } from '../components'
import type { Edge } from '../dark-energy/law'
import { expansionAt, logarithmicIn, type Model } from '../model'

export type Direction = 1 | -1

export type Search =
  /** No turning point; or one at a scale factor outside the doubles, of which nothing but N can be said. */
  | { readonly kind: 'none'; readonly farRoot: number | null }
  /** E² vanishes at N and is negative beyond. */
  | { readonly kind: 'root'; readonly N: number; readonly certain: boolean }
  /** E² and its slope vanish together within rounding: a static state, or a root so near to a double one that doubles cannot tell. */
  | { readonly kind: 'double'; readonly N: number }
  /** The law of dark energy ends at N before E² vanishes: its density or its pressure diverges. */
  | { readonly kind: 'singular'; readonly N: number }

/** h where rounding in the components alone could decide the sign of E². */
const NOISE = 32 * Number.EPSILON
const MOST_STEPS = 20000
/** Newton's steps from where the search came to rest are far shorter than this in ln a. */
const STRAY = 0.1
/** Farthest |ln a| for which a and 1/a are doubles. */
export const FARTHEST = 700

const NONE: Search = { kind: 'none', farRoot: null }

/** The terms of E² by their sign. */
interface Terms {
  readonly plus: readonly Term[]
  readonly minus: readonly Term[]
}

/** First turning point outwards from today in the given direction. */
export function searchTurning(model: Model, direction: Direction): Search {
  const terms = termsOf(model, direction, true)
  const law = logarithmicIn(model, direction)
  const edge = law?.edge ?? null
  if (law === null || edge === null) return stepsFrom(model, terms, direction, 0, Number.POSITIVE_INFINITY) ?? NONE
  const before = stepsFrom(model, terms, direction, 0, Math.abs(edge.N))
  if (before) return before
  return law.power < 0 ? endless(model, edge.N) : atEdge(model, edge, direction)
}

/** The density diverges at N: with it goes E². */
const endless = (model: Model, N: number): Search =>
  model.budget.dark > 0 ? { kind: 'singular', N } : rootAt(model, N, false)

function termsOf(model: Model, direction: Direction, withDark: boolean): Terms {
  const all = model.acting
    .filter((one) => withDark || one.key !== 'dark')
    .flatMap((one): readonly Term[] => one.terms?.(direction) ?? [one])
  return { plus: all.filter((one) => one.omega > 0), minus: all.filter((one) => one.omega < 0) }
}

/** Where dark energy is used up: what the other components make of it there and beyond. */
function atEdge(model: Model, edge: Edge, direction: Direction): Search {
  const terms = termsOf(model, direction, false)
  if (terms.plus.length + terms.minus.length === 0) {
    return edge.kind === 'singular' ? { kind: 'singular', N: edge.N } : { kind: 'double', N: edge.N }
  }
  if (logSum(terms.plus, edge.N) - logSum(terms.minus, edge.N) <= NOISE) {
    const lost = logSum(terms.minus, edge.N) < Math.log(1e-290)
    return lost ? { kind: 'none', farRoot: edge.N } : rootAt(model, edge.N, false)
  }
  if (edge.kind === 'singular') return { kind: 'singular', N: edge.N }
  return stepsFrom(model, terms, direction, edge.N, Number.POSITIVE_INFINITY) ?? NONE
}

/** A root, if a and E² about it are doubles. */
function rootAt(model: Model, N: number, certain: boolean): Search {
  // The slope too: a density that changes its sign has no size here.
  const size = model.magnitude(N) + Math.abs(model.derivatives(N).first)
  const near = Math.abs(N) <= FARTHEST && size > 1e-290 && size < 1e290
  return near ? { kind: 'root', N, certain } : { kind: 'none', farRoot: N }
}

/** Certified steps outwards, halving the way to a limit where exponents diverge; null where no root lies before the limit. */
function stepsFrom(
  model: Model,
  { plus, minus }: Terms,
  direction: Direction,
  start: number,
  limit: number,
): Search | null {
  if (minus.length === 0) return null
  const nearest = Number.isFinite(limit) ? 4 * Number.EPSILON * Math.max(1, limit) : 0
  const steady = [...plus, ...minus].every(isSteady)
  let [N, length] = [start, 1]
  for (let step = 0; step < MOST_STEPS; step++) {
    const total = logSum(plus, N)
    const h = total - logSum(minus, N)
    if (Number.isNaN(h)) return null
    if (h <= NOISE) return settle(model, N, direction)
    const left = limit - Math.abs(N)
    if (left <= nearest) return null
    const whole = h / closingRate(plus, minus, N, direction, total, left)
    if (whole >= left) return null
    length = Math.min(length, left / 2)
    const advance = steady ? whole : Math.min(h / closingRate(plus, minus, N, direction, total, length), length)
    if (advance <= Number.EPSILON * Math.abs(N)) return settle(model, N, direction)
    N += direction * advance
    length = 2 * advance
  }
  return settle(model, N, direction)
}

function logSum(terms: readonly Term[], N: number): number {
  let [largest, sum] = [Number.NEGATIVE_INFINITY, 0]
  for (const one of terms) {
    const log = one.logSize(N)
    if (log === Number.POSITIVE_INFINITY || Number.isNaN(log)) return log
    if (log === Number.NEGATIVE_INFINITY) continue
    sum = log > largest ? sum * Math.exp(largest - log) + 1 : sum + Math.exp(log - largest)
    largest = Math.max(largest, log)
  }
  return largest === Number.NEGATIVE_INFINITY ? largest : largest + Math.log(sum)
}

/** Is the exponent the same at all times, so that a certificate for any step is one for all? */
function isSteady({ exponentRange }: Term): boolean {
  const [low, high] = exponentRange(Number.NEGATIVE_INFINITY, Number.POSITIVE_INFINITY)
  return low === high
}

/**
 * The fastest that h = ln P − ln M can fall outwards, given that exponents are bounded on the next `length`: no root lies within
 * h over this. Zero where none lies on all of it, Infinity where nothing is known.
 */
function closingRate(
  plus: readonly Term[],
  minus: readonly Term[],
  N: number,
  direction: Direction,
  total: number,
  length: number,
): number {
  const [from, to] = direction > 0 ? [N, N + length] : [N - length, N]
  // Rate at which a term shrinks outwards: n going up, −n going down; at its fastest for P, at its slowest for M.
  let fall = 0
  for (const one of plus) {
    const weight = Math.exp(one.logSize(N) - total)
    if (weight === 0) continue
    const [low, high] = one.exponentRange(from, to)
    fall += weight * (direction > 0 ? high : -low)
  }
  let rise = Number.NEGATIVE_INFINITY
  for (const one of minus) {
    const [low, high] = one.exponentRange(from, to)
    rise = Math.max(rise, direction > 0 ? -low : high)
  }
  const closing = fall + rise
  return Number.isNaN(closing) ? Number.POSITIVE_INFINITY : Math.max(0, closing)
}

/** The certified steps have come to rest at N: a simple root, or a double one, is here. */
function settle(model: Model, start: number, direction: Direction): Search {
  const here = rootAt(model, start, true)
  if (here.kind === 'none') return here
  let N = start
  for (let step = 0; step < 8; step++) {
    const { first } = model.derivatives(N)
    const magnitude = model.magnitude(N)
    // A slope that rounding could have made: the root is double as far as doubles can tell.
    if (direction * first > -1e-7 * magnitude) return { kind: 'double', N: atRest(model, N) }
    const change = expansionAt(model, N, Math.exp(-N)) / first
    if (!(Math.abs(change) < STRAY)) break
    N -= change
    if (Math.abs(change) <= 2 * Number.EPSILON * Math.abs(N)) break
  }
  return { kind: 'root', N, certain: true }
}

/** The minimum of E² near N: where its slope vanishes. */
function atRest(model: Model, start: number): number {
  let N = start
  for (let step = 0; step < 8; step++) {
    const { first, second } = model.derivatives(N)
    if (!(Math.abs(first / second) < STRAY)) break
    N -= first / second
  }
  return N
}
