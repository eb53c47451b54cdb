/** Labels at the ends of curves: above the plot, beside it, or next to a mark within it, never one over another. */
import type { Chart, Curve } from './chart'
import { insideLabels } from './inside-labels'
import {
  boxOf,
  type Label,
  labelHeight,
  labelWidth,
  NOTE_SIZE,
  swatchWidth,
  type Texts,
  textsOf,
  toneOf,
} from './label'
import { costOf, coverOf, obstaclesOf } from './obstacles'
import type { Frame, Plot } from './plot'
import { rowsOf } from './rows'
import { spread } from './spread'
import { fitted } from './text-width'

/** Between names, in units of the type. */
const GAP = 0.9
/** A line from the row above the plot to an end so far left of it would strike through the title of the axis. */
const UNDER_TITLE = 3
/** Less of a name is no name. */
const SHORTEST_NAME = 5

type Drawn = Pick<Chart, 'curves' | 'spots' | 'now' | 'x' | 'references' | 'ribbons'>

/** `free` is where the row above the plot begins, right of the axis title. */
export function placeLabels(chart: Drawn, plot: Plot, frame: Frame, free: number): readonly Label[] {
  const ends = namedAbove(chart.curves, frame, free)
  const below = ends.filter(({ finish }) => plot.x(finish?.at[0] ?? 0) < free - UNDER_TITLE * frame.type)
  // Ribbons bear hue and dash of every curve; without them a curve that has no room above is named within.
  if (ends.length === 0 && chart.ribbons.length === 0) below.push(...chart.curves.filter(leavesAbove))
  const above = topLabels(
    ends.filter((curve) => !below.includes(curve)),
    plot,
    frame,
    free,
  )
  const beside = frame.compact ? [] : rightLabels(chart.curves, plot, frame)
  const placed = [...above, ...beside]
  placed.push(...insideLabels(chart, plot, frame, { placed, below }))
  return frame.compact ? [...placed, ...withinRight(chart, plot, frame, placed)] : placed
}

const leavesAbove = ({ finish }: Curve): boolean => finish?.edge === 'top'

/** The curves that are named above the plot. On a phone that has no room for them all it is none: hue and dash are the key. */
export function namedAbove(curves: readonly Curve[], frame: Frame, free: number): readonly Curve[] {
  const ends = curves.filter(leavesAbove)
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

function shortened(text: Texts, room: number, type: number): Texts {
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

interface RightEnd {
  readonly curve: Curve
  readonly texts: Texts
  /** Where the curve ends. */
  readonly at: number
  readonly height: number
}

/** Without room beside the plot: right-aligned within it, in the order of the ends; with strokes where a name is nearer to another. */
function withinRight(chart: Drawn, plot: Plot, frame: Frame, placed: readonly Label[]): Label[] {
  const { type } = frame
  const ends = chart.curves
    .filter((curve) => curve.finish?.edge === 'right')
    .map((curve): RightEnd => {
      const texts = textsOf(curve, frame)
      return { curve, texts, at: plot.y(curve.finish?.at[1] ?? 0), height: labelHeight(texts, type) }
    })
    .sort((one, other) => one.at - other.at)
  if (ends.length === 0) return []
  const right = plot.right - 0.7 * type
  const taken = placed.map((label) => boxOf(label, type))
  const way = { covered: coverOf(obstaclesOf(chart, plot)), lines: [], taken, edges: plot }
  const topsWith = (more: number) => {
    const rows = ends.map(({ texts, at, height }) => {
      const width = labelWidth(texts, type) + more
      const cost = (y: number) =>
        AWAY * Math.abs(y + height / 2 - at) + costOf({ x: right - width, y, width, height }, way)
      return { height, cost }
    })
    return rowsOf(rows, plot.top, plot.bottom)
  }
  const plain = topsWith(0)
  const stray = isAstray(ends, plain)
  const tops = stray ? topsWith(swatchWidth(type)) : plain
  return ends.map(({ curve, texts }, i) => ({
    tone: toneOf(curve),
    ...texts,
    anchor: 'end',
    x: right,
    y: tops[i] as number,
    leader: null,
    swatch: stray ? curve : undefined,
  }))
}

/** Is any name nearer to the end of another curve than to that of its own? */
function isAstray(ends: readonly RightEnd[], tops: readonly number[]): boolean {
  return ends.some(({ at, height }, i) => {
    const middle = (tops[i] as number) + height / 2
    return ends.some((other) => Math.abs(middle - other.at) < Math.abs(middle - at))
  })
}
