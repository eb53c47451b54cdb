/** Labels at the ends of curves: above the plot, beside it, or next to a cross within it, never one over another. */
import type { Curve, LongView } from './long-view'
import { type Box, clearest, obstaclesOf } from './obstacles'
import type { Frame, Plot } from './plot'
import { spread } from './spread'
import { fitted, textWidth } from './text-width'

export interface Label {
  readonly slot: number
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
/** A phone has room for so much of a name. */
const LONGEST_NAME = { wide: 12, compact: 6.5 }

export function nameOf(curve: Curve, frame: Frame): string {
  return fitted(curve.name, frame.type, frame.type * (frame.compact ? LONGEST_NAME.compact : LONGEST_NAME.wide))
}

export function labelHeight(label: Pick<Label, 'name' | 'note'>, type: number): number {
  return type * ((label.name ? NAME_LINE : 0) + (label.note ? NOTE_LINE : 0))
}

export function labelWidth(label: Pick<Label, 'name' | 'note'>, type: number): number {
  return Math.max(textWidth(label.name, type), textWidth(label.note, type * NOTE_SIZE))
}

/** `free` is where the row above the plot begins, right of the axis title. */
export function placeLabels(view: LongView, plot: Plot, frame: Frame, free: number): readonly Label[] {
  const above = topLabels(view.curves, plot, frame, free)
  const beside = frame.compact ? [] : rightLabels(view.curves, plot, frame)
  const placed = [...above, ...beside]
  const inside = view.curves.flatMap((curve) => insideWishes(curve, frame))
  for (const wish of inside) placed.push(placeInside(wish, view, plot, frame, placed))
  return placed
}

/** The curves that are named above the plot. On a phone that has no room for them all it is none: hue and dash are the key. */
export function namedAbove(curves: readonly Curve[], frame: Frame, free: number): readonly Curve[] {
  const ends = curves.filter((curve) => curve.finish?.edge === 'top')
  return frame.compact && roomAbove(ends, frame, free) < Number.POSITIVE_INFINITY ? [] : ends
}

/** For each label, where not all can have what they need. */
function roomAbove(ends: readonly Curve[], frame: Frame, free: number): number {
  const widths = ends.map((curve) => labelWidth(textsOf(curve, frame), frame.type))
  return sharedRoom(widths, frame.width - free - ends.length * GAP * frame.type)
}

function topLabels(curves: readonly Curve[], plot: Plot, frame: Frame, free: number): Label[] {
  const { type } = frame
  const ends = namedAbove(curves, frame, free)
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
    return { slot: curve.slot, ...(texts[i] ?? EMPTY), anchor: 'middle' as const, x, y, leader }
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

function textsOf(curve: Curve, frame: Frame): { readonly name: string; readonly note: string } {
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
    return { slot: curve.slot, ...(texts[i] ?? EMPTY), anchor: 'start' as const, x, y: middle - length / 2 + 2, leader }
  })
}

interface InsideWish {
  readonly slot: number
  readonly name: string
  readonly note: string
  readonly time: number
  readonly scale: number
}

/** Ends within the plot, and the line of a rip; on a phone also what leaves on the right. */
function insideWishes(curve: Curve, frame: Frame): InsideWish[] {
  const wishes: InsideWish[] = []
  const { finish, slot } = curve
  const own = finish?.edge === 'inside' || (frame.compact && finish?.edge === 'right')
  if (finish && own) wishes.push({ slot, ...textsOf(curve, frame), time: finish.at[0], scale: finish.at[1] })
  if (curve.asymptote !== null) {
    wishes.push({ slot, name: '', note: curve.ending, time: curve.asymptote, scale: Number.POSITIVE_INFINITY })
  }
  return wishes
}

function placeInside(wish: InsideWish, view: LongView, plot: Plot, frame: Frame, placed: readonly Label[]): Label {
  const { type } = frame
  const [width, height] = [labelWidth(wish, type), labelHeight(wish, type)]
  const x = plot.x(wish.time)
  const y = wish.scale === Number.POSITIVE_INFINITY ? plot.top + 0.4 * type : plot.y(wish.scale) - height - 0.3 * type
  const boxes = candidates(x, y, width, height, type)
  const taken = placed.map((label) => boxOf(label, type))
  const best = clearest(boxes, obstaclesOf(view, plot), taken, { ...plot, right: frame.width })
  return {
    ...wish,
    anchor: best.x < x ? 'end' : 'start',
    x: best.x < x ? best.x + width : best.x,
    y: best.y,
    leader: null,
  }
}

/** A label may be so many steps from its end. */
const FARTHEST_STEP = 14

/** To the right and to the left of the end, at ever larger distances up or down. */
function candidates(x: number, y: number, width: number, height: number, type: number): Box[] {
  const steps = Array.from({ length: 2 * FARTHEST_STEP + 1 }, (_, i) => (i % 2 === 0 ? i / 2 : -(i + 1) / 2))
  return steps.flatMap((step) =>
    [x + 0.7 * type, x - 0.7 * type - width].map((left) => ({ x: left, y: y - step * 0.8 * type, width, height })),
  )
}

function boxOf(label: Label, type: number): Box {
  const width = labelWidth(label, type)
  const shift = { start: 0, middle: width / 2, end: width }[label.anchor]
  return { x: label.x - shift, y: label.y, width, height: labelHeight(label, type) }
}
