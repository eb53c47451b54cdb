/** Points of a curve where it bends, cut at the edges of the figure and thinned to what an eye can see. */
import { evenParts } from '../numerics/list'
import { fine, fractionOf, type Range, valueAt } from './scale'

export type Point = readonly [x: number, y: number]

export interface Source {
  /** Values of the horizontal quantity, ascending. */
  readonly places: readonly number[]
  /** The vertical quantity there; null where it has no value. */
  readonly values: (places: readonly number[]) => readonly (number | null)[]
}

/** The two axes of a figure. */
export interface Ranges {
  readonly x: Range
  readonly y: Range
}

/** Steps along a figure. */
export const EVEN = 240
const CROWDED = 28
/** Part of the figure over which points crowd towards an origin or an ending. */
const CROWD = 0.1
/** Points added in a step where a curve leaves through an edge, or beside one where it bends by more than BENT of the axis. */
const REFINED = 12
const BENT = 0.05
/** Largest departure of the drawn line from the sampled one, in parts of the figure: a fifth of a pixel of a thousand. */
const TOLERANCE = 2e-4

/** The visible parts of a curve, each a line without a gap. */
export type Lines = readonly (readonly Point[])[]

export function sampleCurve({ places, values }: Source, ranges: Ranges): Lines {
  const first = samples(places, values)
  const refined = samples(refine(first, ranges.y), values)
  return cut(merge(first, refined), ranges.y).map((segment) => thin(segment, ranges))
}

/** Without the last digits of doubles, which differ from one browser to another: labels find the same places in all of them. */
export const steady = (lines: Lines, { x, y }: Ranges): Lines =>
  lines.map((line) => line.map(([one, other]) => [fine(x, one), fine(y, other)]))

/** Even steps along the axis, crowded about the special places, those included. */
export function placesAlong(x: Range, special: readonly number[]): readonly number[] {
  const crowded = special.flatMap((place) => around(fractionOf(x, place)))
  const fractions = [...evenParts(EVEN), ...crowded].filter((part) => part >= 0 && part <= 1)
  const places = [...fractions.map((part) => valueAt(x, part)), ...special]
  return [...new Set(places)].filter((place) => place >= x.from && place <= x.to).sort((one, other) => one - other)
}

/** Cubic steps: even steps of a where a goes like a root of the time. */
function around(part: number): number[] {
  const steps = Array.from({ length: CROWDED }, (_, i) => CROWD * ((i + 1) / CROWDED) ** 3)
  return steps.flatMap((step) => [part - step, part + step])
}

type Sample = readonly [x: number, y: number | null]

function samples(places: readonly number[], values: Source['values']): Sample[] {
  const found = values(places)
  return places.map((place, i) => [place, finite(found[i])])
}

const finite = (value: number | null | undefined) => (Number.isFinite(value) ? (value ?? null) : null)

/** Below the figure, within it, above it; none where there is no value. */
type Side = -1 | 0 | 1 | null

function sideOf(value: number | null, y: Range): Side {
  if (value === null) return null
  if (y.scaling === 'log' && value <= 0) return -1
  return value > y.to ? 1 : value < y.from ? -1 : 0
}

function refine(found: readonly Sample[], y: Range): number[] {
  const turns = found.map((_, i) => bends(found, i, y))
  return found.flatMap(([place, value], i) => {
    const next = found[i + 1]
    if (!next) return []
    const isPlain = sideOf(value, y) === sideOf(next[1], y) && !turns[i] && !turns[i + 1]
    if (isPlain) return []
    return Array.from({ length: REFINED }, (_, k) => place + ((next[0] - place) * (k + 1)) / (REFINED + 1))
  })
}

/** Does the curve within the figure turn at a sample? */
function bends(found: readonly Sample[], i: number, y: Range): boolean {
  const [before, here, after] = [found[i - 1]?.[1], found[i]?.[1], found[i + 1]?.[1]]
  if (before == null || here == null || after == null || sideOf(here, y) !== 0) return false
  return Math.abs(fractionOf(y, before) - 2 * fractionOf(y, here) + fractionOf(y, after)) > BENT
}

function merge(one: readonly Sample[], other: readonly Sample[]): Sample[] {
  return [...one, ...other].sort((left, right) => left[0] - right[0])
}

/** Splits where the curve is outside or not there; a part that leaves through an edge ends upon it. */
function cut(found: readonly Sample[], y: Range): Point[][] {
  const segments: Point[][] = []
  let open: Point[] = []
  let before: Sample | undefined
  for (const sample of found) {
    const crossing = before && edge(before, sample, y)
    if (crossing) open.push(crossing)
    if (sideOf(sample[1], y) === 0) open.push(sample as Point)
    else {
      if (open.length > 1) segments.push(open)
      open = []
    }
    before = sample
  }
  if (open.length > 1) segments.push(open)
  return segments
}

/** Where the line between two samples, one of them inside, meets an edge. */
function edge([x1, y1]: Sample, [x2, y2]: Sample, y: Range): Point | null {
  const [one, other] = [sideOf(y1, y), sideOf(y2, y)]
  if (y1 === null || y2 === null || one === other || (one !== 0 && other !== 0)) return null
  const at = (one === 0 ? other : one) === 1 ? y.to : y.from
  const [low, high] = [fractionOf(y, y1), fractionOf(y, y2)]
  const part = (fractionOf(y, at) - low) / (high - low)
  return [x1 + (x2 - x1) * (Number.isFinite(part) ? part : one === 0 ? 0 : 1), at]
}

/** Douglas & Peucker 1973, Cartographica 10, 112: drops points that lie on the line through their neighbours. */
function thin(points: readonly Point[], { x, y }: Ranges): Point[] {
  const parts = points.map(([one, other]) => [fractionOf(x, one), fractionOf(y, other)] as const)
  const kept = (from: number, to: number): number[] => {
    const chord = [parts[from], parts[to]] as const
    let [worst, most] = [from, TOLERANCE]
    for (let i = from + 1; i < to; i++) {
      const off = distance(parts[i] as Point, chord[0] as Point, chord[1] as Point)
      if (off > most) [worst, most] = [i, off]
    }
    return worst === from ? [from] : [...kept(from, worst), ...kept(worst, to)]
  }
  const last = points.length - 1
  return [...kept(0, last), last].map((i) => points[i] as Point)
}

/** From a point to a chord. */
function distance(point: Point, first: Point, last: Point): number {
  const [x, y, dx, dy] = [point[0] - first[0], point[1] - first[1], last[0] - first[0], last[1] - first[1]]
  const length = Math.hypot(dx, dy)
  return length === 0 ? Math.hypot(x, y) : Math.abs(x * dy - y * dx) / length
}
