/** Moments when one thing overtakes another: sign changes of a function of ln a along the expansion that holds today. */

import type { Component } from '../components'
import { strayOf } from '../dark-energy/law'
import type { Arm } from '../history/arm'
import type { History } from '../history/history'
import type { Panel } from '../history/panels'
import { leadingExponent } from '../history/tail'
import type { Model } from '../model'
import { coefficientsInto, derivativeInto, NODE_COUNT, NODES } from '../numerics/chebyshev'
import { brent } from '../numerics/roots'
import { type Bracket, signChanges } from '../numerics/sign-changes'

/** A sign change at N = ln a; `rising` when the function goes from negative to positive as a grows. */
export interface Crossing {
  readonly N: number
  readonly rising: boolean
  /** Bound of the error of N: the noise of what is compared over its slope. */
  readonly blur: number
}

/** How far beyond the last panel, in ln a, to look where what rules there neither accelerates nor decelerates. */
const BEYOND = 60
/** Farthest ln a at which densities are still doubles. */
const FARTHEST = 700

/** A step in ln a by which a function that passes through zero has left it. */
const BEFORE = 1e-6

/** A function of ln a along the expansion, with bounds of its slope, so that no sign change can hide. */
interface Compared {
  value(N: number): number
  slopeRange(from: number, to: number): readonly [number, number]
  /** Bound of the rounding error of the value. */
  rounding(N: number): number
}

/** What is compared, in any model. */
export type Comparison = (model: Model) => Compared

/** All sign changes of a comparison, in order of a. */
export function overtakings({ past, future }: History, comparison: Comparison): readonly Crossing[] {
  const found: Crossing[] = []
  changesBetween(found, comparison(past.model), reachOf(past), 0)
  changesBetween(found, comparison(future.model), 0, reachOf(future))
  return found
}

const reachOf = ({ direction, end }: Arm): number =>
  direction * (end.kind === 'none' ? FARTHEST : Math.min(FARTHEST, Math.abs(end.N)))

/** Intervals where the slope keeps its sign hold one change at most; where |value| outweighs the slope there is none; others are halved. */
function changesBetween(found: Crossing[], compared: Compared, from: number, to: number): void {
  const [low, high] = compared.slopeRange(from, to)
  const middle = (from + to) / 2
  if (low < 0 && high > 0 && to - from > 1e-6) {
    if (Math.abs(compared.value(middle)) > (Math.max(-low, high) * (to - from)) / 2) return
    changesBetween(found, compared, from, middle)
    changesBetween(found, compared, middle, to)
    return
  }
  const [left, right] = [compared.value(from), compared.value(to)]
  // Exactly zero where an interval begins, as today with equal densities: what came before decides.
  const before = left === 0 ? compared.value(from - BEFORE) : left
  if (right === 0 || before > 0 === right > 0) return
  const N = left === 0 ? from : brent(compared.value, from, to)
  found.push({ N, rising: before < right, blur: blurOf(compared.rounding(N), (at) => slopeAt(compared, at), N) })
}

function slopeAt(compared: Compared, N: number): number {
  const [least, most] = compared.slopeRange(N, N)
  return (least + most) / 2
}

/** Step in ln a for the bend of a function. */
const BEND = 1e-3

/**
 * How far a function whose values err by e may shift its root, where it goes like s d + c d²/2: by 2e/(s + √(s² − 2ce)) at most; and
 * where that is no number, next to a double root, by (s + √(s² + 2ce))/c.
 */
function blurOf(e: number, slope: (N: number) => number, N: number): number {
  const s = Math.abs(slope(N))
  const c = Math.abs(slope(N + BEND) - slope(N - BEND)) / (2 * BEND)
  const blur = s * s > 2 * c * e ? (2 * e) / (s + Math.sqrt(s * s - 2 * c * e)) : (s + Math.sqrt(s * s + 2 * c * e)) / c
  return Math.min(1, blur)
}

/** Changes of the sign of ä, in order of a: every one that the panels can tell, and looks at the tails where they do not decide. */
export function accelerationChanges({ past, future }: History): readonly Crossing[] {
  const [back, ahead] = [changesAlong(past), changesAlong(future)]
  const today = acceleration(past.model, 0) > 0
  // At today's break of a law that is held the two may differ.
  const turns = today !== acceleration(future.model, 0) > 0
  const now = turns
    ? /* v8 ignore next -- w is the same on both sides, so only rounding can part them */ [
        { N: 0, rising: !today, blur: 0 },
      ]
    : []
  return [...back.reverse(), ...now, ...ahead]
}

/** In the order outwards from today. */
function changesAlong(arm: Arm): Crossing[] {
  const found: Crossing[] = []
  for (const panel of arm.panels) {
    for (const { from, to } of changesOver(arm, panel)) {
      const at = (x: number) =>
        arm.direction * panel.zone.distanceAt(panel.from + ((x + 1) / 2) * (panel.to - panel.from))
      add(found, arm, at(from), at(to))
    }
  }
  if (!isDecided(arm)) {
    const last = arm.edges[arm.edges.length - 1]
    for (let k = 1; k <= BEYOND; k++) add(found, arm, arm.direction * (last + k - 1), arm.direction * (last + k))
  }
  return found
}

/** The change between two places, outwards, if the sums of densities see it too; on an edge of panels it is seen once. */
function add(found: Crossing[], { model, direction }: Arm, inner: number, outer: number): void {
  const [near, far] = [acceleration(model, inner), acceleration(model, outer)]
  if (!Number.isFinite(near) || !Number.isFinite(far) || near > 0 === far > 0) return
  const N = brent((x) => acceleration(model, x), inner, outer)
  const rising = direction > 0 ? far > near : near > far
  const slope = (at: number) => {
    const { first, second } = model.derivatives(at)
    return first + second / 2
  }
  found.push({ N, rising, blur: blurOf(accelerationError(model, N), slope, N) })
}

/** Of the sum of its terms Ω f (1 − n/2). */
function accelerationError(model: Model, N: number): number {
  let sum = 0
  for (const one of model.acting) {
    const [low, high] = one.exponentRange(N, N)
    const n = Math.max(Math.abs(low), Math.abs(high))
    const log = one.logSize(N)
    // The error of a law that is followed counts six times in its slope.
    const relative = (1 + n / 2) * (4 + one.rounding(N, log)) + (one.key === 'dark' ? 4 * strayOf(model.law, N) : 0)
    if (log > -700) sum += relative * Math.exp(log)
  }
  return Number.EPSILON * sum
}

const [samples, coefficients] = [new Float64Array(NODE_COUNT), new Float64Array(NODE_COUNT)]
/** As long as the series of a panel. */
const [rate, slope] = [new Float64Array(NODE_COUNT + 1), new Float64Array(NODE_COUNT + 1)]
/** Relative error of the series below: derivatives of a series of 16 terms multiply that of the panels by up to 16². */
const NOISE = 1e-11

/** Where ä changes its sign, from a series of its sign over the panel. */
function changesOver(arm: Arm, { zone, from, to, time }: Panel): readonly Bracket[] {
  const half = (to - from) / 2
  if (!zone.plain) {
    for (let k = 0; k < NODE_COUNT; k++) {
      const N = arm.direction * zone.distanceAt((from + to) / 2 + half * NODES[k])
      samples[k] = acceleration(arm.model, N) / Math.max(1e-300, arm.model.magnitude(N))
    }
    // Where densities leave the doubles the ends of the panel decide.
    if (!samples.every(Number.isFinite)) return [{ from: -1, to: 1 }]
    coefficientsInto(coefficients, samples)
    return signChanges(coefficients, NOISE)
  }
  // With r = dt/dN = 1/E it is 1/E − d(1/E)/dN = r (ä/a)/E².
  derivativeInto(rate, time.series)
  derivativeInto(slope, rate)
  let size = 0
  for (let j = 0; j < rate.length; j++) size += Math.abs(rate[j])
  const noise = NOISE * size
  if (!(noise > 0)) return []
  for (let j = 0; j < rate.length; j++) rate[j] -= (arm.direction * slope[j]) / half
  return signChanges(rate, noise)
}

/** Whether what rules beyond the last panel leaves the sign of ä to nothing else. */
function isDecided({ model, direction, tail }: Arm): boolean {
  const exponent = leadingExponent(model, direction)
  if (tail === null || exponent === null) return true
  const others = tail.corrections.reduce(
    (sum, { size, rate }) => sum + Math.abs(size * (1 - (exponent + direction * rate) / 2)),
    0,
  )
  return others < Math.abs(1 - exponent / 2)
}

/** ä/a in H₀². */
const acceleration = (model: Model, N: number): number => model.derivatives(N).acceleration

const MATTER: readonly Component['key'][] = ['matter']
const RADIATION: readonly Component['key'][] = ['radiation', 'neutrino']
const DARK: readonly Component['key'][] = ['dark']

/** ln of the summed sizes of some components. */
function logOf(components: readonly Component[], N: number): number {
  let largest = Number.NEGATIVE_INFINITY
  let sum = 0
  for (const one of components) {
    const log = one.terms && one.density(N) < 0 ? Number.NEGATIVE_INFINITY : one.logSize(N)
    sum = log > largest ? sum * Math.exp(largest - log) + 1 : sum + Math.exp(log - largest)
    if (!(log <= largest)) largest = log
  }
  return largest + Math.log(sum)
}

/** Bounds of the exponents of some components over an interval. */
function exponentsOf(components: readonly Component[], from: number, to: number): readonly [number, number] {
  let least = Number.POSITIVE_INFINITY
  let most = Number.NEGATIVE_INFINITY
  for (const one of components) {
    const range = one.exponentRange(from, to)
    if (range[0] < least) least = range[0]
    if (range[1] > most) most = range[1]
  }
  return [least, most]
}

const ratio =
  (over: readonly Component['key'][], under: readonly Component['key'][]): Comparison =>
  ({ components, law }) => {
    const above = components.filter(({ key }) => over.includes(key))
    const below = components.filter(({ key }) => under.includes(key))
    const stray = (N: number) => (over === DARK ? strayOf(law, N) : 0)
    return {
      value: (N) => logOf(above, N) - logOf(below, N),
      slopeRange: (from, to) => {
        const upper = exponentsOf(above, from, to)
        const lower = exponentsOf(below, from, to)
        return [lower[0] - upper[1], lower[1] - upper[0]]
      },
      rounding: (N) => Number.EPSILON * (4 + Math.abs(logOf(above, N)) + Math.abs(logOf(below, N)) + stray(N)),
    }
  }

/** ln of cold matter over photons and all neutrinos; both must be there. */
export const matterOverRadiation = ratio(MATTER, RADIATION)

/** ln of dark energy over cold matter; both must be there. */
export const darkOverMatter = ratio(DARK, MATTER)

/** Of several crossings the last up to now, else the first ahead; null when there is none. */
export const nearestToNow = (list: readonly Crossing[]): Crossing | null =>
  list.findLast((one) => one.N <= 0) ?? list.find((one) => one.N > 0) ?? null
