/** Both axes, the grid, lines of reference, and the line of now. */
import type { Axis, Chart, Reference } from './chart'
import { titleOf } from './draw-text'
import type { Frame, Plot } from './plot'
import { fractionOf } from './scale'
import { px, type SvgNode, svg } from './svg'
import { textWidth } from './text-width'
import { type Tick, ticksOf } from './ticks'

/** About so many units of type per tick. */
const ACROSS = { wide: 8, compact: 6 }
const UP = 4
/** Least room between the texts of two ticks, in units of the type. */
const APART = 1
/** Size of axis text in units of the type. */
export const SMALL = 0.9

type Axes = Pick<Chart, 'x' | 'y' | 'now' | 'references'>

/** `inRow`: the title of the horizontal axis stands beside the ticks, else below them. */
export function drawAxes(chart: Axes, plot: Plot, frame: Frame, inRow: boolean): SvgNode {
  const size = px(frame.type * SMALL)
  return svg(
    'g',
    {},
    ...upright(chart.y, plot, frame, size),
    ...chart.references.map((one) => reference(one, plot)),
    ...level(chart, plot, frame, size),
    svg('text', { ...headOf(frame, plot), 'font-size': size, class: 'axis' }, ...titleOf(chart.y, size)),
    title(chart.x, plot, frame, size, inRow),
    ...today(chart.now, chart.x, plot),
  )
}

/** Where the title of the vertical axis begins: on a phone above its ticks, and clear of the highest of them. */
function headOf({ compact, type }: Frame, plot: Plot): { readonly x: number; readonly y: number } {
  return compact ? { x: 0, y: px(plot.top - 0.85 * type) } : { x: plot.left, y: px(plot.top - 0.55 * type) }
}

/** Ticks of the vertical axis, also for those who ask how wide they are. */
export function uprightTicks(y: Axis, height: number, { type }: Pick<Frame, 'type'>): Tick[] {
  const count = Math.max(2, Math.round(height / (UP * type)))
  return ticksOf(y, null, count, () => (1.5 * type) / height)
}

function upright(y: Axis, plot: Plot, frame: Frame, size: number): SvgNode[] {
  const { type } = frame
  return uprightTicks(y, plot.bottom - plot.top, frame).flatMap(({ at, text }) => {
    const height = plot.y(at)
    const base = at === 0 && y.from === 0
    const line = svg('line', {
      x1: plot.left,
      x2: plot.right,
      y1: height,
      y2: height,
      class: base ? 'base' : 'grid',
    })
    const place = {
      x: px(plot.left - 0.7 * type),
      y: px(height + 0.32 * size),
      'font-size': size,
      'text-anchor': 'end',
      class: 'axis',
    }
    return [line, svg('text', place, text)]
  })
}

function level({ x, y, now }: Axes, plot: Plot, frame: Frame, size: number): SvgNode[] {
  const { type, compact } = frame
  const width = plot.right - plot.left
  const count = Math.max(2, Math.round(width / ((compact ? ACROSS.compact : ACROSS.wide) * type)))
  const gap = (one: Tick, other: Tick) =>
    ((textWidth(one.text, size) + textWidth(other.text, size)) / 2 + APART * type) / width
  const line = px(plot.bottom + 1.35 * type)
  const marks = ticksOf(x, now, count, gap).flatMap(({ at, text }) => {
    const place = plot.x(at)
    const tick = svg('line', {
      x1: place,
      x2: place,
      y1: plot.bottom,
      y2: px(plot.bottom + 0.3 * type),
      class: 'tick',
    })
    const look = { 'font-size': size, 'text-anchor': 'middle', class: text === 'now' ? 'axis now-text' : 'axis' }
    return [tick, svg('text', { x: kept(place, textWidth(text, size), frame), y: line, ...look }, text)]
  })
  const floor = { x1: plot.left, x2: plot.right, y1: plot.bottom, y2: plot.bottom, class: 'base' }
  return y.from === 0 && y.scaling === 'linear' ? marks : [svg('line', floor), ...marks]
}

/** The last tick of a phone must not run over the edge. */
function kept(place: number, width: number, frame: Frame): number {
  return px(Math.max(width / 2, Math.min(frame.width - width / 2, place)))
}

function title(x: Axis, plot: Plot, frame: Frame, size: number, inRow: boolean): SvgNode {
  const [place, row] = inRow ? [frame.width, 1.35] : [plot.right, 2.6]
  const look = { 'font-size': size, 'text-anchor': 'end', class: 'axis' }
  return svg('text', { x: place, y: px(plot.bottom + row * frame.type), ...look }, ...titleOf(x, size))
}

function today(now: number | null, x: Axis, plot: Plot): SvgNode[] {
  if (now === null || !within(x, now)) return []
  return [svg('line', { x1: plot.x(now), x2: plot.x(now), y1: plot.top, y2: plot.bottom, class: 'now' })]
}

export function within(axis: Axis, at: number): boolean {
  const part = fractionOf(axis, at)
  return part >= 0 && part <= 1
}

function reference({ axis, at }: Reference, plot: Plot): SvgNode {
  const [x, y] = [plot.x(at), plot.y(at)]
  const ends =
    axis === 'x' ? { x1: x, x2: x, y1: plot.top, y2: plot.bottom } : { x1: plot.left, x2: plot.right, y1: y, y2: y }
  return svg('line', { ...ends, class: 'reference' })
}
