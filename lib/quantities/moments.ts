/** The timetable of a scenario: every moment kind once, with its label and where it lies in the history. */
import { type Event, eventAtScale, isEvent, sinceNow, sinceOrigin, untilEnd } from '../history/event'
import type { History } from '../history/history'
import { type Crossing, nearestToNow } from '../measures/epochs'
import { isMissing, type Outcome } from '../measures/outcome'
import { dragRedshift, recombinationRedshift } from '../measures/sound'
import { UNBOUND_SYSTEMS, unbinding } from '../measures/unbinding'
import { hubbleTimeGyr } from '../units'
import type { Subject } from './quantity'

export type MomentKind =
  | 'origin'
  | 'matter-radiation-equality'
  | 'recombination'
  | 'drag'
  | 'acceleration-start'
  | 'acceleration-end'
  | 'matter-dark-equality'
  | 'now'
  | 'turnaround'
  | 'unbinding-cluster'
  | 'unbinding-galaxy'
  | 'unbinding-planet'
  | 'unbinding-earth'
  | 'unbinding-atom'
  | 'end'

export interface Moment {
  readonly kind: MomentKind
  readonly label: string
  /** Gyr from now; null when infinite. */
  readonly time: number | null
  readonly scale: number | null
  readonly redshift: number | null
  /** Gyr since the origin and left to the end, each on its own and not as a difference of times; null when infinite or lost in rounding. */
  readonly age: number | null
  readonly remaining: number | null
}

/** Changes of the sign of ä that are listed; from the last of them on, the scenario is said to oscillate. */
const MOST_CHANGES = 20

const ORIGINS: Readonly<Record<History['origin']['kind'], string>> = {
  'big-bang': 'Big Bang',
  bounce: 'bounce',
  eternal: 'no beginning',
  static: 'static state, infinitely long ago',
  oscillating: 'last bounce',
  singular: 'singular beginning',
}

const ENDS: Readonly<Record<History['end']['kind'], string>> = {
  crunch: 'Big Crunch',
  rip: 'Big Rip',
  'little-rip': 'little rip, never complete',
  exponential: 'expands for ever, exponentially',
  accelerating: 'expands for ever, accelerating',
  coasting: 'expands for ever, coasting',
  decelerating: 'expands for ever, decelerating',
  static: 'comes to rest',
  singular: 'singular end',
  oscillating: 'swings for ever',
}

/** All moments in time order; those at infinite times stand first and last. */
export function momentsOf(subject: Subject): readonly Moment[] {
  const { history, scenario } = subject
  const gyr = hubbleTimeGyr(scenario.h0)
  const start = first(subject, gyr)
  const at = (kind: MomentKind, label: string, event: Event): Moment => {
    const age = finite(sinceOrigin(history, event, 'time') * gyr)
    const remaining = finite(untilEnd(history, event, 'time') * gyr)
    // Rounding may put it before the origin.
    const time = Math.max(start.time ?? Number.NEGATIVE_INFINITY, sinceNow(history, event, 'time') * gyr)
    return momentAt(kind, label, time, event.place.N, { age, remaining })
  }
  const crossing = (kind: MomentKind, label: string, one: Crossing | null): Moment[] =>
    onExpansion(history, one?.N ?? null, (event) => at(kind, label, event))
  const fit = (kind: MomentKind, label: string, z: Outcome): Moment[] =>
    isMissing(z) ? [] : onExpansion(history, -Math.log1p(z.value), (event) => at(kind, label, event))
  const between = [
    ...equalities(subject, crossing),
    ...fit('recombination', 'last scattering', recombinationRedshift(scenario)),
    ...fit('drag', 'end of the drag epoch', dragRedshift(scenario)),
    ...changes(subject, crossing),
    ...now(history, gyr),
    ...turnaround(subject, gyr),
    ...unbindings(subject, gyr),
  ]
  between.sort((one, other) => (one.time ?? 0) - (other.time ?? 0))
  return [start, ...between, last(subject, gyr)]
}

/** null where it leaves the doubles. */
const finite = (time: number): number | null => (Number.isFinite(time) ? time : null)

/** From the times of origin and end alone: for what lies far from both, or is one of them. */
function within({ origin, end }: History, time: number | null, gyr: number): Pick<Moment, 'age' | 'remaining'> {
  if (time === null) return { age: null, remaining: null }
  return {
    age: origin.time === null ? null : (time - origin.time) * gyr,
    remaining: end.time === null ? null : (end.time - time) * gyr,
  }
}

function now(history: History, gyr: number): Moment[] {
  return [{ kind: 'now', label: 'now', time: 0, scale: 1, redshift: 0, ...within(history, 0, gyr) }]
}

const momentAt = (
  kind: MomentKind,
  label: string,
  time: number,
  N: number,
  { age, remaining }: Pick<Moment, 'age' | 'remaining'>,
): Moment => ({
  kind,
  label,
  time,
  scale: finite(Math.exp(N)),
  redshift: finite(Math.expm1(-N)),
  age,
  remaining,
})

function onExpansion(history: History, N: number | null, make: (event: Event) => Moment): Moment[] {
  if (N === null) return []
  const event = eventAtScale(history, N, 'expanding')
  return isEvent(event) ? [make(event)] : []
}

function equalities(
  { epochs }: Subject,
  crossing: (kind: MomentKind, label: string, one: Crossing | null) => Moment[],
): Moment[] {
  return [
    ...crossing('matter-radiation-equality', 'matter equals radiation', nearestToNow(epochs.matterRadiation)),
    ...crossing('matter-dark-equality', 'matter equals dark energy', nearestToNow(epochs.matterDark)),
  ]
}

/** Changes of the sign of ä on the expansion that holds today. */
function changes(
  { epochs: { acceleration } }: Subject,
  crossing: (kind: MomentKind, label: string, one: Crossing | null) => Moment[],
): Moment[] {
  return acceleration.slice(0, MOST_CHANGES).flatMap((one, i) => {
    const label = one.rising ? 'acceleration begins' : 'acceleration ends'
    const oscillates = i === MOST_CHANGES - 1 && acceleration.length > MOST_CHANGES
    const kind = one.rising ? 'acceleration-start' : 'acceleration-end'
    return crossing(kind, oscillates ? `${label}; from here on the sign of ä oscillates` : label, one)
  })
}

function turnaround({ history }: Subject, gyr: number): Moment[] {
  const { turnaround } = history.end
  if (!turnaround) return []
  const { time, scale } = turnaround
  return [momentAt('turnaround', 'expansion stops', time * gyr, Math.log(scale), within(history, time, gyr))]
}

function unbindings({ history, scenario }: Subject, gyr: number): Moment[] {
  return UNBOUND_SYSTEMS.flatMap((system) => {
    const found = unbinding(history, scenario.h0, system)
    if (found === null) return []
    const { age } = within(history, found.time, gyr)
    const remaining = found.remaining === null ? null : finite(found.remaining * gyr)
    return [momentAt(system.kind, system.label, found.time * gyr, found.N, { age, remaining })]
  })
}

function first({ history }: Subject, gyr: number): Moment {
  const { kind, time, scale } = history.origin
  const redshift = scale > 0 ? 1 / scale - 1 : null
  const times = within(history, time, gyr)
  return { kind: 'origin', label: ORIGINS[kind], time: time === null ? null : time * gyr, scale, redshift, ...times }
}

function last({ history }: Subject, gyr: number): Moment {
  const { kind, time, scale } = history.end
  const redshift = scale === null ? -1 : scale > 0 ? 1 / scale - 1 : null
  const times = within(history, time, gyr)
  return { kind: 'end', label: ENDS[kind], time: time === null ? null : time * gyr, scale, redshift, ...times }
}
