/** Both axes, the grid, and the line of now. */
import { ticks } from 'd3-array'
import { fixed, signed } from '../words/number'
import type { Frame, Plot } from './plot'
import { px, type SvgNode, svg } from './svg'
import type { Window } from './window'

/** About so many units of type per tick. */
const TIME_TICK = { wide: 8, compact: 6 }
const SCALE_TICK = 4
/** Size of axis text in units of the type. */
const SMALL = 0.9

export function timeAxisTitle(): string {
  return 'time from now, Gyr'
}

export function axes(window: Window, plot: Plot, frame: Frame, scaleTitle: string): SvgNode[] {
  const size = px(frame.type * SMALL)
  return [
    ...scaleAxis(window, plot, frame, size),
    ...timeAxis(window, plot, frame, size),
    svg(
      'text',
      { x: frame.compact ? 0 : plot.left, y: px(plot.top - 0.55 * frame.type), 'font-size': size, class: 'axis' },
      ...italicEnd(scaleTitle),
    ),
  ]
}

/** The symbol at the end of an axis title stands in italics. */
function italicEnd(title: string): (SvgNode | string)[] {
  const cut = title.lastIndexOf(' ') + 1
  return [title.slice(0, cut), svg('tspan', { class: 'symbol' }, title.slice(cut))]
}

function scaleAxis({ top }: Window, plot: Plot, { type }: Frame, size: number): SvgNode[] {
  const count = Math.max(2, Math.round((plot.bottom - plot.top) / (SCALE_TICK * type)))
  return ticks(0, top, count).flatMap((a) => {
    const y = plot.y(a)
    const line = svg('line', { x1: plot.left, x2: plot.right, y1: y, y2: y, class: a === 0 ? 'base' : 'grid' })
    const place = {
      x: px(plot.left - 0.7 * type),
      y: px(y + 0.32 * size),
      'font-size': size,
      'text-anchor': 'end',
      class: 'axis',
    }
    return [line, svg('text', place, a === 0 ? '0' : String(a))]
  })
}

function timeAxis({ from, to }: Window, plot: Plot, frame: Frame, size: number): SvgNode[] {
  const { type, compact } = frame
  const count = Math.max(
    2,
    Math.round((plot.right - plot.left) / ((compact ? TIME_TICK.compact : TIME_TICK.wide) * type)),
  )
  const step = ticks(from, to, count)
  const decimals = step.some((time) => !Number.isInteger(time)) ? 1 : 0
  const y = px(plot.bottom + 1.35 * type)
  const near = 2.6 * type
  const shown = step.filter((time) => time === 0 || Math.abs(plot.x(time) - plot.x(0)) > near)
  const texts = shown.flatMap((time) => {
    const x = plot.x(time)
    const tick = svg('line', { x1: x, x2: x, y1: plot.bottom, y2: px(plot.bottom + 0.3 * type), class: 'tick' })
    const label = time === 0 ? 'now' : signed(fixed(time, decimals))
    return [
      tick,
      svg(
        'text',
        { x, y, 'font-size': size, 'text-anchor': 'middle', class: time === 0 ? 'axis now-text' : 'axis' },
        label,
      ),
    ]
  })
  const title = compact
    ? svg(
        'text',
        { x: plot.right, y: px(y + 1.2 * type), 'font-size': size, 'text-anchor': 'end', class: 'axis' },
        timeAxisTitle(),
      )
    : svg('text', { x: frame.width, y, 'font-size': size, 'text-anchor': 'end', class: 'axis' }, timeAxisTitle())
  const now = svg('line', { x1: plot.x(0), x2: plot.x(0), y1: plot.top, y2: plot.bottom, class: 'now' })
  return [...texts, title, now]
}
