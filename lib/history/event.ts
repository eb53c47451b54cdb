/**
 * An event of the history: where on which arm, when, and how far in conformal time.
 * Explicit laws are symmetric in time about a turning point, so their contracting branches are mirrored arms; a field has its own descent.
 */
import type { Arm } from './arm'
import type { History } from './history'
import { expansionAtPlace, fromToday, type Place, placeAt, placeElapsed, placeRemaining, toEnd } from './place'
import type { Clock } from './tail'

export type Branch = 'expanding' | 'contracting'
/** before = before a bounce, contracting; past and future = the expansion that holds today; home = after a turnaround. */
export type Phase = 'before' | 'past' | 'future' | 'home'

export interface Event {
  readonly phase: Phase
  readonly place: Place
  /** 1 while expanding, −1 while contracting: the sign of H. */
  readonly sign: 1 | -1
  /** In an oscillating history: how many whole swings lie between the event's own swing and the turning point nearest to today. */
  readonly swings: number
}

/** An event, or the reason why the history has none there. */
export type Found = Event | { readonly because: string }

export const isEvent = (found: Found): found is Event => 'place' in found

const missing = (because: string): Found => ({ because })
const event = (phase: Phase, place: Place): Event => ({
  phase,
  place,
  sign: phase === 'past' || phase === 'future' ? 1 : -1,
  swings: 0,
})

/** The event at scale factor e^N on a branch. */
export function eventAtScale(history: History, N: number, branch: Branch): Found {
  if (branch === 'expanding') {
    const phase = N <= 0 ? 'past' : 'future'
    return eventOn(phase, history[phase], N, 'the expansion that holds today never has this scale factor')
  }
  if (history.future.end.kind === 'root') {
    if (history.unfollowed) return missing(history.unfollowed.because)
    return eventOn('home', N > 0 ? history.descent : history.home, N, NEVER_BACK)
  }
  if (history.past.end.kind === 'root') return eventOn('before', N > 0 ? history.before : history.past, N, NEVER_BACK)
  return missing('this universe has no contracting branch')
}

const NEVER_BACK = 'the contracting branch never has this scale factor'

/** `never` says why there is none beyond a turning point. */
function eventOn(phase: Phase, arm: Arm, N: number, never: string): Found {
  const place = placeAt(arm, Math.abs(N))
  if (place) return event(phase, place)
  if (arm.end.kind === 'none') return missing(OUT_OF_RANGE)
  return missing(arm.end.kind === 'double' && sameScale(N, arm.end.N) ? AT_REST : never)
}

/** To the digits of a scale factor. */
const sameScale = (one: number, other: number): boolean => Math.abs(one - other) <= 4 * Number.EPSILON

const AT_REST = 'this is the static state itself, which is infinitely far away in time'

/** The event at a time from now, in 1/H₀. */
export function eventAtTime(history: History, time: number): Found {
  return eventAt(history, 'time', time)
}

/** The event at a conformal time from now, in 1/H₀. */
export function eventAtConformal(history: History, conformal: number): Found {
  return eventAt(history, 'conformal', conformal)
}

const eventAt = (history: History, clock: Clock, since: number): Found =>
  since <= 0 ? pastEvent(history, clock, -since) : futureEvent(history, clock, since)

/** The event at an age since the origin; negative ages lie before a bounce. */
export function eventAtAge(history: History, age: number): Found {
  const { past, origin } = history
  if (origin.time === null) return missing('the past is infinite, so no age can be counted')
  if (age < 0)
    return past.end.kind === 'root' ? beforeBounce(history, 'time', -age) : missing('nothing lies before the origin')
  if (age === 0 && past.end.kind === 'none') return missing('this is the origin itself, where a = 0')
  if (age > past.time.total) return futureEvent(history, 'time', age - past.time.total)
  const place = placeRemaining(past, 'time', age)
  return place ? event('past', place) : missing(OUT_OF_RANGE)
}

const AFTER_THE_END = 'this is after the end'
const OUT_OF_RANGE =
  'the scale factor there is outside the range of floating-point numbers, or farther than the history is followed'

function pastEvent(history: History, clock: Clock, elapsed: number): Found {
  const { past } = history
  if (elapsed <= past[clock].total) {
    const place = placeElapsed(past, clock, elapsed)
    return place ? event('past', place) : missing(OUT_OF_RANGE)
  }
  if (past.end.kind !== 'root') return missing('this is before the origin')
  return beforeBounce(history, clock, elapsed - past[clock].total)
}

function futureEvent(history: History, clock: Clock, elapsed: number): Found {
  const { future } = history
  if (elapsed <= future[clock].total) {
    const place = placeElapsed(future, clock, elapsed)
    return place ? event('future', place) : missing(OUT_OF_RANGE)
  }
  if (future.end.kind !== 'root') return missing(AFTER_THE_END)
  const since = elapsed - future[clock].total
  if (history.unfollowed) return missing(since > history.unfollowed[clock] ? AFTER_THE_END : history.unfollowed.because)
  return mirrored(history, 'home', clock, since, AFTER_THE_END)
}

const beforeBounce = (history: History, clock: Clock, since: number): Found =>
  mirrored(history, 'before', clock, since, 'this is before the origin')

/** The two arms that lie beyond a turning point: first the one that leads back towards today's size, then the one beyond it. */
const swing = (history: History, phase: 'home' | 'before'): readonly [Arm, Arm] =>
  phase === 'home' ? [history.descent, history.home] : [history.past, history.before]

/** `since` a turning point, away from today: back along the near arm, on along the far one; from a second turning point to and fro. */
function mirrored(history: History, phase: 'home' | 'before', clock: Clock, since: number, beyond: string): Found {
  const [near, far] = swing(history, phase)
  const whole = near[clock].total + far[clock].total
  if (since > whole && far.end.kind !== 'root') return missing(beyond)
  const swings = Number.isFinite(whole) ? Math.floor(since / whole) : 0
  const away = swings % 2 === 0
  const left = swings === 0 ? since : away ? since - swings * whole : (swings + 1) * whole - since
  const place =
    left <= near[clock].total ? placeRemaining(near, clock, left) : placeElapsed(far, clock, left - near[clock].total)
  if (!place) return missing(OUT_OF_RANGE)
  return { phase, place, sign: away ? -1 : 1, swings }
}

/** Where an event lies, but for its place on the arm. */
export interface Position {
  readonly phase: Phase
  readonly arm: Arm
  readonly swings: number
}

/** A time or conformal time of any event at a position: a constant, and an integral along the arm with its sign. */
export interface Span {
  readonly offset: number
  readonly sign: 1 | -1
  readonly of: 'fromToday' | 'toEnd'
}

const span = (offset: number, sign: Span['sign'], of: Span['of']): Span => ({ offset, sign, of })
const after = (offset: number, one: Span): Span => span(offset + one.offset, one.sign, one.of)
const before = (offset: number, one: Span): Span => span(offset - one.offset, one.sign > 0 ? -1 : 1, one.of)

/** Between an event beyond a turning point and that point. */
function sinceTurning(history: History, { arm, swings }: Position, phase: 'home' | 'before', clock: Clock): Span {
  const [near, far] = swing(history, phase)
  const along = arm === near ? span(0, 1, 'toEnd') : span(near[clock].total, 1, 'fromToday')
  if (swings === 0) return along
  const whole = near[clock].total + far[clock].total
  return swings % 2 === 0 ? after(swings * whole, along) : before((swings + 1) * whole, along)
}

/** From now to the event; past negative. */
export function spanSinceNow(history: History, one: Position, clock: Clock): Span {
  switch (one.phase) {
    case 'past':
      return span(0, -1, 'fromToday')
    case 'future':
      return span(0, 1, 'fromToday')
    case 'home':
      return after(history.future[clock].total, sinceTurning(history, one, 'home', clock))
    case 'before':
      return before(-history.past[clock].total, sinceTurning(history, one, 'before', clock))
  }
}

/** Since the origin: the big bang, or the last bounce. Infinity where the past is infinite. */
export function spanSinceOrigin(history: History, one: Position, clock: Clock): Span {
  if (one.phase === 'past') return span(0, 1, 'toEnd')
  if (one.phase === 'before') return before(0, sinceTurning(history, one, 'before', clock))
  return after(history.past[clock].total, spanSinceNow(history, one, clock))
}

/** Left to the end; Infinity where there is none. */
export function spanUntilEnd(history: History, one: Position, clock: Clock): Span {
  const { future, descent, home, unfollowed } = history
  const never = span(Number.POSITIVE_INFINITY, 1, 'fromToday')
  const until = (end: number) => before(end, spanSinceNow(history, one, clock))
  if (future.end.kind === 'double') return never
  if (future.end.kind === 'none' || future.end.kind === 'singular')
    return one.phase === 'future' ? span(0, 1, 'toEnd') : until(future[clock].total)
  if (unfollowed) return until(future[clock].total + unfollowed[clock])
  if (home.end.kind !== 'none' && home.end.kind !== 'singular') return never
  if (one.phase === 'home' && one.arm === home) return span(0, 1, 'toEnd')
  return until(future[clock].total + descent[clock].total + home[clock].total)
}

export const positionOf = ({ phase, place, swings }: Event): Position => ({ phase, arm: place.arm, swings })

/** The value of a span at a place. */
export const spanAt = ({ offset, sign, of }: Span, place: Place, clock: Clock): number =>
  offset + sign * (of === 'fromToday' ? fromToday(place, clock) : toEnd(place, clock))

/** Time or conformal time from now to the event; past negative. */
export const sinceNow = (history: History, one: Event, clock: Clock): number =>
  spanAt(spanSinceNow(history, positionOf(one), clock), one.place, clock)

/** Time or conformal time since the origin. */
export const sinceOrigin = (history: History, one: Event, clock: Clock): number =>
  spanAt(spanSinceOrigin(history, positionOf(one), clock), one.place, clock)

/** Time or conformal time left to the end. */
export const untilEnd = (history: History, one: Event, clock: Clock): number =>
  spanAt(spanUntilEnd(history, positionOf(one), clock), one.place, clock)

/** E² at an event. */
export const expansionAtEvent = ({ place }: Event): number => expansionAtPlace(place)
