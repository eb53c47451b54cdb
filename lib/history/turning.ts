/**
 * Turning points of a ↦ E²(a), found by steps that cannot pass over one.
 *
 * Split E² = P − M into its positive and its negative terms; h = ln P − ln M. No root lies nearer than h/D, D the fastest that h can
 * fall on the way (balance.ts): the step is its own certificate. For constant exponents and one negative term this is Newton's step
 * on a convex function. Where D ≤ 0 on all that is left, there is no root. Every h and D carries its rounding; where h comes near to
 * it, tangency.ts goes on with twice the digits.
 */

import type { Term } from '../components'
import type { Edge } from '../dark-energy/law'
import { logarithmicIn, type Model, slopeAt } from '../model'
import { Balance, type Direction } from './balance'
import { FARTHEST, type Narrow, type Search } from './search'
import { type Encounter, meet } from './tangency'

export type { Direction } from './balance'
export { FARTHEST, type Narrow, type Search } from './search'

/** h from which on the steps are left to twice the digits: E² is then no longer known to more than five digits in doubles. */
const NEAR = 1e-10
/** Steps of one search; what needs more is not proven. Twelve thousand random scenarios took no more than 66. */
const MOST_STEPS = 1000
/** Of the stretches on which exponents are bounded, in ln a: tuned for few steps. */
const [FIRST, GROWTH] = [0.7, 1.2]
/** Distance to the edge of a law, relative to its ln a, that is as good as none. */
const EDGE_NEAREST = 256 * Number.EPSILON

const OUT_OF_STEPS = 'The search for turning points farther out is over its budget of steps.'
const AT_THE_EDGE = 'Rounding could change whether E² vanishes where dark energy ends.'
const NO_NUMBERS = 'The densities farther out leave the range of floating-point numbers.'

/** First turning point outwards from today in the given direction. */
export function searchTurning(model: Model, direction: Direction): Search {
  const terms = termsOf(model, direction, true)
  const law = logarithmicIn(model, direction)
  const edge = law?.edge ?? null
  if (law === null || edge === null) return stepsFrom(model, terms, direction, 0, Number.POSITIVE_INFINITY)
  const before = stepsFrom(model, terms, direction, 0, Math.abs(edge.N))
  if (before.kind !== 'none' || before.farRoot !== null) return before
  // Such a law is for positive densities alone: where its density diverges, E² does.
  const there = law.power < 0 ? singular(edge.N) : atEdge(model, edge, direction)
  return { ...there, narrows: [...before.narrows, ...there.narrows], doubt: there.doubt ?? before.doubt }
}

const nothing = (narrows: readonly Narrow[], doubt: string | null): Search => ({
  kind: 'none',
  farRoot: null,
  narrows,
  doubt,
})
const singular = (N: number): Search => ({ kind: 'singular', N, narrows: [], doubt: null })

/** Added one by one: lists made of lists would take a tenth of the whole search. */
function termsOf(model: Model, direction: Direction, withDark: boolean): readonly Term[] {
  const terms: Term[] = []
  for (const one of model.acting) {
    if (!withDark && one.key === 'dark') continue
    const parts = one.terms?.(direction)
    if (parts) terms.push(...parts)
    else terms.push(one)
  }
  return terms
}

/** Where dark energy is used up: what the other components make of it there and beyond. */
function atEdge(model: Model, edge: Edge, direction: Direction): Search {
  const terms = termsOf(model, direction, false)
  if (terms.length === 0) {
    return edge.kind === 'singular'
      ? singular(edge.N)
      : { kind: 'double', N: edge.N, exact: false, narrows: [], doubt: null }
  }
  const balance = new Balance(terms, direction)
  balance.weigh(edge.N)
  // Just before the edge E² is positive: what is negative there vanished on the last stretch.
  if (balance.h < -balance.error) return rootAt(model, edge.N, [], null)
  /* v8 ignore if -- only numbers tuned to the last digits cancel just at the edge */
  if (!(balance.h > balance.error)) return rootAt(model, edge.N, [], AT_THE_EDGE)
  if (edge.kind === 'singular') return singular(edge.N)
  return stepsFrom(model, terms, direction, edge.N, Number.POSITIVE_INFINITY)
}

/** A root, if a and E² about it are doubles. */
function rootAt(model: Model, N: number, narrows: readonly Narrow[], doubt: string | null): Search {
  // The slope too: a density that changes its sign has no size here.
  const size = model.magnitude(N) + Math.abs(slopeAt(model, N))
  const near = Math.abs(N) <= FARTHEST && size > 1e-290 && size < 1e290
  return near ? { kind: 'root', N, narrows, doubt } : { kind: 'none', farRoot: N, narrows, doubt }
}

/** Certified steps outwards, halving the way to a limit where exponents diverge. */
function stepsFrom(model: Model, terms: readonly Term[], direction: Direction, start: number, limit: number): Search {
  const balance = new Balance(terms, direction)
  const narrows: Narrow[] = []
  if (!balance.signed) return nothing(narrows, null)
  const nearest = Number.isFinite(limit) ? 4 * Number.EPSILON * Math.max(1, limit) : 0
  let [N, length] = [start, FIRST]
  for (let step = 0; step < MOST_STEPS; step++) {
    balance.weigh(N)
    const h = balance.h - balance.error
    /* v8 ignore if -- both sums beyond the doubles: a guard, which no scenario has been seen to need */
    if (Number.isNaN(h)) return nothing(narrows, NO_NUMBERS)
    const left = limit - Math.abs(N)
    const clear = h > NEAR && h > 4 * balance.error
    const advance = clear ? certifiedStep(balance, h, left, length) : 0
    if (advance >= left || left <= nearest) return nothing(narrows, null)
    if (advance > Number.EPSILON * Math.abs(N)) {
      N += direction * advance
      length = GROWTH * advance
      continue
    }
    // So near to an edge that N tells no difference any more: the edge decides.
    if (Number.isFinite(left) && left <= EDGE_NEAREST * limit) return nothing(narrows, null)
    const met: Encounter = meet(model, balance, N, direction, left, clear)
    if (met.kind === 'root') {
      const found = rootAt(model, met.N, narrows, met.doubt)
      return met.slope === null || found.kind !== 'root' ? found : { ...found, slope: met.slope }
    }
    if (met.kind === 'double') return { kind: 'double', N: met.N, exact: met.exact, narrows, doubt: met.doubt }
    /* v8 ignore else -- as in narrowAt */
    if (met.narrow) narrows.push(met.narrow)
    ;[N, length] = [met.N, 2 * Math.abs(met.N - N)]
  }
  return nothing(narrows, OUT_OF_STEPS)
}

/** How far on there is certainly no root, by a bound that holds for all that is left or for a stretch about `length`. */
function certifiedStep(balance: Balance, h: number, left: number, length: number): number {
  const whole = balance.reach(h, left)
  if (balance.steady || whole >= left) return whole
  const stretch = Math.min(length, left / 2)
  return Math.min(balance.reach(h, stretch), stretch)
}
