/** The shared window of several histories: every origin, and every ending that falls within reason. */
import type { Solution } from '../solve'
import type { Contents } from './contents'
import type { Range, Scaling } from './scale'

export type Seen = Pick<Solution, 'origin' | 'end' | 'measures'>
/** a at times in Gyr from now, ascending; null where the history does not reach. */
export type Scales = (times: readonly number[]) => readonly (number | null)[]

export interface Entry<S extends Seen = Seen> {
  readonly solution: S
  readonly scales: Scales
  /** What dominates at a time; absent where nobody knows. */
  readonly contents?: (time: number) => Contents | null
}

/** Times in Gyr from now. */
export interface Window extends Range {
  /** Scale factor at the upper edge; the lower one is 0. */
  readonly top: number
}

/** What a person asks of the window. */
export interface Wanted {
  readonly time: 'log' | null
  readonly from: number | null
  readonly to: number | null
}

// All numbers here are tuned by eye.
/** Past longer than this many Hubble times leaves by an arrow. */
const LONGEST_PAST = 12
/** Past without a beginning is shown for this many Hubble times. */
const ETERNAL_PAST = 1.4
/** A bounce shows this part of its time again before it. */
const BEFORE_BOUNCE = 0.6
/** Future without an ending, and the farthest ending, in units of the past. */
const FUTURE = { linear: { plain: 2.4, farthest: 10 }, log: { plain: 30, farthest: 3000 } }
const MARGIN = 1.05
/** Largest scale factors for those that turn and for those that do not. */
const TURNING_TOP = 12
const PLAIN_TOP = 5
const LEAST_TOP = 1.25
const HEADROOM = 1.15
/** The signed logarithm is as good as linear over about this part of the past. */
const NEARLY_LINEAR = 0.07
/** In a range of one's own the figure is as high as all but this part of it. */
const CUT = 0.12
const TRIED = 32

export function windowOf(entries: readonly Entry[], wanted: Wanted = { time: null, from: null, to: null }): Window {
  const past = Math.max(...entries.map(({ solution }) => pastOf(solution)))
  const scaling: Scaling = wanted.time === 'log' ? 'signed-log' : 'linear'
  const future = futureOf(
    entries.map(({ solution }) => solution),
    past,
    wanted.time === 'log' ? FUTURE.log : FUTURE.linear,
  )
  const shape = { scaling, linear: 10 ** Math.round(Math.log10(NEARLY_LINEAR * past)) }
  const [from, to] = [wanted.from ?? -past * MARGIN, wanted.to ?? future]
  if (to <= from || (wanted.from === null && wanted.to === null)) {
    const top = Math.max(LEAST_TOP, ...entries.map((entry) => topOf(entry, future)))
    return { ...shape, from: -past * MARGIN, to: future, top }
  }
  return { ...shape, from, to, top: topWithin(entries, from, to) }
}

function pastOf({ origin, measures }: Seen): number {
  const hubbleTime = measures.hubbleTime.value ?? 1
  if (origin.time === null) return ETERNAL_PAST * hubbleTime
  const before = origin.kind === 'bounce' || origin.kind === 'oscillating' ? 1 + BEFORE_BOUNCE : 1
  return Math.min(-origin.time * before, LONGEST_PAST * hubbleTime)
}

function futureOf(solutions: readonly Seen[], past: number, { plain, farthest }: typeof FUTURE.linear): number {
  const events = solutions.map((one) => lastEvent(one, farthest * past))
  const shown = events.filter((time) => time !== null)
  const least = shown.length === events.length ? 0.5 * past : plain * past
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
  // The last of these times may be that of the end, which a history reaches or not by rounding.
  const sizes = scales(times).map((scale) => scale ?? end.scale ?? PLAIN_TOP)
  const reached = Math.max(...sizes, end.kind === 'rip' ? PLAIN_TOP : 0)
  return Math.min(PLAIN_TOP, reached * HEADROOM)
}

/** High enough for nearly all that happens within a range. */
function topWithin(entries: readonly Entry[], from: number, to: number): number {
  const times = Array.from({ length: TRIED + 1 }, (_, i) => from + ((to - from) * i) / TRIED)
  const found = entries
    .flatMap(({ scales }) => scales(times))
    .filter((scale) => scale !== null && Number.isFinite(scale)) as number[]
  const sorted = found.sort((one, other) => one - other)
  const nearly = sorted[Math.floor((1 - CUT) * (sorted.length - 1))]
  return nearly === undefined ? LEAST_TOP : Math.max(1e-9, Math.min((sorted.at(-1) ?? 1) * HEADROOM, nearly * 1.5))
}
