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

/** All sign changes on the expanding branch, in order of a. A pair nearer together than an eighth of a panel can be missed. */
export function crossings(history: History, f: (model: Model, N: number) => number): readonly Crossing[] {
  const past = changesAlong(history.past, f).reverse()
  return [...past, ...changesAlong(history.future, f)]
}

function changesAlong(arm: Arm, f: (model: Model, N: number) => number): Crossing[] {
  const value = (N: number) => f(arm.model, N)
  const found: Crossing[] = []
  let before = 0
  let was = value(0)
  for (const m of stations(arm)) {
    const N = arm.direction * m
    const is = value(N)
    if (was !== 0 && is !== 0 && Number.isFinite(is) && was > 0 !== is > 0) {
      const at = brent(value, before, N)
      found.push({ N: at, rising: arm.direction > 0 ? is > 0 : was > 0 })
    }
    if (is !== 0) [before, was] = [N, is]
  }
  return found
}

/** Distances from today at which to look, outwards. */
function stations(arm: Arm): readonly number[] {
  const list: number[] = []
  for (const { zone, from, to } of arm.panels) {
    for (let k = 1; k <= STEPS; k++) list.push(zone.distanceAt(from + ((to - from) * k) / STEPS))
  }
  if (arm.tail) for (let k = 1; k <= BEYOND; k++) list.push(arm.edges[arm.edges.length - 1] + k)
  return list
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
