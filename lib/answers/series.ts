/**
 * Points of a whole history for drawing, rounded: from the origin, or from the contraction before a bounce, to the end.
 * Each stretch between today, a turning point and an end is walked so that every step moves by about the same part of the
 * stretch in time, in scale factor and in its logarithm together, whichever of them bends.
 */
import type { Arm } from '../history/arm'
import type { History } from '../history/history'
import { farthestOf, fromToday, placeAt, placeElapsed, placeRemaining } from '../history/place'
import { FARTHEST } from '../history/turning'
import type { Solution } from '../solve'
import { hubbleTimeGyr } from '../units'

// Tuned by eye.
const ROWS = 240
/** |ln a| at the smallest scale factor on the way to a = 0. */
const SMALLEST = -Math.log(1e-4)
/** What has no end in time is followed for this many Hubble times. */
const LONGEST = 5
/** A rip is followed until this part of the way to it is left. */
const BEFORE_RIP = 1e-3
/** Places that are tried, to see where the steps have to be short. */
const TRIED = 40
const DIGITS = 7

const COLUMNS = [
  { name: 'time', unit: 'Gyr', label: 'time from now' },
  { name: 'scale', unit: '', label: 'scale factor' },
] as const

type Row = readonly [time: number, scale: number]

export function seriesOf({
  history,
  scenario,
  origin,
  end,
}: Pick<Solution, 'history' | 'scenario' | 'origin' | 'end'>) {
  const gyr = hubbleTimeGyr(scenario.h0)
  const rows: Row[] = []
  const add = (time: number, scale: number) => {
    if (!Number.isFinite(time) || !Number.isFinite(scale)) return
    const shown = rounded(time)
    if (rows.length === 0 || shown !== rows[rows.length - 1][0]) rows.push([shown, rounded(scale)])
  }
  if (origin.time !== null && origin.scale === 0) add(origin.time, 0)
  const stretches = stretchesOf(history)
  const known = new Map<Arm, readonly Point[]>()
  for (const { arm, mirror, sign, outwards } of stretches) {
    const points = known.get(arm) ?? pointsAlong(arm, Math.floor(ROWS / stretches.length))
    known.set(arm, points)
    for (const { elapsed, scale } of outwards ? points : points.toReversed()) {
      add(gyr * (mirror + sign * elapsed), scale)
    }
  }
  if (end.time !== null && end.scale === 0) {
    // The last points may lie so near to the end that rounding moves them upon it.
    while (rows.length > 1 && rows[rows.length - 1][0] >= rounded(end.time)) rows.pop()
    add(end.time, 0)
  }
  return { columns: COLUMNS, rows }
}

/** A stretch is one arm, or its mirror image: its times are `mirror` + `sign` × the time from today along the arm. */
interface Stretch {
  readonly arm: Arm
  readonly mirror: number
  readonly sign: 1 | -1
  /** Whether time runs along it away from today's size. */
  readonly outwards: boolean
}

/** In the order of time. `back` is when the universe is of today's size again. */
function stretchesOf({ before, past, future, descent, home, unfollowed }: History): readonly Stretch[] {
  const [bounce, back] = [-2 * past.time.total, future.time.total + descent.time.total]
  const contraction: readonly Stretch[] = [
    { arm: before, mirror: bounce, sign: -1, outwards: false },
    { arm: past, mirror: bounce, sign: 1, outwards: true },
  ]
  const wayBack: readonly Stretch[] = [
    { arm: descent, mirror: back, sign: -1, outwards: false },
    { arm: home, mirror: back, sign: 1, outwards: true },
  ]
  return [
    ...(past.end.kind === 'root' ? contraction : []),
    { arm: past, mirror: 0, sign: -1, outwards: false },
    { arm: future, mirror: 0, sign: 1, outwards: true },
    ...(future.end.kind === 'root' && !unfollowed ? wayBack : []),
  ]
}

interface Point {
  /** From today along the arm, in 1/H₀. */
  readonly elapsed: number
  readonly scale: number
}

/** Points from today to where the arm is followed no further. */
function pointsAlong(arm: Arm, count: number): readonly Point[] {
  const reach = reachOf(arm)
  const way = triedAlong(arm, reach)
  const points: Point[] = []
  let k = 0
  for (let i = 0; i < count; i++) {
    // The part of the arm at which this share of the way is done; the way is known at even parts.
    const goal = (way[TRIED] * i) / (count - 1)
    while (k < TRIED - 1 && way[k + 1] < goal) k++
    const step = way[k + 1] - way[k]
    const part = Math.min(1, (k + (step > 0 ? (goal - way[k]) / step : 0)) / TRIED)
    const place = placeAt(arm, distanceAt(arm, reach, part))
    if (place) points.push({ elapsed: fromToday(place, 'time'), scale: Math.exp(place.N) })
  }
  return points
}

/** |ln a| at the part x of an arm; towards a turning point, where time passes while a stands still, its steps shrink. */
const distanceAt = ({ end }: Arm, reach: number, x: number): number => reach * (end.kind === 'none' ? x : x * (2 - x))

/** How far |ln a| goes. */
function reachOf(arm: Arm): number {
  if (arm.end.kind !== 'none' && arm.end.kind !== 'double') return Math.min(FARTHEST, Math.abs(arm.end.N))
  const ends = Number.isFinite(arm.time.total)
  if (ends && arm.direction < 0) return SMALLEST
  const last = ends ? placeRemaining(arm, 'time', BEFORE_RIP * arm.time.total) : placeElapsed(arm, 'time', LONGEST)
  const reach = Math.min(last ? Math.abs(last.N) : FARTHEST, farthestOf(arm))
  return arm.direction < 0 ? Math.min(reach, SMALLEST) : reach
}

/** At even parts of an arm, how much of the way is done, by time, scale factor and its logarithm together. */
function triedAlong(arm: Arm, reach: number): Float64Array {
  const way = new Float64Array(TRIED + 1)
  const last = placeAt(arm, reach)
  if (!last) return way
  const [time, change] = [fromToday(last, 'time'), Math.expm1(last.N)]
  for (let i = 1; i <= TRIED; i++) {
    const place = placeAt(arm, distanceAt(arm, reach, i / TRIED)) ?? last
    way[i] = fromToday(place, 'time') / time + Math.expm1(place.N) / change + Math.abs(place.N) / reach
  }
  return way
}

const POWERS = Array.from({ length: 23 }, (_, i) => 10 ** i)

/** To a few significant digits, quickly where the power of ten is a double. */
function rounded(x: number): number {
  const power = POWERS[DIGITS - Math.ceil(Math.log10(Math.abs(x)))]
  return power === undefined ? Number(x.toPrecision(DIGITS)) : Math.round(x * power) / power
}
