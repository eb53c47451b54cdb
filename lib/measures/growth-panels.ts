/**
 * The growth of a density contrast D over a zone, panel by panel. With dt = dN/E and q = a² dD/dt the equation of growth
 *   D″ + (2 + (ln E)′) D′ = (3/2) Ω_s D,  Ω_s = ρ_s/ρ_c,  ρ_s the pressureless part of the density,
 * is dD = a⁻² q dt, dq = (3/2) a² ρ_s D dt (Peebles 1980, The Large-Scale Structure of the Universe, section 10):
 * regular where E vanishes, and a sum of positive terms, so that D and q both keep their relative accuracy.
 */

import type { Zone } from '../history/zone'
import type { Model } from '../model'
import { energyRatio, logSlope } from '../neutrinos/energy'
import { evaluate, NODE_COUNT, type Series, sumAtOne } from '../numerics/chebyshev'
import { solvePair } from '../numerics/linear-pair'

/** D and q = a² dD/dt at one place, and a bound on the relative error that both have gathered. */
export interface State {
  readonly contrast: number
  readonly flow: number
  readonly error: number
}

interface GrowthPanel {
  readonly zone: Zone
  readonly from: number
  readonly to: number
  /** Chebyshev series of D and q. */
  readonly contrast: Series
  readonly flow: Series
  /** At its end. */
  readonly error: number
}

/** Panels through zones that follow one another, in the variables of the zones, made as far as they have been asked for. */
export interface Path {
  readonly zones: readonly Zone[]
  readonly panels: GrowthPanel[]
  readonly rest: Iterator<GrowthPanel>
}

/** Last two coefficients over the value: what a panel may leave out. */
const RESOLVED = 1e-13
const NARROWEST = 1e-9
const MOST_PANELS = 2000
/** dt/ds beyond which E² is no longer a normal double. */
const SLOWEST = 1e150
/** Tuned for few panels. */
const WIDTH = 2
const GROWTH = 1.7

const samples = { time: new Float64Array(NODE_COUNT), conformal: new Float64Array(NODE_COUNT) }
const [alpha, beta] = [new Float64Array(NODE_COUNT), new Float64Array(NODE_COUNT)]

/** In zones whose variable grows with time. */
export const pathOf = (model: Model, zones: readonly Zone[], start: State): Path => ({
  zones,
  panels: [],
  rest: panelsAlong(model, zones, start),
})

function* panelsAlong(model: Model, zones: readonly Zone[], start: State): Generator<GrowthPanel> {
  let state: State | null = start
  for (const zone of zones) {
    state = yield* panelsIn(model, zone, state)
    if (state === null) return
  }
}

/** From the zone's beginning to its end; null where doubles end before. */
function* panelsIn(model: Model, zone: Zone, start: State): Generator<GrowthPanel, State | null> {
  let state = start
  let [from, width] = [zone.from, Math.min(WIDTH, zone.to - zone.from)]
  for (let tried = 0; from < zone.to && tried < MOST_PANELS; tried++) {
    const to = from + width >= zone.to - width * 0.05 ? zone.to : from + width
    if (!sample(model, zone, from, to)) return null
    const rounding = roundingOver(zone, from, to)
    const pair = solvePair(alpha, beta, (to - from) / 2, state.contrast, state.flow)
    const worst = pair ? pair.left / Math.max(RESOLVED, rounding) : Number.POSITIVE_INFINITY
    if (worst > 1 && to - from > NARROWEST) {
      width = (to - from) * Math.max(0.35, Math.min(0.75, worst ** (-1 / 15)))
      continue
    }
    if (!pair) return null
    const error = state.error + 2 * pair.left + 4 * rounding
    yield { zone, from, to, contrast: pair.u, flow: pair.v, error }
    state = { contrast: sumAtOne(pair.u), flow: sumAtOne(pair.v), error }
    width = (to - from) * Math.min(GROWTH, Math.max(1, 0.95 * (worst + 1e-3) ** (-1 / 15)))
    from = to
  }
  return from < zone.to
    ? /* v8 ignore next -- over the budget of panels, which no scenario has been seen to need */ null
    : state
}

/** D, q and the error at s in a zone, not before its beginning; null where doubles end before. */
export function stateOn(path: Path, zone: Zone, s: number): State | null {
  const holds = (one: GrowthPanel) => one.zone === zone && s <= one.to
  const panel = path.panels.find(holds) ?? nextPanel(path, holds)
  if (!panel) return null
  const x = Math.max(-1, Math.min(1, (2 * (s - panel.from)) / (panel.to - panel.from) - 1))
  return { contrast: evaluate(panel.contrast, x), flow: evaluate(panel.flow, x), error: panel.error }
}

/** Goes on until a panel holds what is asked for. */
function nextPanel({ panels, rest }: Path, holds: (panel: GrowthPanel) => boolean): GrowthPanel | undefined {
  for (let next = rest.next(); !next.done; next = rest.next()) {
    panels.push(next.value)
    if (holds(next.value)) return next.value
  }
  return undefined
}

/** α = a⁻² dt/ds and β = (3/2) a² ρ_s dt/ds at the nodes; false where they leave the doubles. */
function sample(model: Model, zone: Zone, from: number, to: number): boolean {
  zone.sampleInto(samples, (from + to) / 2, (to - from) / 2)
  for (let k = 0; k < NODE_COUNT; k++) {
    const rate = samples.time[k]
    const inverseScale = samples.conformal[k] / rate
    // Where E² exceeds the doubles, no time is left for growth.
    alpha[k] = rate === 0 ? 0 : samples.conformal[k] * inverseScale
    beta[k] = rate === 0 ? 0 : 1.5 * rate * sourceOver(model, inverseScale)
    if (!(rate < SLOWEST && Number.isFinite(alpha[k]) && Number.isFinite(beta[k]))) return false
  }
  return true
}

/** a² ρ_s: what clusters, cold matter and the part ρ − 3p of massive neutrinos. */
export function sourceOver({ budget }: Model, inverseScale: number): number {
  let relativistic = 0
  for (const { y, masslessDensity } of budget.states) {
    const here = y / inverseScale
    relativistic += masslessDensity * energyRatio(here) * logSlope(here)
  }
  return (budget.coldMatter + relativistic * inverseScale) * inverseScale
}

/** Relative rounding of 1/E at s; where E² exceeds the doubles, nothing is left that it could spoil. */
export function roundingAt(zone: Zone, s: number): number {
  const conditioning = zone.conditioning(s)
  /* v8 ignore next -- growth is asked for where there is matter, and E² a double */
  return Number.EPSILON * (2 + (Number.isFinite(conditioning) ? conditioning : 0))
}

function roundingOver(zone: Zone, from: number, to: number): number {
  const edge = 0.005 * (to - from)
  return Math.max(roundingAt(zone, from + edge), roundingAt(zone, (from + to) / 2), roundingAt(zone, to - edge))
}
