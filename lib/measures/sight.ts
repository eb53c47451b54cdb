/** What a line of sight from here and now meets: comoving distance to an event, and horizons as seen from an event. */
import {
  type Event,
  eventAtScale,
  isEvent,
  type Position,
  positionOf,
  type Span,
  sinceNow,
  spanAt,
  spanSinceOrigin,
  untilEnd,
} from '../history/event'
import type { History } from '../history/history'
import { type Place, placeElapsed } from '../history/place'
import { antipode } from './distances'
import { bounded, type Missing, missing, type Outcome } from './outcome'

/** Comoving distance χ in c/H₀ to what is seen at the event, or why it is not on our past light path through the expansion. */
export function comovingDistance(history: History, event: Event): number | Missing {
  if (event.phase === 'future') return missing('it lies in the future: no line of sight leads there')
  if (event.phase !== 'past') return missing('lines of sight are followed only through the expansion that holds today')
  return -sinceNow(history, event, 'conformal')
}

export const NO_PARTICLE_HORIZON = missing('light has had unlimited conformal time: the horizon is infinite')
const NO_EVENT_HORIZON = missing('light has unlimited conformal time ahead: there is no event horizon')
const NOT_FOLLOWED = missing(
  'light would have to be followed to an end that is beyond the range of floating-point numbers',
)
const ALL_IN_VIEW = missing('light has unlimited conformal time ahead: all comes into view in the end')
/** Comoving distance to the farthest matter that is ever seen, where there is no number for what is ahead. */
export const noFarthest = (ahead: Missing): Missing => (ahead === NO_EVENT_HORIZON ? ALL_IN_VIEW : ahead)

/** Comoving distance that light has covered since the beginning, to an event; the contraction before a bounce counts. */
export function particleHorizonSpan(history: History, one: Position): Span | Missing {
  const before = beforeExpansion(history)
  if (typeof before !== 'number') return before
  // Far back in the contraction this is small beside the two whole sums, so it is taken from its own end.
  if (one.phase === 'before' && one.arm === history.before) return { offset: 0, sign: 1, of: 'toEnd' }
  const since = spanSinceOrigin(history, one, 'conformal')
  return { ...since, offset: before + since.offset }
}

export function particleHorizon(history: History, event: Event): number | Missing {
  const span = particleHorizonSpan(history, positionOf(event))
  if ('because' in span) return span
  const value = spanAt(span, event.place, 'conformal')
  return Number.isFinite(value) ? value : NO_PARTICLE_HORIZON
}

/** Conformal time before the origin of the expansion: zero after a big bang. */
function beforeExpansion(history: History): number | Missing {
  const { kind } = history.origin
  if (kind === 'oscillating' || kind === 'static') return missing('the past has no beginning: the horizon is infinite')
  return kind === 'bounce' ? history.past.conformal.total + history.before.conformal.total : 0
}

/** Comoving distance that light sent at the event can still cover before the end. */
export function eventHorizon(history: History, event: Event): number | Missing {
  const left = untilEnd(history, event, 'conformal')
  return Number.isFinite(left) ? left : noEventHorizon(history)
}

/** Why the conformal time ahead is no number: there is no end, or none that the doubles hold. */
export const noEventHorizon = ({ end }: History): Missing =>
  end.kind === 'crunch' || end.kind === 'singular' ? NOT_FOLLOWED : NO_EVENT_HORIZON

const OUT_OF_RANGE = 'the scale factor there, or the density, is outside the range of floating-point numbers'

/**
 * Redshift of what lies at comoving distance χ and is seen today; missing beyond the origin of the expansion or the antipode.
 * `uncertainty` is the error of χ.
 */
export function redshiftAt(history: History, chi: number, uncertainty: number): Outcome {
  const { past } = history
  if (chi > antipode(past.model.budget.curvature))
    return missing('the distance reaches beyond the antipode of the closed space')
  const error = uncertainty + past.conformal.error
  if (!(chi + error < past.conformal.total))
    return missing('the distance reaches beyond all that light could cross since the origin of the expansion')
  const place: Place | null = placeElapsed(past, 'conformal', chi)
  /* v8 ignore if -- χ is below the whole by more than its error, so that it lies among the panels or in a tail */
  if (place === null) return missing(OUT_OF_RANGE)
  const z = Math.expm1(-place.N)
  const found = eventAtScale(history, place.N, 'expanding')
  const rate = isEvent(found)
    ? Math.sqrt(past.model.expansion(place.N, Math.exp(-place.N)))
    : /* v8 ignore next -- the place was found on this arm */ 0
  return Number.isFinite(rate)
    ? bounded(z, error * rate)
    : /* v8 ignore next -- so near to the origin χ differs from the whole by less than its error */ missing(
        OUT_OF_RANGE,
      )
}
