/** What lies beyond the panels of an arm. */
import { logExpansion, type Model } from '../model'
import { integralOfExp } from './far'
import { type Clock, converges, explodes, staticTail, type Tail, tailAt } from './tail'
import { remainingIn } from './tail-integral'
import { type Direction, FARTHEST, type Search } from './turning'

/** Why the panels stop: at the end itself, where a closed form takes over, or where nothing that a double can hold is left to add. */
export type Stopped = 'end' | 'tail' | 'spent' | 'for ever' | 'far'

/** The tail, and value and error of both integrals. */
export interface Beyond {
  readonly tail: Tail | null
  readonly time: readonly [number, number]
  readonly conformal: readonly [number, number]
}

/** What lies beyond the last panel; `begun` is the tail where it is known already. */
export function beyondPanels(
  model: Model,
  direction: Direction,
  end: Search,
  stopped: Stopped,
  edge: number,
  begun: Tail | null,
): Beyond {
  const infinite = [Number.POSITIVE_INFINITY, 0] as const
  const nothing = [0, 0] as const
  if (end.kind === 'double') return { tail: staticTail(model, end.N), time: infinite, conformal: infinite }
  if (end.kind === 'none' && end.farRoot !== null && stopped !== 'tail') return turningFar(model, direction, edge)
  const ends = end.kind === 'root' || (end.kind === 'singular' && Math.abs(end.N) <= FARTHEST)
  if (ends || stopped === 'end') return { tail: null, time: nothing, conformal: nothing }
  if (explodes(model, direction)) return exploding(model, direction, stopped, edge)
  if (stopped === 'for ever') return { tail: null, time: infinite, conformal: infinite }
  const tail = begun ?? tailAt(model, direction, direction * edge, stopped === 'far')
  if (tail === null) {
    const left = (clock: Clock) => (stopped === 'spent' && converges(model, direction, clock) ? nothing : infinite)
    return { tail, time: left('time'), conformal: left('conformal') }
  }
  const doubt = tail.left + 4 * Number.EPSILON
  const of = (clock: Clock) => {
    const value = remainingIn(tail[clock], 0)
    return [value, Number.isFinite(value) ? doubt * value : 0] as const
  }
  return { tail, time: of('time'), conformal: of('conformal') }
}

/** A turning point that the doubles do not hold: for ever ahead; behind, what is left is no more than the last e-fold. */
function turningFar(model: Model, direction: Direction, edge: number): Beyond {
  if (direction > 0)
    return { tail: null, time: [Number.POSITIVE_INFINITY, 0], conformal: [Number.POSITIVE_INFINITY, 0] }
  const log = -0.5 * logExpansion(model, -edge)
  return { tail: null, time: [0, 4 * Math.exp(log)], conformal: [0, 4 * Math.exp(log + edge)] }
}

/** Every integral is finite, but the doubles may end before it is complete. */
function exploding(model: Model, direction: Direction, stopped: Stopped, edge: number): Beyond {
  if (stopped === 'spent') return { tail: null, time: [0, 0], conformal: [0, 0] }
  const of = (weight: number): readonly [number, number] => {
    const value = integralOfExp((m) => -weight * direction * m - 0.5 * logExpansion(model, direction * m), edge)
    return [value, Number.isFinite(value) ? 1e-12 * value : 0]
  }
  return { tail: null, time: of(0), conformal: of(1) }
}
