/** An instant of a history as the columns read it: an event, and what several columns share, computed once. */
import {
  type Branch,
  type Event,
  eventAtAge,
  eventAtScale,
  eventAtTime,
  type Found,
  isEvent,
  sinceNow,
  sinceOrigin,
} from '../history/event'
import type { Missing } from '../measures/outcome'
import { hubbleTimeGyr } from '../units'
import type { Subject } from './quantity'

/** What columns are read from, beside the instant. */
export type ColumnSubject = Pick<Subject, 'scenario' | 'budget' | 'history'>

export interface Instant extends Event {
  readonly scale: number
  readonly redshift: number
  /** Gyr from now. */
  readonly time: number
  /** Gyr since the origin; Infinity where the past has none. */
  readonly age: number
  /** Conformal time from now, in 1/H₀; past negative. */
  readonly conformal: number
  /** Which time was asked for, so that the place is the result of a search; null where it follows from a. */
  readonly asked: 'time' | 'age' | null
}

export const isInstant = (found: Instant | Missing): found is Instant => 'place' in found

/** The variables by which an instant can be asked for. */
export const VARIABLES = ['z', 'scale', 'time', 'age'] as const
export type Variable = (typeof VARIABLES)[number]

/**
 * The instant at a finite value of a variable: z > −1, scale > 0, time and age in Gyr; `branch` matters for z and scale alone.
 * The value asked for stands in the instant as it was given, not as it comes back through ln a.
 */
export function instantAt(
  subject: ColumnSubject,
  variable: Variable,
  value: number,
  branch: Branch = 'expanding',
): Instant | Missing {
  const event = eventAt(subject, variable, value, branch)
  return isEvent(event) ? instantOf(subject, event, asGiven(variable, value)) : event
}

export function eventAt(
  { scenario, history }: ColumnSubject,
  variable: Variable,
  value: number,
  branch: Branch,
): Found {
  switch (variable) {
    case 'z':
      return eventAtScale(history, -Math.log1p(value), branch)
    case 'scale':
      return eventAtScale(history, Math.log(value), branch)
    case 'time':
      return eventAtTime(history, value / hubbleTimeGyr(scenario.h0))
    case 'age':
      return eventAtAge(history, value / hubbleTimeGyr(scenario.h0))
  }
}

/** What is known of an event without going through ln a. */
interface Given {
  readonly scale?: number
  readonly redshift?: number
  readonly time?: number
  readonly age?: number
}

function asGiven(variable: Variable, value: number): Given {
  switch (variable) {
    case 'z':
      return { redshift: value, scale: 1 / (1 + value) }
    case 'scale':
      return { scale: value, redshift: (1 - value) / value }
    case 'time':
      return { time: value }
    case 'age':
      return { age: value }
  }
}

/** The instant of an event. */
export function instantOf({ scenario, history }: ColumnSubject, event: Event, given: Given = {}): Instant {
  const gyr = hubbleTimeGyr(scenario.h0)
  const { phase, place, sign, swings } = event
  return {
    phase,
    place,
    sign,
    swings,
    scale: given.scale ?? Math.exp(place.N),
    redshift: given.redshift ?? Math.expm1(-place.N),
    time: given.time ?? sinceNow(history, event, 'time') * gyr,
    age: given.age ?? sinceOrigin(history, event, 'time') * gyr,
    conformal: sinceNow(history, event, 'conformal'),
    asked: given.time !== undefined ? 'time' : given.age !== undefined ? 'age' : null,
  }
}
