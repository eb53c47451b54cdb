/** Errors of what columns are made from: the place in ln a, E², times and distances, each an absolute bound. */

import type { Arm } from '../history/arm'
import { type Span, spanSinceNow, spanSinceOrigin } from '../history/event'
import type { History } from '../history/history'
import type { Clock } from '../history/tail'
import { type Block, expansionIn, shared, slopesIn, spanIn } from './block'
import type { ColumnKey } from './column'
import { columnOf } from './columns'

export const EPS = Number.EPSILON
/** Roundings of a short formula. */
export const FEW = 8

export type At = (block: Block, i: number) => number

export const errors =
  (at: At) =>
  (block: Block): Float64Array => {
    const out = block.take()
    for (let i = 0; i < block.count; i++) out[i] = at(block, i)
    return out
  }

/** Was the instant asked for by time, so that its place is the result of a search? */
export const isTimed = ({ asked }: Block): boolean => asked !== null

/** Of ln a. */
export const placeErrors = shared((block) => {
  const squared = expansionIn(block)
  const searched = isTimed(block) ? timed(block) : null
  return errors((_, i) => {
    const rounding = searched && isNearRest(block, i) ? 0 : EPS * (1 + Math.abs(block.N[i]))
    return rounding + (searched ? searched[i] * Math.sqrt(Math.max(0, squared[i])) : 0)
  })(block)
})

/** Of the time that was asked for, where a place was searched for it. */
const timed = shared((block) => spanErrors(block, nearest(block), 'time', false))

/** Next to a static state a place that was searched for is known by the time that it takes to come there, not by ln a. */
const isNearRest = ({ arm, panel }: Block, i: number): boolean =>
  arm.end.kind === 'double' && arm.panels[panel[i]]?.zone.plain !== true

/** From the origin or from now, as the instant was asked for. */
const nearest = (block: Block): Span =>
  block.asked === 'time'
    ? spanSinceNow(block.subject.history, block, 'time')
    : spanSinceOrigin(block.subject.history, block, 'time')

/** Of E² at a given place, relative. */
export const roundings = shared(
  errors(({ arm, panel, s }, i) => {
    const zone = panel[i] < arm.panels.length ? arm.panels[panel[i]].zone : null
    const plain = EPS * (FEW + 2 * (zone ? zone.conditioning(s[i]) + (zone.stray?.(s[i]) ?? 0) : 2))
    return zone === null && arm.end.kind === 'double' ? plain + 2 * fading(arm, s[i]) : plain
  }),
)

/** Of E next to a static state, relative: it falls by e in a time that is the scale of the tail, whose beginning is uncertain. */
function fading({ time, tail }: Arm, s: number): number {
  const scale = tail?.time.scale ?? Number.POSITIVE_INFINITY
  return time.errorFromToday[time.errorFromToday.length - 1] / scale + FEW * EPS * s
}

/** Of E². */
export const expansionErrors = shared((block) => {
  const [rounded, squared, { first }, places] = [
    roundings(block),
    expansionIn(block),
    slopesIn(block),
    placeErrors(block),
  ]
  return errors((_, i) => Math.abs(squared[i]) * rounded[i] + Math.abs(first[i]) * places[i])(block)
})

/** Of E: where the expansion stands still, the root of that of E². */
export const rateErrors = shared((block) => {
  const [squared, off] = [expansionIn(block), expansionErrors(block)]
  return errors((_, i) => {
    const root = Math.sqrt(off[i])
    return squared[i] > 0 ? Math.min(root, off[i] / (2 * Math.sqrt(squared[i]))) : root
  })(block)
})

/** Of a time or conformal time, in 1/H₀; `moved` counts what the error of the place moves it by. */
export function spanErrors(block: Block, span: Span, clock: Clock, moved = true): Float64Array {
  const { arm, subject, swings } = block
  const [values, sums, squared] = [spanIn(block, span, clock), arm[clock], expansionIn(block)]
  const [places, { first }] = [moved ? placeErrors(block) : null, slopesIn(block)]
  const beyond =
    span.offset === 0 ? 0 : (1 + 2 * swings) * totalErrors(subject.history, clock) + EPS * Math.abs(span.offset)
  const gathered = span.of === 'fromToday' ? sums.errorFromToday : sums.errorToEnd
  return errors(({ panel, scale }, i) => {
    const own = gathered[panel[i]] + beyond + FEW * EPS * Math.abs(values[i])
    if (!places) return own
    // The place is as uncertain as the time was, and of it nothing else is known here.
    if (isTimed(block) && isNearRest(block, i)) return own + timed(block)[i] / (clock === 'conformal' ? scale[i] : 1)
    // About a turning point time goes like the root of the distance in ln a.
    const moved = Math.min(
      places[i] / Math.sqrt(Math.max(0, squared[i])),
      2 * Math.sqrt(places[i] / Math.abs(first[i])),
    )
    return own + moved / (clock === 'conformal' ? scale[i] : 1)
  })(block)
}

const totalErrors = ({ past, future, before, descent, home, unfollowed }: History, clock: Clock): number =>
  [past, future, before, descent, home].reduce((sum, one) => sum + one[clock].error, unfollowed?.error ?? 0)

export const scaledBy =
  (values: Float64Array, unit: number): At =>
  (_, i) =>
    values[i] * unit

/** A value of its own relative error. */
export const relative = (key: ColumnKey, of: At) => (block: Block) => {
  const values = valuesOf(key, block)
  return errors((one, i) => Math.abs(values[i]) * of(one, i))(block)
}

export const valuesOf = (key: ColumnKey, block: Block): Float64Array => columnOf(key).values(block)

/** Rounding and what the error of the place adds where it was searched for. */
export const placed: At = (block, i) => FEW * EPS + (isTimed(block) ? placeErrors(block)[i] : 0)

export const ofRate: At = (block, i) => rateErrors(block)[i] / Math.sqrt(expansionIn(block)[i]) + FEW * EPS
export const ofDensity: At = (block, i) => expansionErrors(block)[i] / expansionIn(block)[i] + FEW * EPS
