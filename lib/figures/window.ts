/** The shared window of several histories: every origin, every turn and ending that falls within reason, else what is seen of the rest. */
import { evenParts } from '../numerics/list'
import type { Solution } from '../solve'
import type { Eras } from './eras'
import type { Lines, Ranges } from './sample'
import { type Range, roundStep, type Scaling } from './scale'

export type Seen = Pick<Solution, 'origin' | 'end' | 'measures'>
/** a at times in Gyr from now, ascending; null where the history does not reach. */
export type Scales = (times: readonly number[]) => readonly (number | null)[]

export interface Entry<S extends Seen = Seen> {
  readonly solution: S
  readonly scales: Scales
  /** The visible parts of its curve. */
  readonly lines: (ranges: Ranges) => Lines
  /** What dominates when; absent where nobody knows. */
  readonly eras?: (x: Range) => Eras
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
/** Future without an ending, the farthest ending, and the farthest turn, in units of the past. */
const FUTURE = { linear: { plain: 2.4, farthest: 10, turn: 16 }, log: { plain: 30, farthest: 3000, turn: 3000 } }
/** However soon a curve leaves through the top. */
const LEAST_FUTURE = 0.5
const MARGIN = 1.05
/** A turn is followed so much longer, to be seen as one. */
const AFTER_TURN = 1.25
/** Beyond the place where the last curve leaves through the top. */
const AFTER_TOP = 1.25
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
const STEPS = 60

export function windowOf(entries: readonly Entry[], wanted: Wanted = { time: null, from: null, to: null }): Window {
  const beginning = -outwards(MARGIN * Math.max(...entries.map(({ solution }) => pastOf(solution))))
  const past = -beginning / MARGIN
  const scaling: Scaling = wanted.time === 'log' ? 'signed-log' : 'linear'
  const future = outwards(futureOf(entries, past, wanted.time === 'log' ? FUTURE.log : FUTURE.linear))
  const shape = { scaling, linear: 10 ** Math.round(Math.log10(NEARLY_LINEAR * past)) }
  const [from, to] = [wanted.from ?? beginning, wanted.to ?? future]
  if (to <= from || (wanted.from === null && wanted.to === null)) {
    const top = outwards(Math.max(LEAST_TOP, ...entries.map((entry) => topOf(entry, future))))
    return { ...shape, from: beginning, to: future, top }
  }
  return { ...shape, from, to, top: topWithin(entries, from, to) }
}

/**
 * The next of round numbers that lie two to five parts in a hundred apart: while one scenario changes, the axes stand still for a
 * while and leave the others where they are.
 */
export function outwards(size: number): number {
  const step = roundStep(size / 50)
  return Number((step * Math.ceil(size / step - 1e-9)).toPrecision(12))
}

function pastOf({ origin, measures }: Seen): number {
  const hubbleTime = measures.hubbleTime.value ?? 1
  if (origin.time === null) return ETERNAL_PAST * hubbleTime
  const before = origin.kind === 'bounce' || origin.kind === 'oscillating' ? 1 + BEFORE_BOUNCE : 1
  return Math.min(-origin.time * before, LONGEST_PAST * hubbleTime)
}

type Future = typeof FUTURE.linear

function futureOf(entries: readonly Entry[], past: number, kind: Future): number {
  const futures = entries.map((entry) => shownEvent(entry.solution, past, kind) ?? plainFuture(entry, past, kind))
  return Math.max(LEAST_FUTURE * past, ...futures)
}

/** Until after the ending; where that is too far until after the turn, and as far as an ending might be. */
function shownEvent({ end }: Seen, past: number, { farthest, turn }: Future): number | null {
  if (end.time !== null && end.time <= farthest * past) return end.time * MARGIN
  if (end.turnaround === null || end.turnaround.time > turn * past) return null
  return Math.max(end.turnaround.time * AFTER_TURN, end.time === null ? 0 : farthest * past)
}

/** Until the curve has left through the top, or so far that its course is clear: where it turns later, as far as a turn might be. */
function plainFuture({ scales, solution }: Entry, past: number, kind: Future): number {
  const turns = (solution.end.turnaround?.scale ?? Number.POSITIVE_INFINITY) <= TURNING_TOP
  const plain = turns ? kind.turn * AFTER_TURN : kind.plain
  const step = (plain * past) / STEPS
  const sizes = scales(Array.from({ length: STEPS + 1 }, (_, i) => i * step))
  const left = sizes.findIndex((size) => size === null || size > PLAIN_TOP)
  if (left < 1) return plain * past
  const [before, after] = [sizes[left - 1] ?? 0, sizes[left] ?? Number.POSITIVE_INFINITY]
  const part = Number.isFinite(after) ? (PLAIN_TOP - before) / (after - before) : 1
  return Math.min(plain * past, (left - 1 + part) * step * AFTER_TOP)
}

function topOf({ solution, scales }: Entry, to: number): number {
  const { end } = solution
  const turn = end.turnaround
  if (turn !== null && turn.time <= to) return Math.min(TURNING_TOP, turn.scale * HEADROOM)
  const times = [0.25, 0.5, 0.75, 1].map((part) => part * Math.min(to, end.time ?? to))
  // The last of these times may be that of the end, which a history reaches or not by rounding.
  const sizes = scales(times).map((scale) => scale ?? end.scale ?? PLAIN_TOP)
  const reached = Math.max(...sizes, end.kind === 'rip' ? PLAIN_TOP : 0)
  // An ending at a size is seen at that size.
  const ending = end.time !== null && end.time <= to ? Math.min(TURNING_TOP, (end.scale ?? 0) * HEADROOM) : 0
  return Math.max(ending, Math.min(PLAIN_TOP, reached * HEADROOM))
}

/** High enough for nearly all that happens within a range. */
function topWithin(entries: readonly Entry[], from: number, to: number): number {
  const times = evenParts(TRIED).map((part) => from + (to - from) * part)
  const found = entries
    .flatMap(({ scales }) => scales(times))
    .filter((scale) => scale !== null && Number.isFinite(scale)) as number[]
  const sorted = found.sort((one, other) => one - other)
  const nearly = sorted[Math.floor((1 - CUT) * (sorted.length - 1))]
  return nearly === undefined ? LEAST_TOP : Math.max(1e-9, Math.min((sorted.at(-1) ?? 1) * HEADROOM, nearly * 1.5))
}
