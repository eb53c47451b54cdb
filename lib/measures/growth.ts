/**
 * Linear growth of structure well inside the horizon, with smooth dark energy: D(a) with D = 1 today, and f = d ln D/d ln a,
 * for the solution that stays regular as a → 0. What clusters is cold matter and the part ρ − 3p of massive neutrinos.
 */
import type { Arm } from '../history/arm'
import { type Event, expansionAtEvent } from '../history/event'
import type { History } from '../history/history'
import type { Place } from '../history/place'
import { explodes, leadingExponent } from '../history/tail'
import { plainZone } from '../history/zone'
import { growThrough, type State, type Stretch, stateIn } from './growth-panels'
import { logContrastBefore, rateBefore, type Start, startOf } from './growth-start'
import { bounded, type Missing, missing, type Outcome } from './outcome'

interface Growth {
  readonly start: Start
  readonly past: readonly Stretch[]
  readonly today: State
  /** Computed when first asked for. */
  readonly future: () => readonly Stretch[]
}

const OUT_OF_RANGE = missing('growth there is outside the range of floating-point numbers')
const CONTRACTING = missing('growth is counted along the expansion, and this epoch lies on a contracting branch')
const AT_REST = missing('the expansion stands still here, so a slope by ln a is not defined')
const UNBOUNDED = missing('growth goes on without bound while the expansion comes to rest')

/** D over its value today. */
export function growthAt(history: History, event: Event): Outcome {
  const growth = growthOf(history)
  if ('because' in growth) return growth
  if (event.sign < 0) return CONTRACTING
  if (atRest(event.place) && event.place.arm.end.kind === 'double') return UNBOUNDED
  const { start, today } = growth
  const { N } = event.place
  const early = N < start.N && start.goodFrom === start.N
  const state = early ? beforePanels(start, N) : stateAt(growth, event)
  if (state === null) return OUT_OF_RANGE
  const value = state.contrast / today.contrast
  return value > 0 && Number.isFinite(value)
    ? bounded(value, value * Math.abs(state.error - today.error))
    : OUT_OF_RANGE
}

/** f = d ln D/d ln a. */
export function growthRateAt(history: History, event: Event): Outcome {
  const growth = growthOf(history)
  if ('because' in growth) return growth
  if (event.sign < 0) return CONTRACTING
  const { start } = growth
  const { N } = event.place
  if (N < start.N && start.goodFrom === start.N) return bounded(rateBefore(start, N), 1e-12 * rateBefore(start, N))
  const state = stateAt(growth, event)
  if (state === null) return OUT_OF_RANGE
  const e2 = expansionAtEvent(event)
  if (atRest(event.place) || !(e2 > 0)) return AT_REST
  const value = (state.flow * Math.exp(-2 * N)) / (Math.sqrt(e2) * state.contrast)
  return Number.isFinite(value) ? bounded(value, value * (state.error + roundingOf(event.place))) : OUT_OF_RANGE
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
  if (origin.kind !== 'big-bang') return missing('growth starts from a big bang, and this expansion has none')
  if (explodes(past.model, -1) || (leadingExponent(past.model, -1) ?? 5) > 4) {
    return missing('something stiffer than radiation rules early, and all solutions are regular there')
  }
  return null
}

function grow({ past, future }: History): Growth {
  const start = startOf(past)
  const before = throughPast(past, start)
  const today = before[before.length - 1].end
  let ahead: readonly Stretch[] | null = null
  return { start, past: before, today, future: () => (ahead ??= throughFuture(future, today)) }
}

/** From the start to today, in ln a, broken where the law breaks. */
function throughPast({ model }: Arm, start: Start): readonly Stretch[] {
  const edges = [start.N, ...model.law.breaks.filter((N) => N > start.N && N < 0).sort((a, b) => a - b), 0]
  const stretches: Stretch[] = []
  let state = start.state
  for (let i = 0; i + 1 < edges.length; i++) {
    const stretch = growThrough(model, plainZone(model, 1, edges[i], edges[i + 1]), state)
    stretches.push(stretch)
    state = stretch.end
  }
  return stretches
}

function throughFuture({ model, panels }: Arm, today: State): readonly Stretch[] {
  const stretches: Stretch[] = []
  let state = today
  for (const zone of new Set(panels.map((one) => one.zone))) {
    const stretch = growThrough(model, zone, state)
    stretches.push(stretch)
    if (!stretch.whole) break
    state = stretch.end
  }
  return stretches
}

function beforePanels(start: Start, N: number): State {
  return { ...start.state, contrast: Math.exp(logContrastBefore(start, N)) }
}

/** The state at an event, and the zone and variable in which it stands. */
function stateAt(growth: Growth, { phase, place }: Event): State | null {
  if (phase === 'past') {
    if (place.N < growth.start.goodFrom) return null
    const stretch = growth.past.find((one) => place.N <= one.zone.to)
    return stretch ? stateIn(stretch, place.N) : null
  }
  const beyond = place.panel === place.arm.panels.length
  const { zone } = place.arm.panels[beyond ? place.panel - 1 : place.panel]
  const stretch = growth.future().find((one) => one.zone === zone)
  return stretch ? stateIn(stretch, beyond ? zone.variableAt(place.N) : place.s) : null
}

/** Relative rounding of 1/E at a place. */
const roundingOf = ({ arm, panel, s }: Place): number =>
  panel < arm.panels.length ? Number.EPSILON * arm.panels[panel].zone.conditioning(s) : 2 * Number.EPSILON

/** Does the arm come to rest here, at a turning point or a static state? */
const atRest = ({ arm, panel }: Place): boolean => arm.end.kind !== 'none' && panel === arm.panels.length
