/**
 * Points of a whole history for drawing, rounded: from the origin, or from the contraction before a bounce, to the end.
 * Each stretch between today, a turning point and an end is walked so that every step moves by about the same part of the
 * stretch in time, in scale factor and in its logarithm together, whichever of them bends.
 */
import { type Arm, FARTHEST } from '../history/arm'
import { type Event, type Phase, sinceNow } from '../history/event'
import type { History } from '../history/history'
import { fromToday, type Place, placeAt, placeElapsed, placeRemaining } from '../history/place'
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
/** Passes that even out the steps. */
const PASSES = 2
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
    const row = [rounded(time), rounded(scale)] as const
    if (row[0] !== rows.at(-1)?.[0]) rows.push(row)
  }
  if (origin.time !== null && origin.scale === 0) add(origin.time, 0)
  for (const event of eventsOf(history)) add(sinceNow(history, event, 'time') * gyr, Math.exp(event.place.N))
  if (end.time !== null && end.scale === 0) add(end.time, 0)
  return { columns: COLUMNS, rows }
}

/** One arm walked in one phase, away from today's size or back to it. */
interface Stretch {
  readonly phase: Phase
  readonly arm: Arm
  readonly outwards: boolean
}

/** In the order of time. */
function stretchesOf({ before, past, future, home }: History): readonly Stretch[] {
  const contraction: readonly Stretch[] = [
    { phase: 'before', arm: before, outwards: false },
    { phase: 'before', arm: past, outwards: true },
  ]
  const expansion: readonly Stretch[] = [
    { phase: 'past', arm: past, outwards: false },
    { phase: 'future', arm: future, outwards: true },
  ]
  const wayBack: readonly Stretch[] = [
    { phase: 'home', arm: future, outwards: false },
    { phase: 'home', arm: home, outwards: true },
  ]
  return [
    ...(past.end.kind === 'root' ? contraction : []),
    ...expansion,
    ...(future.end.kind === 'root' ? wayBack : []),
  ]
}

function eventsOf(history: History): readonly Event[] {
  const stretches = stretchesOf(history)
  const known = new Map<Arm, readonly Place[]>()
  return stretches.flatMap(({ phase, arm, outwards }) => {
    const places = known.get(arm) ?? placesAlong(arm, Math.floor(ROWS / stretches.length))
    known.set(arm, places)
    const sign = phase === 'past' || phase === 'future' ? 1 : -1
    return (outwards ? places : places.toReversed()).map((place) => ({ phase, place, sign, swings: 0 }))
  })
}

/** Places from today to where the arm is followed no further. */
function placesAlong(arm: Arm, count: number): readonly Place[] {
  const reach = reachOf(arm)
  // Towards a turning point the steps in ln a shrink as those of the time do not.
  const distanceAt = (x: number) => reach * (arm.end.kind === 'root' ? x * (2 - x) : x)
  let parts = Array.from({ length: count }, (_, i) => i / (count - 1))
  for (let pass = 0; pass < PASSES; pass++)
    parts = evened(parts, travelled(placesAt(arm, parts.map(distanceAt)), reach))
  return placesAt(arm, parts.map(distanceAt))
}

const placesAt = (arm: Arm, distances: readonly number[]): readonly Place[] =>
  distances.flatMap((m) => placeAt(arm, m) ?? [])

/** How far |ln a| goes. */
function reachOf(arm: Arm): number {
  if (arm.end.kind === 'root') return Math.abs(arm.end.N)
  const ends = Number.isFinite(arm.time.total)
  if (ends && arm.direction < 0) return SMALLEST
  const last = ends ? placeRemaining(arm, 'time', BEFORE_RIP * arm.time.total) : placeElapsed(arm, 'time', LONGEST)
  const reach = last ? Math.abs(last.N) : FARTHEST
  return arm.direction < 0 ? Math.min(reach, SMALLEST) : reach
}

/** At each place, how much of the way is done, by time, scale factor and its logarithm together. */
function travelled(places: readonly Place[], reach: number): readonly number[] {
  const last = places[places.length - 1]
  const [time, change] = [fromToday(last, 'time'), Math.expm1(last.N)]
  return places.map((one) => fromToday(one, 'time') / time + Math.expm1(one.N) / change + Math.abs(one.N) / reach)
}

/** Other parts, at even steps of what was travelled at the old ones. */
function evened(parts: readonly number[], way: readonly number[]): number[] {
  const count = parts.length
  let k = 0
  return parts.map((part, i) => {
    if (i === 0 || i === count - 1) return part
    const goal = (way[count - 1] * i) / (count - 1)
    while (k < count - 2 && way[k + 1] < goal) k++
    const step = way[k + 1] - way[k]
    return parts[k] + (step > 0 ? ((goal - way[k]) / step) * (parts[k + 1] - parts[k]) : 0)
  })
}

/** To a few significant digits, quickly: the factor is a power of ten that is a double. */
function rounded(x: number): number {
  const digits = DIGITS - Math.ceil(Math.log10(Math.abs(x)))
  if (!(digits >= 0 && digits <= 22)) return Number(x.toPrecision(DIGITS))
  const factor = 10 ** digits
  return Math.round(x * factor) / factor
}
