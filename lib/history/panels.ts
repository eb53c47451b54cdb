/**
 * Adaptive Chebyshev panels for the two integrals of a zone. A panel stands when its last two coefficients are below 2e-14 of the
 * largest; a rejected one shrinks, a good one lets the next grow. The factors are tuned for few evaluations.
 */

import {
  antiderivative,
  coefficientsInto,
  evaluate,
  NODE_COUNT,
  noiseIn,
  relativeTail,
  type Series,
  sumAtOne,
} from '../numerics/chebyshev'
import { overBudget } from './field/unsolvable'
import type { Samples, Zone } from './zone'

/** One integral over a panel. */
export interface Stretch {
  /** Antiderivative from the inner edge, as a Chebyshev series. */
  readonly series: Series
  readonly total: number
  /** Absolute error bound of the total: what the series leaves out, and rounding. */
  readonly error: number
}

export interface Panel {
  readonly zone: Zone
  readonly from: number
  readonly to: number
  readonly time: Stretch
  readonly conformal: Stretch
}

const RESOLVED = 2e-14
/** A panel this narrow (in s) is taken as it is; its error bound says so. */
const NARROWEST = 1e-9
const GROWTH = 1.7
/** Noise is at most this many times what is asked. */
const NOISIEST = 1e3
/** Panels tried in one zone before the scenario is given up. */
const MOST_PANELS = 1500

/** Integrands below this no longer have all their digits. */
const SMALLEST = 1e-280

const samples: Samples = { time: new Float64Array(NODE_COUNT), conformal: new Float64Array(NODE_COUNT) }
const coefficients = { time: new Float64Array(NODE_COUNT), conformal: new Float64Array(NODE_COUNT) }
/** Panels that cover [zone.from, zone.to], outwards; an infinite zone ends where `enough` says so after a panel. */
export function panelsOf(zone: Zone, enough: (panel: Panel, edge: number) => boolean): readonly Panel[] {
  const panels: Panel[] = []
  let [from, width] = [zone.from, zone.width]
  let tried = 0
  let [floor, before] = [1, Number.POSITIVE_INFINITY]
  while (from < zone.to) {
    if (++tried > MOST_PANELS) throw overBudget(`The integrals take more than ${MOST_PANELS} panels.`)
    const to = from + width >= zone.to - width * 0.05 ? zone.to : from + width
    attempt(zone, from, to)
    floor = Math.max(floor, noiseIn(before, trial.worst, NOISIEST))
    const excess = trial.worst / floor
    if (excess > 1 && to - from > NARROWEST) {
      width = (to - from) * Math.max(0.35, Math.min(0.75, excess ** (-1 / 15)))
      before = trial.worst
      continue
    }
    before = Number.POSITIVE_INFINITY
    const panel = panelFrom(zone, from, to)
    panels.push(panel)
    if (enough(panel, to)) break
    width = (to - from) * Math.min(GROWTH, Math.max(1, 0.95 * (excess + 1e-3) ** (-1 / 15)))
    from = to
  }
  return panels
}

/**
 * The panel that was tried last, whose series wait in the scratch: `worst` is the size of the last two coefficients over what is
 * asked, `error` that of what is integrated, relative. One object for all, since most of what a history makes is dropped at once.
 */
const trial = { worst: 0, error: 0 }

function attempt(zone: Zone, from: number, to: number): void {
  const [centre, half] = [(from + to) / 2, (to - from) / 2]
  zone.sampleInto(samples, centre, half)
  coefficientsInto(coefficients.time, samples.time)
  coefficientsInto(coefficients.conformal, samples.conformal)
  const conditioning = Math.max(
    zone.conditioning(from + half * 0.01),
    zone.conditioning(centre),
    zone.conditioning(to - half * 0.01),
  )
  const rounding = Number.EPSILON * (2 + conditioning)
  trial.error = zone.stray
    ? rounding + Number.EPSILON * Math.max(zone.stray(from), zone.stray(centre), zone.stray(to))
    : rounding
  // Where E² is small beside its terms, rounding shows in the last coefficients and no narrower panel would lower it.
  trial.worst = largestTail() / Math.max(RESOLVED, rounding)
}

const largestTail = (): number =>
  Math.max(tailOf(samples.time, coefficients.time), tailOf(samples.conformal, coefficients.conformal))

const tailOf = (values: Float64Array, series: Float64Array): number =>
  Math.max(values[0], values[NODE_COUNT - 1]) < SMALLEST ? 0 : relativeTail(series)

/** The panel that was tried last. */
function panelFrom(zone: Zone, from: number, to: number): Panel {
  const half = (to - from) / 2
  const { error } = trial
  return {
    zone,
    from,
    to,
    time: stretchOf(coefficients.time, half, error),
    conformal: stretchOf(coefficients.conformal, half, error),
  }
}

function stretchOf(series: Float64Array, half: number, relative: number): Stretch {
  const left = Math.abs(series[NODE_COUNT - 1]) + Math.abs(series[NODE_COUNT - 2])
  const integral = antiderivative(series, half)
  const total = sumAtOne(integral)
  return { series: integral, total, error: left * half + relative * Math.abs(total) }
}

/** The integral from the panel's inner edge to s. */
export const within = (panel: Panel, stretch: Stretch, s: number): number =>
  evaluate(stretch.series, (2 * (s - panel.from)) / (panel.to - panel.from) - 1)
