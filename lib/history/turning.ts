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
  let [N, length] = [start, 1]
  for (let step = 0; step < MOST_STEPS; step++) {
    const h = logSum(plus, N) - logSum(minus, N)
    if (Number.isNaN(h)) return null
    if (h <= NOISE) return settle(model, N, direction)
    const left = limit - Math.abs(N)
    if (left <= nearest) return null
    if (safeStep(plus, minus, N, direction, h, left) >= left) return null
    length = Math.min(length, left / 2)
    const advance = Math.min(safeStep(plus, minus, N, direction, h, length), length)
    if (advance <= Number.EPSILON * Math.abs(N)) return settle(model, N, direction)
    N += direction * advance
    length = 2 * advance
  }
  return settle(model, N, direction)
}

const logSum = (terms: readonly Term[], N: number): number => {
  const logs = terms.map((one) => one.logSize(N))
  const largest = Math.max(...logs)
  if (!Number.isFinite(largest)) return largest
  return largest + Math.log(logs.reduce((sum, one) => sum + Math.exp(one - largest), 0))
}

/** A distance within which h cannot reach zero, given that exponents are bounded on the next `length`. */
function safeStep(
  plus: readonly Term[],
  minus: readonly Term[],
  N: number,
  direction: Direction,
  h: number,
  length: number,
): number {
  const [from, to] = direction > 0 ? [N, N + length] : [N - length, N]
  // Rate at which a term shrinks outwards: n going up, −n going down.
  const shrink = (one: Term, worst: 'fastest' | 'slowest'): number => {
    const [low, high] = one.exponentRange(from, to)
    const [slow, fast] = direction > 0 ? [low, high] : [-high, -low]
    return worst === 'fastest' ? fast : slow
  }
  const total = logSum(plus, N)
  const fall = plus.reduce((sum, one) => {
    const weight = Math.exp(one.logSize(N) - total)
    return weight === 0 ? sum : sum + weight * shrink(one, 'fastest')
  }, 0)
  const rise = Math.max(...minus.map((one) => -shrink(one, 'slowest')))
  const closing = fall + rise
  return closing <= 0 ? Number.POSITIVE_INFINITY : Number.isNaN(closing) ? 0 : h / closing
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
