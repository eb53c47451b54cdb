/** Moments when one thing overtakes another: sign changes of a function of ln a along the expansion that holds today. */

import type { Component } from '../components'
import type { Arm } from '../history/arm'
import type { History } from '../history/history'
import { leadingExponent } from '../history/tail'
import type { Model } from '../model'
import { brent } from '../numerics/roots'

/** A sign change at N = ln a; `rising` when the function goes from negative to positive as a grows. */
export interface Crossing {
  readonly N: number
  readonly rising: boolean
}

/** Looks per panel of the integrals, whose widths follow the bends of E². */
const LOOKS = 3
/** How far beyond the last panel, in ln a, to look where what rules there neither accelerates nor decelerates. */
const BEYOND = 60
/** Exponent of E² at which ä = 0. */
const COASTING = 2
/** Farthest ln a at which densities are still doubles. */
const FARTHEST = 700

/** A step in ln a by which a function that passes through zero has left it. */
const BEFORE = 1e-6

/** A function of ln a along the expansion, with bounds of its slope, so that no sign change can hide. */
export interface Comparison {
  value(model: Model, N: number): number
  slopeRange(model: Model, from: number, to: number): readonly [number, number]
}

/** All sign changes of a comparison, in order of a. */
export function overtakings(history: History, comparison: Comparison): readonly Crossing[] {
  const [low, high] = [reachOf(history.past), reachOf(history.future)]
  return [
    ...changesBetween(comparison, history.past.model, low, 0),
    ...changesBetween(comparison, history.future.model, 0, high),
  ]
}

const reachOf = ({ direction, end }: Arm): number =>
  direction * (end.kind === 'none' ? FARTHEST : Math.min(FARTHEST, Math.abs(end.N)))

/** Intervals where the slope keeps its sign hold one change at most; where |value| outweighs the slope there is none; others are halved. */
function changesBetween(comparison: Comparison, model: Model, from: number, to: number): Crossing[] {
  const value = (N: number) => comparison.value(model, N)
  const [low, high] = comparison.slopeRange(model, from, to)
  const middle = (from + to) / 2
  if (low < 0 && high > 0 && to - from > 1e-6) {
    if (Math.abs(value(middle)) > (Math.max(-low, high) * (to - from)) / 2) return []
    return [...changesBetween(comparison, model, from, middle), ...changesBetween(comparison, model, middle, to)]
  }
  const [left, right] = [value(from), value(to)]
  // Exactly zero where an interval begins, as today with equal densities: what came before decides.
  const before = left === 0 ? value(from - BEFORE) : left
  if (right === 0 || before > 0 === right > 0) return []
  return [{ N: left === 0 ? from : brent(value, from, to), rising: before < right }]
}

/**
 * Changes of the sign of ä, in order of a, from looks at every third of a panel: a pair nearer together can be missed.
 */
export function accelerationChanges(history: History): readonly Crossing[] {
  const looks = [...looksAlong(history.past).reverse(), { arm: history.past, N: 0 }, ...looksAlong(history.future)]
  const found: Crossing[] = []
  let [before, was] = [0, 0]
  let zero: number | null = null
  for (const { arm, N } of looks) {
    const is = acceleration(arm.model, N)
    if (is === 0) zero = N
    if (is === 0 || !Number.isFinite(is)) continue
    if (was !== 0 && was > 0 !== is > 0) {
      found.push({ N: zero ?? brent((x) => acceleration(arm.model, x), before, N), rising: is > 0 })
    }
    ;[before, was, zero] = [N, is, null]
  }
  return found
}

/** Where to look, outwards from today. */
function looksAlong(arm: Arm): { arm: Arm; N: number }[] {
  const looks: { arm: Arm; N: number }[] = []
  for (const { zone, from, to } of arm.panels) {
    for (let k = 1; k <= LOOKS; k++)
      looks.push({ arm, N: arm.direction * zone.distanceAt(from + ((to - from) * k) / LOOKS) })
  }
  const last = arm.edges[arm.edges.length - 1]
  const undecided = arm.tail !== null && leadingExponent(arm.model, arm.direction) === COASTING
  if (undecided) for (let k = 1; k <= BEYOND; k++) looks.push({ arm, N: arm.direction * (last + k) })
  return looks
}

/** ä/a in H₀². */
const acceleration = (model: Model, N: number): number => model.derivatives(N).acceleration

const MATTER: readonly Component['key'][] = ['matter']
const RADIATION: readonly Component['key'][] = ['radiation', 'neutrino']
const DARK: readonly Component['key'][] = ['dark']

/** ln of the summed sizes of some components. */
function logOf(model: Model, keys: readonly Component['key'][], N: number): number {
  let [largest, sum] = [Number.NEGATIVE_INFINITY, 0]
  for (const one of model.components) {
    if (!keys.includes(one.key)) continue
    const log = one.terms && one.density(N) < 0 ? Number.NEGATIVE_INFINITY : one.logSize(N)
    sum = log > largest ? sum * Math.exp(largest - log) + 1 : sum + Math.exp(log - largest)
    largest = Math.max(largest, log)
  }
  return largest + Math.log(sum)
}

/** Bounds of the exponents of some components over an interval. */
function exponentsOf(
  model: Model,
  keys: readonly Component['key'][],
  from: number,
  to: number,
): readonly [number, number] {
  const ranges = model.components.filter((one) => keys.includes(one.key)).map((one) => one.exponentRange(from, to))
  return [Math.min(...ranges.map(([low]) => low)), Math.max(...ranges.map(([, high]) => high))]
}

const ratio = (over: readonly Component['key'][], under: readonly Component['key'][]): Comparison => ({
  value: (model, N) => logOf(model, over, N) - logOf(model, under, N),
  slopeRange: (model, from, to) => {
    const [above, below] = [exponentsOf(model, over, from, to), exponentsOf(model, under, from, to)]
    return [below[0] - above[1], below[1] - above[0]]
  },
})

/** ln of cold matter over photons and all neutrinos; both must be there. */
export const matterOverRadiation = ratio(MATTER, RADIATION)

/** ln of dark energy over cold matter; both must be there. */
export const darkOverMatter = ratio(DARK, MATTER)

/** Of several crossings the last up to now, else the first ahead; null when there is none. */
export const nearestToNow = (list: readonly Crossing[]): Crossing | null =>
  list.findLast((one) => one.N <= 0) ?? list.find((one) => one.N > 0) ?? null
