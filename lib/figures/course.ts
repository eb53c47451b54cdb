/**
 * A history as what follows from its size alone sees it: between two events of one run of its expansion lies what has a size
 * between theirs, for which no integral has to be turned round.
 */
import { type Found, isEvent, type Position, sinceNow } from '../history/event'
import { placeAt } from '../history/place'
import type { Solution } from '../solve'
import { hubbleTimeGyr } from '../units'
import { accelerates, dominantAt, type Size } from './contents'
import type { Course, Told } from './eras'

interface Spot extends Size {
  readonly position: Position
  readonly sign: 1 | -1
  /** Gyr from now, where it is known without an integral. */
  readonly time: number | null
}

/** Where the history does not reach there is a time alone. */
type Seen = Spot | { readonly arm: null; readonly time: number }

export function courseOf(
  { scenario, history }: Pick<Solution, 'scenario' | 'history'>,
  eventAt: (time: number) => Found,
): Course<Seen> {
  const at = (time: number): Seen => {
    const found = eventAt(time)
    if (!isEvent(found)) return { arm: null, time }
    const { phase, place, sign, swings } = found
    const { arm, N } = place
    return { arm, N, position: { phase, arm, swings }, sign, time }
  }
  const timeOf = (seen: Seen): number => {
    if (seen.arm === null) return seen.time
    if (seen.time !== null) return seen.time
    const { arm, N, position, sign } = seen
    const place = placeAt(arm, Math.abs(N))
    return place ? sinceNow(history, { ...position, sign, place }, 'time') * hubbleTimeGyr(scenario.h0) : Number.NaN
  }
  return { at, timeOf, between: (one, other) => midway(one, other) ?? at((timeOf(one) + timeOf(other)) / 2) }
}

export const told: Told<Seen> = {
  dominant: (seen) => (seen.arm === null ? null : dominantAt(seen)),
  accelerating: (seen) => (seen.arm !== null && accelerates(seen) ? true : null),
}

/** Null where they lie on different runs, between which the history turns. */
function midway(one: Seen, other: Seen): Spot | null {
  if (one.arm === null || one.arm !== other.arm) return null
  const { arm, N, position, sign } = one
  if (position.phase !== other.position.phase || position.swings !== other.position.swings) return null
  return { arm, N: (N + other.N) / 2, position, sign, time: null }
}
