/** Moments when one thing overtakes another: sign changes of a function of ln a along the expansion that holds today. */

import type { Arm } from '../history/arm'
import type { History } from '../history/history'
import type { Component, Model } from '../model'
import { brent } from '../numerics/roots'

/** A sign change at N = ln a; `rising` when the function goes from negative to positive as a grows. */
export interface Crossing {
  readonly N: number
  readonly rising: boolean
}

/** Steps per panel of the integrals, whose widths follow the bends of E². */
const STEPS = 8
/** How far beyond the last panel, in ln a, to look. */
const BEYOND = 60

/**
 * All sign changes on the expanding branch, in order of a. Between two looks, an eighth of a panel apart, a pair can be missed.
 */
export function crossings(history: History, f: (model: Model, N: number) => number): readonly Crossing[] {
  const looks = [...looksAlong(history.past).reverse(), { arm: history.past, N: 0 }, ...looksAlong(history.future)]
  const found: Crossing[] = []
  let [before, was] = [0, 0]
  let zero: number | null = null
  for (const { arm, N } of looks) {
    const is = f(arm.model, N)
    if (is === 0) zero = N
    if (is === 0 || !Number.isFinite(is)) continue
    if (was !== 0 && was > 0 !== is > 0) {
      found.push({ N: zero ?? brent((x) => f(arm.model, x), before, N), rising: is > 0 })
    }
    ;[before, was, zero] = [N, is, null]
  }
  return found
}

/** Where to look, outwards from today. */
function looksAlong(arm: Arm): { arm: Arm; N: number }[] {
  const distances = arm.panels.flatMap(({ zone, from, to }) =>
    Array.from({ length: STEPS }, (_, k) => zone.distanceAt(from + ((to - from) * (k + 1)) / STEPS)),
  )
  const last = arm.edges[arm.edges.length - 1]
  const beyond = arm.tail ? Array.from({ length: BEYOND }, (_, k) => last + k + 1) : []
  return [...distances, ...beyond].map((m) => ({ arm, N: arm.direction * m }))
}

/** ä/a in H₀², from the components with their own exponents: Σ Ω_i g_i (1 − n_i/2). */
export const acceleration = (model: Model, N: number): number => {
  const { value, first } = model.derivatives(N)
  return value + 0.5 * first
}

const logOf = (model: Model, keys: readonly Component['key'][], N: number): number =>
  Math.log(
    model.components.filter((one) => keys.includes(one.key)).reduce((sum, one) => sum + Math.exp(one.logSize(N)), 0),
  )

/** ln of cold matter over photons and all neutrinos. */
export const matterOverRadiation = (model: Model, N: number): number =>
  logOf(model, ['matter'], N) - logOf(model, ['radiation', 'neutrino'], N)

/** ln of dark energy over cold matter. */
export const darkOverMatter = (model: Model, N: number): number =>
  model.components.reduce(
    (sum, one) => sum + (one.key === 'dark' ? one.logSize(N) : one.key === 'matter' ? -one.logSize(N) : 0),
    0,
  )

/** Of several crossings the last up to now, else the first ahead; null when there is none. */
export const nearestToNow = (list: readonly Crossing[]): Crossing | null =>
  [...list].reverse().find((one) => one.N <= 0) ?? list.find((one) => one.N > 0) ?? null
