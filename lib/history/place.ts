/** Places on an arm, and the integrals to and from them. */
import { TODAY } from '../model'
import { solveIncreasing } from '../numerics/chebyshev'
import { gaussLegendre } from '../numerics/gauss-legendre'
import { brent, newton } from '../numerics/roots'
import type { Arm } from './arm'
import { within } from './panels'
import type { Clock, Tail } from './tail'
import { elapsedIn, remainingIn } from './tail-integral'
import { FARTHEST } from './turning'

/** A place on an arm: s is the variable of its panel's zone, or the distance into the tail beyond the last panel. */
export interface Place {
  readonly arm: Arm
  readonly N: number
  readonly panel: number
  readonly s: number
}

/** On this part of the first panel an integral from today is taken directly, to keep its relative accuracy. */
export const NEAR_TODAY = 0.15

/** Part of an integral that sums leave out by rounding at most. */
const ROUNDED = 1e-12

/** Does more lie beyond the last panel than rounding, and no tail that knows it? */
function isUnfollowed(arm: Arm, clock: Clock): boolean {
  const { fromToday, total } = arm[clock]
  return arm.tail === null && fromToday[arm.panels.length] < (1 - ROUNDED) * total
}

/** Farthest |ln a| on an arm: a turning point, just this side of a static state, or where its sums end; else Infinity. */
export function farthestOf(arm: Arm): number {
  const { end, edges } = arm
  const last = edges[edges.length - 1]
  if (end.kind === 'double') return last * (1 - Number.EPSILON)
  if (end.kind !== 'none') return Math.abs(end.N)
  return isUnfollowed(arm, 'time') ? last : Number.POSITIVE_INFINITY
}

/** The place at distance m = |ln a| from today, or null beyond the farthest one. */
export function placeAt(arm: Arm, m: number): Place | null {
  if (m > farthestOf(arm)) return null
  const panel = Math.min(indexBelow(arm.edges, m), arm.panels.length)
  const N = arm.direction * m
  if (panel === arm.panels.length) return { arm, N, panel, s: m - arm.edges[panel] }
  return { arm, N, panel, s: arm.panels[panel].zone.variableAt(m) }
}

/** Index of the last entry of an ascending list that is not above the value. */
export function indexBelow(list: readonly number[], value: number): number {
  let [low, high] = [0, list.length]
  while (high - low > 1) {
    const middle = (low + high) >> 1
    if (list[middle] <= value) low = middle
    else high = middle
  }
  return low
}

/** ∫ from today to the place. */
export function fromToday(place: Place, clock: Clock): number {
  const { arm, panel } = place
  const m = Math.abs(place.N)
  if (m < NEAR_TODAY * arm.edges[1]) return nearToday(arm, m, clock)
  const inner = arm[clock].fromToday[panel]
  if (panel === arm.panels.length) return inner + (arm.tail ? elapsedIn(arm.tail[clock], place.s) : 0)
  return inner + within(arm.panels[panel], arm.panels[panel][clock], place.s)
}

/** The same by Gauss's rule on [0, m], where E² is formed from today's exact 1. */
export function nearToday(arm: Arm, m: number, clock: Clock): number {
  if (m === 0) return 0
  return gaussLegendre((s) => nearIntegrand(arm, s, clock), 0, m)
}

function nearIntegrand({ model, direction }: Arm, m: number, clock: Clock): number {
  const N = direction * m
  return (clock === 'time' ? 1 : Math.exp(-N)) / Math.sqrt(model.expansionFrom(TODAY, N))
}

/** ∫ from the place to the end of the arm; Infinity where it diverges. */
export function toEnd(place: Place, clock: Clock): number {
  const { arm, panel } = place
  if (panel === arm.panels.length) {
    if (arm.tail) return remainingIn(arm.tail[clock], place.s)
    return arm[clock].total === Number.POSITIVE_INFINITY
      ? /* v8 ignore next -- where sums diverge without a tail there is no place beyond the panels */ Number.POSITIVE_INFINITY
      : 0
  }
  const stretch = arm.panels[panel][clock]
  return arm[clock].toEnd[panel] + (stretch.total - within(arm.panels[panel], stretch, place.s))
}

/** Where the integral from today has this value; null beyond the end, and where a leaves the range of doubles. */
export function placeElapsed(arm: Arm, clock: Clock, value: number): Place | null {
  const sums = arm[clock]
  if (!(value <= sums.total)) return null
  const holding = indexBelow(sums.fromToday, value)
  const ends = arm.tail === null && !isUnfollowed(arm, clock)
  const panel = ends ? Math.min(holding, arm.panels.length - 1) : holding
  if (panel === arm.panels.length) {
    return placeInTail(arm, clock, (tail, D) => elapsedIn(tail, D) - (value - sums.fromToday[panel]))
  }
  if (panel === 0) {
    const { s, [clock]: reached } = nearOf(arm)
    if (reached > value) return placeNear(arm, clock, value) ?? placeBracketed(arm, clock, value, s)
  }
  return placeInPanel(arm, panel, clock, value - sums.fromToday[panel])
}

interface Near extends Readonly<Record<Clock, number>> {
  readonly s: number
}

const nearPlaces = new WeakMap<Arm, Near>()

/** Just inside the part of the first panel where integrals from today are taken directly, and what they are there. */
function nearOf(arm: Arm): Near {
  const known = nearPlaces.get(arm)
  if (known) return known
  const s = arm.panels[0].zone.variableAt(0.99 * NEAR_TODAY * arm.edges[1])
  const place = placeOf(arm, 0, s)
  const near = { s, time: fromToday(place, 'time'), conformal: fromToday(place, 'conformal') }
  nearPlaces.set(arm, near)
  return near
}

/** Where today's integral has this value; null where Newton's steps, which begin with E = 1, do not lead there. */
function placeNear(arm: Arm, clock: Clock, value: number): Place | null {
  const m = newton((at) => (nearToday(arm, at, clock) - value) / nearIntegrand(arm, at, clock), value)
  // Now may come as −0.
  return m !== null && m >= 0 && m < NEAR_TODAY * arm.edges[1] ? placeAt(arm, Math.abs(m)) : null
}

/** The same between today and s. */
function placeBracketed(arm: Arm, clock: Clock, value: number, s: number): Place {
  const direct = (x: number) => fromToday(placeOf(arm, 0, x), clock) - value
  return placeOf(arm, 0, brent(direct, arm.panels[0].from, s))
}

/** Where the integral to the end has this value, which keeps its relative accuracy near the end; null where there is none. */
export function placeRemaining(arm: Arm, clock: Clock, value: number): Place | null {
  const sums = arm[clock]
  if (!(value >= 0 && value <= sums.total) || !Number.isFinite(sums.total)) return null
  let panel = arm.panels.length - 1
  if (value < sums.toEnd[panel]) return placeInTail(arm, clock, (tail, D) => value - remainingIn(tail, D))
  while (panel > 0 && sums.toEnd[panel - 1] <= value) panel--
  return placeInPanel(arm, panel, clock, arm.panels[panel][clock].total - (value - sums.toEnd[panel]))
}

const placeOf = (arm: Arm, panel: number, s: number): Place => ({
  arm,
  N: arm.direction * arm.panels[panel].zone.distanceAt(s),
  panel,
  s,
})

/** Where the integral from a panel's inner edge has this value. */
function placeInPanel(arm: Arm, panel: number, clock: Clock, value: number): Place {
  const { from, to, [clock]: stretch } = arm.panels[panel]
  const x = solveIncreasing(stretch.series, value)
  return placeOf(arm, panel, from + ((x + 1) / 2) * (to - from))
}

/** Beyond the last panel; next to a static state for ever where the arm leads there. */
function placeInTail(arm: Arm, clock: Clock, along: (tail: Tail[Clock], D: number) => number): Place | null {
  const panel = arm.panels.length
  const still = arm.end.kind === 'double' ? arm.end.N : null
  const farthest = still === null ? FARTHEST - arm.edges[panel] : Number.MAX_VALUE
  if (arm.tail === null) return null
  const integral = arm.tail[clock]
  const f = (D: number) => along(integral, D)
  // By doubling, since far out the terms of a tail leave the doubles and their sum is no number.
  let reach = Math.min(1, farthest)
  while (f(reach) < 0 && reach < farthest) reach = Math.min(2 * reach, farthest)
  if (!(f(reach) >= 0)) return null
  const D = f(0) >= 0 ? 0 : brent(f, 0, reach)
  return { arm, N: still ?? arm.direction * (arm.edges[panel] + D), panel, s: D }
}

/** E² at a place; NaN where it leaves the doubles. */
export function expansionAtPlace({ arm, panel, s, N }: Place): number {
  if (panel < arm.panels.length) return inDoubles(arm, arm.panels[panel].zone.expansion(s))
  return inDoubles(arm, arm.tail ? arm.tail.expansion(s) : arm.model.expansion(N, Math.exp(-N)))
}

/** Below this doubles lose digits, and on an arm without a turning point E² is never nothing. */
export const LEAST_EXPANSION = 2 ** -1022

const inDoubles = ({ end }: Arm, expansion: number): number =>
  end.kind === 'none' && expansion < LEAST_EXPANSION ? Number.NaN : expansion
