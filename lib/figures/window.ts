/** The shared window of several histories: every origin, and every ending that falls within reason. */
import type { Solution } from '../solve'
import type { Contents } from './contents'

export type Seen = Pick<Solution, 'origin' | 'end' | 'measures'>
/** a at times in Gyr from now, ascending; null where the history does not reach. */
export type Scales = (times: readonly number[]) => readonly (number | null)[]

export interface Entry<S extends Seen = Seen> {
  readonly solution: S
  readonly scales: Scales
  /** What dominates at a time; absent where nobody knows. */
  readonly contents?: (time: number) => Contents | null
}

export interface Window {
  /** Gyr from now. */
  readonly from: number
  readonly to: number
  /** Scale factor at the upper edge; the lower one is 0. */
  readonly top: number
}

// All numbers here are tuned by eye.
/** Past longer than this many Hubble times leaves by an arrow. */
const LONGEST_PAST = 12
/** Past without a beginning is shown for this many Hubble times. */
const ETERNAL_PAST = 1.4
/** A bounce shows this part of its time again before it. */
const BEFORE_BOUNCE = 0.6
/** Future without an ending, and the farthest ending, in units of the past. */
const PLAIN_FUTURE = 2.4
const FARTHEST = 10
const MARGIN = 1.05
/** Largest scale factors for those that turn and for those that do not. */
const TURNING_TOP = 12
const PLAIN_TOP = 5
const LEAST_TOP = 1.25
const HEADROOM = 1.15

export function windowOf(entries: readonly Entry[]): Window {
  const past = Math.max(...entries.map(({ solution }) => pastOf(solution)))
  const to = futureOf(
    entries.map(({ solution }) => solution),
    past,
  )
  const top = Math.max(LEAST_TOP, ...entries.map((entry) => topOf(entry, to)))
  return { from: -past * MARGIN, to, top }
}

function pastOf({ origin, measures }: Seen): number {
  const hubbleTime = measures.hubbleTime.value ?? 1
  if (origin.time === null) return ETERNAL_PAST * hubbleTime
  const before = origin.kind === 'bounce' || origin.kind === 'oscillating' ? 1 + BEFORE_BOUNCE : 1
  return Math.min(-origin.time * before, LONGEST_PAST * hubbleTime)
}

function futureOf(solutions: readonly Seen[], past: number): number {
  const events = solutions.map((one) => lastEvent(one, FARTHEST * past))
  const shown = events.filter((time) => time !== null)
  const least = shown.length === events.length ? 0.5 * past : PLAIN_FUTURE * past
  return Math.max(least, ...shown.map((time) => time * MARGIN))
}

/** The ending, else the turn, if it comes before `limit`. */
function lastEvent({ end }: Seen, limit: number): number | null {
  const times = [end.time, end.turnaround?.time ?? null]
  return times.find((time) => time !== null && time <= limit) ?? null
}

function topOf({ solution, scales }: Entry, to: number): number {
  const { end } = solution
  const turn = end.turnaround
  if (turn !== null && turn.time <= to) return Math.min(TURNING_TOP, turn.scale * HEADROOM)
  const times = [0.25, 0.5, 0.75, 1].map((part) => part * Math.min(to, end.time ?? to))
  const reached = Math.max(...scales(times).map((scale) => scale ?? PLAIN_TOP), end.kind === 'rip' ? PLAIN_TOP : 0)
  return Math.min(PLAIN_TOP, reached * HEADROOM)
}
