/**
 * Linear growth of structure well inside the horizon, with smooth dark energy: D(a) with D = 1 today, and f = d ln D/d ln a,
 * for the solution that stays regular as a → 0. What clusters is cold matter and the part ρ − 3p of massive neutrinos.
 */
import type { Arm } from '../history/arm'
import { type Event, expansionAtEvent } from '../history/event'
import type { History } from '../history/history'
import type { Place } from '../history/place'
import { plainZone } from '../history/plain-zone'
import { explodes, leadingExponent } from '../history/tail'
import type { Zone } from '../history/zone'
import { type Path, pathOf, roundingAt, type State, stateOn } from './growth-panels'
import { logContrastBefore, rateBefore, type Start, startOf } from './growth-start'
import { bounded, type Missing, missing, type Outcome } from './outcome'

interface Growth {
  readonly start: Start
  readonly past: Path
  readonly today: State
  readonly future: Path
}

const OUT_OF_RANGE = missing('growth there is outside the range of floating-point numbers')
const CONTRACTING = missing('growth is counted along the expansion, and this epoch lies on a contracting branch')
const AT_REST = missing('the expansion stands still here, so a slope by ln a is not defined')
const UNBOUNDED = missing('growth goes on without bound while the expansion comes to rest')

/** D over its value today. */
export function growthAt(history: History, event: Event): Outcome {
  const growth = growthFor(history, event)
  if ('because' in growth) return growth
  const { start, today } = growth
  const { N } = event.place
  const state = holdsBeforePanels(growth, N) ? null : stateAt(growth, event)
  const contrast = holdsBeforePanels(growth, N) ? Math.exp(logContrastBefore(start, N)) : state?.contrast
  const value = (contrast ?? Number.NaN) / today.contrast
  if (!(value > 0 && Number.isFinite(value))) return OUT_OF_RANGE
  // D changes by at most about eps |N| of itself where ln a is rounded.
  const gathered = Math.abs((state ?? start.state).error - today.error) + Number.EPSILON * Math.abs(N)
  return bounded(value, value * gathered)
}

/** f = d ln D/d ln a. */
export function growthRateAt(history: History, event: Event): Outcome {
  const growth = growthFor(history, event)
  if ('because' in growth) return growth
  const { N } = event.place
  if (holdsBeforePanels(growth, N)) return closedRate(growth.start, N)
  const e2 = expansionAtEvent(event)
  if (atRest(event.place) || e2 <= 0) return AT_REST
  const state = stateAt(growth, event)
  if (state === null) return OUT_OF_RANGE
  const value = (state.flow * Math.exp(-2 * N)) / (Math.sqrt(e2) * state.contrast)
  return Number.isFinite(value)
    ? bounded(value, value * (state.error + roundingOf(event.place)))
    : /* v8 ignore next -- a guard: E² is above zero here */ OUT_OF_RANGE
}

function closedRate(start: Start, N: number): Outcome {
  const value = rateBefore(start, N)
  return bounded(value, start.state.error * value)
}

/** Growth where it is defined at this event. */
function growthFor(history: History, event: Event): Growth | Missing {
  if (event.sign < 0) return CONTRACTING
  const { arm } = event.place
  if (arm.end.kind === 'double' && atRest(event.place)) return UNBOUNDED
  return growthOf(history)
}

const solved = new WeakMap<History, Growth | Missing>()

/** Once per history. */
function growthOf(history: History): Growth | Missing {
  let growth = solved.get(history)
  if (!growth) {
    growth = obstacleTo(history) ?? grow(history)
    solved.set(history, growth)
  }
  return growth
}

function obstacleTo({ past, origin }: History): Missing | null {
  const { coldMatter, states } = past.model.budget
  if (coldMatter === 0 && states.length === 0) return missing('there is no matter to cluster')
  if (origin.kind !== 'big-bang') return missing('growth starts from a Big Bang, and this expansion has none')
  const exponent = leadingExponent(past.model, -1)
  if (explodes(past.model, -1) || exponent === null || exponent > 4) {
    return missing('something stiffer than radiation rules early, and all solutions are regular there')
  }
  return null
}

function grow({ past, future }: History): Growth | Missing {
  const start = startOf(past)
  const zones = zonesSince(start, past)
  const before = pathOf(past.model, zones, start.state)
  const today = stateOn(before, zones[zones.length - 1], 0)
  if (today === null) return OUT_OF_RANGE
  const ahead = [...new Set(future.panels.map((one) => one.zone))]
  return { start, past: before, today, future: pathOf(future.model, ahead, today) }
}

/** From the start to today, in ln a, broken where the law breaks. */
function zonesSince(start: Start, { model }: Arm): readonly Zone[] {
  const breaks = model.law.breaks.filter((N) => N > start.N && N < 0).sort((one, other) => one - other)
  const edges = [start.N, ...breaks, 0]
  return edges.slice(1).map((to, i) => plainZone(model, 1, edges[i], to))
}

const holdsBeforePanels = ({ start }: Growth, N: number): boolean => N < start.N && start.goodFrom === start.N

/** D in the scale of its start, q and the error at an event on the expanding branch; null beyond the doubles. */
function stateAt({ start, past, future }: Growth, { phase, place }: Event): State | null {
  if (phase === 'past') {
    const zone = past.zones.find((one) => place.N <= one.to)
    return zone && place.N >= start.goodFrom ? stateOn(past, zone, place.N) : null
  }
  const beyond = place.panel === place.arm.panels.length
  const { zone } = place.arm.panels[beyond ? place.panel - 1 : place.panel]
  return stateOn(future, zone, beyond ? zone.variableAt(place.N) : place.s)
}

/** Relative rounding of 1/E at a place. */
const roundingOf = ({ arm, panel, s }: Place): number =>
  panel < arm.panels.length ? roundingAt(arm.panels[panel].zone, s) : 2 * Number.EPSILON

/** Does the arm come to rest here, at a turning point or a static state? */
const atRest = ({ arm, panel }: Place): boolean => arm.end.kind !== 'none' && panel === arm.panels.length
