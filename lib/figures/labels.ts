/** Labels at the ends of curves: above the plot, beside it, or next to a mark within it, never one over another. */
import type { Chart, Curve } from './chart'
import { alongLine, type Box, clearest, costOf, obstaclesOf, type Spot } from './obstacles'
import type { Frame, Plot } from './plot'
import { rowsOf } from './rows'
import type { Point } from './sample'
import { spread } from './spread'
import { fitted, textWidth } from './text-width'

export interface Label {
  readonly tone: string
  /** Empty where only the note is set. */
  readonly name: string
  readonly note: string
  readonly anchor: 'start' | 'middle' | 'end'
  readonly x: number
  /** Upper edge. */
  readonly y: number
  /** From the label to the end of its curve, where they are apart. */
  readonly leader: readonly [x1: number, y1: number, x2: number, y2: number] | null
}

/** Line heights and sizes in units of the type. */
export const NAME_LINE = 1.2
export const NOTE_LINE = 1.1
export const NOTE_SIZE = 0.86
const GAP = 0.9
/** A line from the row above the plot to an end so far left of it would strike through the title of the axis. */
const UNDER_TITLE = 3
/** There is room for so much of a name, and less of it is no name. */
const LONGEST_NAME = 13
const SHORTEST_NAME = 5

function nameOf({ name }: Curve, { type }: Frame): string {
  return fitted(name, type, LONGEST_NAME * type)
}

export function labelHeight(label: Pick<Label, 'name' | 'note'>, type: number): number {
  return type * ((label.name ? NAME_LINE : 0) + (label.note ? NOTE_LINE : 0))
}

export function labelWidth(label: Pick<Label, 'name' | 'note'>, type: number): number {
  return Math.max(textWidth(label.name, type), textWidth(label.note, type * NOTE_SIZE))
}

type Drawn = Pick<Chart, 'curves' | 'spots' | 'now' | 'x' | 'references'>

/** `free` is where the row above the plot begins, right of the axis title. */
export function placeLabels(chart: Drawn, plot: Plot, frame: Frame, free: number): readonly Label[] {
  const ends = namedAbove(chart.curves, frame, free)
  const below = ends.filter(({ finish }) => plot.x(finish?.at[0] ?? 0) < free - UNDER_TITLE * frame.type)
  const above = topLabels(
    ends.filter((curve) => !below.includes(curve)),
    plot,
    frame,
    free,
  )
  const beside = frame.compact ? [] : rightLabels(chart.curves, plot, frame)
  const placed = [...above, ...beside]
  const inside = [
    ...spotWishes(chart, plot, frame),
    ...chart.curves.flatMap((curve) => insideWishes(curve, plot, frame, below.includes(curve))),
  ]
  const levels = levelWishes(chart, plot, frame)
  const spots = inside.length + levels.length > 0 ? obstaclesOf(chart, plot) : []
  const boxes = () => placed.map((label) => boxOf(label, frame.type))
  for (const wish of [...levels, ...inside]) placed.push(placeInside(wish, spots, plot, frame, boxes()))
  return frame.compact ? [...placed, ...withinRight(chart, plot, frame, boxes())] : placed
}

/** The curves that are named above the plot. On a phone that has no room for them all it is none: hue and dash are the key. */
export function namedAbove(curves: readonly Curve[], frame: Frame, free: number): readonly Curve[] {
  const ends = curves.filter((curve) => curve.finish?.edge === 'top')
  return frame.compact && roomAbove(ends, frame, free) < SHORTEST_NAME * frame.type ? [] : ends
}

/** For each label, where not all can have what they need. */
function roomAbove(ends: readonly Curve[], frame: Frame, free: number): number {
  const widths = ends.map((curve) => labelWidth(textsOf(curve, frame), frame.type))
  return sharedRoom(widths, frame.width - free - ends.length * GAP * frame.type)
}

function topLabels(ends: readonly Curve[], plot: Plot, frame: Frame, free: number): Label[] {
  const { type } = frame
  const room = roomAbove(ends, frame, free)
  const texts = ends.map((curve) => shortened(textsOf(curve, frame), room, type))
  const wishes = ends.map((curve, i) => ({
    middle: plot.x(curve.finish?.at[0] ?? 0),
    length: labelWidth(texts[i] ?? EMPTY, type) + GAP * type,
  }))
  const middles = spread(wishes, free, frame.width)
  return ends.map((curve, i) => {
    const x = middles[i] ?? 0
    const half = (wishes[i]?.length ?? 0) / 2 - GAP * type
    const target = wishes[i]?.middle ?? 0
    const y = plot.top - 0.9 * type - labelHeight(texts[i] ?? EMPTY, type)
    const foot = plot.top - 0.9 * type + 2
    const leader = [Math.max(x - half, Math.min(x + half, target)), foot, target, plot.top - 2] as const
    return { tone: toneOf(curve), ...(texts[i] ?? EMPTY), anchor: 'middle' as const, x, y, leader }
  })
}

/** The greatest width such that all fit when the longer ones are cut to it. */
function sharedRoom(widths: readonly number[], total: number): number {
  let left = total
  const ascending = [...widths].sort((one, other) => one - other)
  for (const [i, width] of ascending.entries()) {
    const share = left / (ascending.length - i)
    if (width > share) return share
    left -= width
  }
  return Number.POSITIVE_INFINITY
}

const EMPTY = { name: '', note: '' }

const toneOf = ({ tone, strong }: Curve): string => (strong ? tone : `${tone} quiet`)

/** What a curve is labelled with; on a phone its name alone. */
export function textsOf(curve: Curve, frame: Frame): { readonly name: string; readonly note: string } {
  return { name: nameOf(curve, frame), note: frame.compact ? '' : curve.note }
}

function shortened(text: { readonly name: string; readonly note: string }, room: number, type: number) {
  return { name: fitted(text.name, type, room), note: fitted(text.note, type * NOTE_SIZE, room) }
}

function rightLabels(curves: readonly Curve[], plot: Plot, frame: Frame): Label[] {
  const ends = curves.filter((curve) => curve.finish?.edge === 'right')
  const texts = ends.map((curve) => textsOf(curve, frame))
  const wishes = ends.map((curve, i) => ({
    middle: plot.y(curve.finish?.at[1] ?? 0),
    length: labelHeight(texts[i] ?? EMPTY, frame.type) + 4,
  }))
  const middles = spread(wishes, plot.top - frame.type, plot.bottom)
  return ends.map((curve, i) => {
    const length = wishes[i]?.length ?? 0
    const [middle, target] = [middles[i] ?? 0, wishes[i]?.middle ?? 0]
    const x = plot.right + 0.9 * frame.type
    const leader = Math.abs(middle - target) > length / 3 ? ([x - 3, middle, plot.right + 2, target] as const) : null
    const texted = texts[i] ?? EMPTY
    return { tone: toneOf(curve), ...texted, anchor: 'start' as const, x, y: middle - length / 2 + 2, leader }
  })
}

/** Worth of a pixel between a name and the end of its curve. Tuned by eye. */
const AWAY = 0.5

/** Without room beside the plot: right-aligned within it, in the order of the ends. */
function withinRight(chart: Drawn, plot: Plot, frame: Frame, taken: readonly Box[]): Label[] {
  const { type } = frame
  const ends = chart.curves
    .filter((curve) => curve.finish?.edge === 'right')
    .map((curve) => ({ curve, texts: textsOf(curve, frame), at: plot.y(curve.finish?.at[1] ?? 0) }))
    .sort((one, other) => one.at - other.at)
  if (ends.length === 0) return []
  const right = plot.right - 0.7 * type
  const widest = Math.max(...ends.map(({ texts }) => labelWidth(texts, type)))
  const spots = obstaclesOf(chart, plot).filter(([x]) => x > right - widest - type)
  const rows = ends.map(({ texts, at }) => {
    const [width, height] = [labelWidth(texts, type), labelHeight(texts, type)]
    const cost = (y: number) =>
      AWAY * Math.abs(y + height / 2 - at) + costOf({ x: right - width, y, width, height }, spots, taken, plot)
    return { height, cost }
  })
  const edges = rowsOf(rows, plot.top, plot.bottom)
  return ends.map(({ curve, texts }, i) => {
    return { tone: toneOf(curve), ...texts, anchor: 'end' as const, x: right, y: edges[i] as number, leader: null }
  })
}

interface InsideWish {
  readonly tone: string
  readonly name: string
  readonly note: string
  /** Where the label may be, the best places first; `of` is where its curve is. */
  readonly places: (width: number, height: number) => readonly Place[]
  /** The point from which a line leads to a label that has no room beside it. */
  readonly from?: Spot
}

interface Place extends Box {
  readonly of: number
}

/**
 * Ends within the plot, the line of a rip, and what is named along its way.
 * `below`: it leaves at the top, where the title of the axis stands.
 */
function insideWishes(curve: Curve, plot: Plot, frame: Frame, below: boolean): InsideWish[] {
  const { finish, asymptote } = curve
  const [tone, texts] = [toneOf(curve), textsOf(curve, frame)]
  const wishes: InsideWish[] = []
  if (finish?.edge === 'along') wishes.push({ tone, ...texts, places: alongCurve(curve, plot, frame) })
  else if (finish && (below || finish.edge === 'inside'))
    wishes.push({
      tone,
      ...texts,
      places: besidePoint(finish.at, plot, frame),
      ...(below ? { from: spotOf(finish.at, plot) } : {}),
    })
  if (asymptote !== null) {
    const places = besidePoint([asymptote.at, Number.POSITIVE_INFINITY], plot, frame)
    wishes.push({ tone, name: '', note: asymptote.label, places })
  }
  return wishes
}

function spotWishes({ spots }: Drawn, plot: Plot, frame: Frame): InsideWish[] {
  const named = spots.filter(({ label }) => label !== '')
  return named.map(({ tone, at, label }) => {
    return { tone, name: '', note: label, places: besidePoint(at, plot, frame), from: spotOf(at, plot) }
  })
}

/** Words at a line across the figure, above or below it, from the right. */
function levelWishes({ references }: Drawn, plot: Plot, { type, compact }: Frame): InsideWish[] {
  const named = references.filter(({ axis, label }) => axis === 'y' && label !== '')
  return named.map(({ at, label, short = label }) => {
    const places = (width: number, height: number) => {
      const room = plot.right - plot.left - width - 0.8 * type
      const rows = [plot.y(at) - height - 0.15 * type, plot.y(at) + 0.15 * type]
      const steps = Array.from(
        { length: LEVEL_STEPS + 1 },
        (_, i) => plot.right - 0.4 * type - width - (room * i) / LEVEL_STEPS,
      )
      return steps.flatMap((x) => rows.map((y) => ({ x, y, width, height, of: x })))
    }
    return { tone: 'part-level', name: '', note: compact ? short : label, places }
  })
}

/** So many places along the line are tried. */
const LEVEL_STEPS = 24

const spotOf = ([x, y]: Point, plot: Plot): Spot => [plot.x(x), plot.y(y)]

function placeInside(wish: InsideWish, spots: readonly Spot[], plot: Plot, frame: Frame, taken: readonly Box[]): Label {
  const { tone, name, note } = wish
  const places = wish.places(labelWidth(wish, frame.type), labelHeight(wish, frame.type))
  const best = clearest(places, spots, taken, { ...plot, right: frame.width })
  const anchor: Label['anchor'] = best.x + best.width / 2 < best.of ? 'end' : 'start'
  const leader = wish.from ? leaderOf(wish.from, best, frame.type) : null
  return { tone, name, note, anchor, x: anchor === 'end' ? best.x + best.width : best.x, y: best.y, leader }
}

/** Farther away than this many units of type nobody would know what a label is of. */
const APART = 1

function leaderOf([x, y]: Spot, box: Box, type: number): Label['leader'] {
  const nearX = Math.max(box.x, Math.min(box.x + box.width, x))
  const nearY = Math.max(box.y, Math.min(box.y + box.height, y))
  return Math.hypot(nearX - x, nearY - y) > APART * type ? [nearX, nearY, x, y] : null
}

/** A label may be so many steps from its end. */
const FARTHEST_STEP = 14

/** To the right and to the left of the end, at ever larger distances up or down. */
function besidePoint(at: Point, plot: Plot, { type }: Frame): InsideWish['places'] {
  const steps = Array.from({ length: 2 * FARTHEST_STEP + 1 }, (_, i) => (i % 2 === 0 ? i / 2 : -(i + 1) / 2))
  const of = plot.x(at[0])
  return (width, height) => {
    const y = at[1] === Number.POSITIVE_INFINITY ? plot.top + 0.4 * type : plot.y(at[1]) - height - 0.3 * type
    return steps.flatMap((step) =>
      [of + 0.7 * type, of - 0.7 * type - width, of - width / 2].map((x) => ({
        x,
        y: y - step * 0.8 * type,
        width,
        height,
        of,
      })),
    )
  }
}

/** Parts of the visible curve at which it may be named, the best first. */
const PARTS = [0.6, 0.7, 0.5, 0.8, 0.4, 0.3, 0.9, 0.2, 0.1]

/** Close above or below the curve. */
function alongCurve({ segments }: Curve, plot: Plot, { type }: Frame): InsideWish['places'] {
  const way = alongLine(segments.flat().map(([x, y]) => [plot.x(x), plot.y(y)] as const))
  const gap = 0.35 * type
  return (width, height) =>
    PARTS.flatMap((part) => {
      const [of, y] = way[Math.floor(part * (way.length - 1))] ?? [0, 0]
      const rows = [y - height - gap, y + gap]
      return rows.flatMap((top) =>
        [of - width / 2, of + gap, of - width - gap].map((x) => ({ x, y: top, width, height, of: x + width / 2 })),
      )
    })
}

function boxOf(label: Label, type: number): Box {
  const width = labelWidth(label, type)
  const shift = { start: 0, middle: width / 2, end: width }[label.anchor]
  return { x: label.x - shift, y: label.y, width, height: labelHeight(label, type) }
}
