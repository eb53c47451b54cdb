/** Points of a curve where it bends, cut at the edges of the window and thinned to what an eye can see. */
import type { Entry, Window } from './window'

export type Point = readonly [time: number, scale: number]

const EVEN = 200
const CROWDED = 28
/** Part of the window over which points crowd towards an origin or an ending. */
const CROWD = 0.1
/** Points added where a curve leaves through the upper edge. */
const REFINED = 12
/** Largest departure of the drawn line from the sampled one, in parts of the window: a fifth of a pixel of a thousand. */
const TOLERANCE = 2e-4

/** The visible parts of a curve, each a line without a gap. */
export function sampleCurve(entry: Entry, window: Window): readonly (readonly Point[])[] {
  const times = timesOf(entry, window)
  const first = pointsAt(entry, times)
  const refined = pointsAt(entry, refine(first, window.top))
  return cut(merge(first, refined), window.top).map((segment) => thin(segment, window))
}

function timesOf({ solution }: Entry, { from, to }: Window): number[] {
  const span = to - from
  const even = Array.from({ length: EVEN + 1 }, (_, i) => from + (span * i) / EVEN)
  const special = [solution.origin.time, solution.end.time, solution.end.turnaround?.time ?? null]
  const crowded = special.flatMap((time) => (time === null ? [] : around(time, CROWD * span)))
  const all = [...even, ...crowded, 0].filter((time) => time >= from && time <= to)
  return [...new Set(all)].sort((one, other) => one - other)
}

/** Cubic steps: even steps of a where a goes like a root of the time. */
function around(time: number, reach: number): number[] {
  const steps = Array.from({ length: CROWDED }, (_, i) => reach * ((i + 1) / CROWDED) ** 3)
  return [time, ...steps.flatMap((step) => [time - step, time + step])]
}

function pointsAt({ solution, scales }: Entry, times: readonly number[]): Sample[] {
  const values = scales(times)
  const known = new Map(boundary(solution))
  return times.map((time, i) => [time, known.get(time) ?? finite(values[i])])
}

const finite = (scale: number | null | undefined) => (Number.isFinite(scale) ? (scale ?? null) : null)

/** Where the scale factor is known without asking: a limit that the history itself may not include. */
function boundary({ origin, end }: Entry['solution']): Point[] {
  const points: Point[] = []
  if (origin.time !== null) points.push([origin.time, origin.scale])
  if (end.time !== null && end.scale !== null) points.push([end.time, end.scale])
  return points
}

type Sample = readonly [time: number, scale: number | null]

function refine(samples: readonly Sample[], top: number): number[] {
  return samples.flatMap(([time, scale], i) => {
    const next = samples[i + 1]
    if (!next || above(scale, top) === above(next[1], top)) return []
    return Array.from({ length: REFINED }, (_, k) => time + ((next[0] - time) * (k + 1)) / (REFINED + 1))
  })
}

function above(scale: number | null, top: number): boolean {
  return scale === null || scale > top
}

function merge(one: readonly Sample[], other: readonly Sample[]): Sample[] {
  return [...one, ...other].sort((left, right) => left[0] - right[0])
}

/** Splits where the curve is above the window or not there; a part that leaves through the upper edge ends upon it. */
function cut(samples: readonly Sample[], top: number): Point[][] {
  const segments: Point[][] = []
  let open: Point[] = []
  let before: Sample | undefined
  for (const sample of samples) {
    const [time, scale] = sample
    const crossing = before && edge(before, sample, top)
    if (crossing) open.push(crossing)
    if (above(scale, top)) {
      if (open.length > 1) segments.push(open)
      open = []
    } else open.push([time, scale as number])
    before = sample
  }
  if (open.length > 1) segments.push(open)
  return segments
}

function edge([t1, a1]: Sample, [t2, a2]: Sample, top: number): Point | null {
  if (a1 === null || a2 === null || a1 > top === a2 > top) return null
  return [t1 + ((t2 - t1) * (top - a1)) / (a2 - a1), top]
}

/** Douglas & Peucker 1973, Cartographica 10, 112: drops points that lie on the line through their neighbours. */
function thin(points: readonly Point[], window: Window): Point[] {
  const [first, last] = [points[0], points.at(-1)]
  if (!first || !last || points.length < 3) return [...points]
  const distances = points.map((point) => distance(point, first, last, window))
  const worst = distances.indexOf(Math.max(...distances))
  if ((distances[worst] ?? 0) <= TOLERANCE) return [first, last]
  return [...thin(points.slice(0, worst + 1), window).slice(0, -1), ...thin(points.slice(worst), window)]
}

/** From the point to the chord, both axes in parts of the window. */
function distance(point: Point, first: Point, last: Point, { from, to, top }: Window): number {
  const [x, y, dx, dy] = [
    (point[0] - first[0]) / (to - from),
    (point[1] - first[1]) / top,
    (last[0] - first[0]) / (to - from),
    (last[1] - first[1]) / top,
  ]
  const length = Math.hypot(dx, dy)
  return length === 0 ? Math.hypot(x, y) : Math.abs(x * dy - y * dx) / length
}
