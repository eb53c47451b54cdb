/** Era ribbons on the time axis of the long view: one per scenario, named where a word fits. */

import type { Era } from './contents'
import { dashOf } from './draw-curve'
import type { Stretch } from './eras'
import type { Curve } from './long-view'
import type { Frame, Plot } from './plot'
import { px, type SvgNode, svg } from './svg'
import { textWidth } from './text-width'

/** In units of the type. */
const PITCH = { wide: 1.75, compact: 1.5 }
const BAR = 1.08
const ABOVE = 0.16
const WORD = 0.78

export function ribbonsHeight(curves: readonly Curve[], { type, compact }: Frame): number {
  const rows = curves.filter(({ eras }) => eras !== null).length
  return rows === 0 ? 0 : (rows * (compact ? PITCH.compact : PITCH.wide) + 0.5) * type
}

/** The ribbons hang below the frame's own height. */
export function drawRibbons(curves: readonly Curve[], plot: Plot, frame: Frame): SvgNode[] {
  const rows = curves.filter(({ eras }) => eras !== null)
  if (rows.length === 0) return []
  const pitch = (frame.compact ? PITCH.compact : PITCH.wide) * frame.type
  const ribbons = rows.map((curve, i) => drawRibbon(curve, frame.height + 0.3 * frame.type + i * pitch, plot, frame))
  const x = plot.x(0)
  const now = svg('line', {
    x1: x,
    x2: x,
    y1: frame.height,
    y2: px(frame.height + ribbonsHeight(curves, frame)),
    class: 'now',
  })
  return [...ribbons, now]
}

function drawRibbon({ slot, eras, extrapolated }: Curve, y: number, plot: Plot, frame: Frame): SvgNode {
  const { type, id } = frame
  const line = px(ABOVE * type)
  const bar = { y: px(y + 2 * line), height: px(BAR * type) }
  const spans = eras?.dominant ?? []
  const last = spans.at(-1)
  const hatched = extrapolated && last && last.to > 0
  return svg(
    'g',
    { class: `slot-${slot}` },
    key(slot, bar.y + bar.height / 2, plot, type),
    ...(eras?.accelerating ?? []).map((span) =>
      svg('rect', { ...extent(span, plot), y: px(y), height: line, class: 'faster' }),
    ),
    ...spans.map((span) => svg('rect', { ...extent(span, plot), ...bar, class: classOf(span.value) })),
    ...(hatched ? [svg('rect', { ...extent({ from: 0, to: last.to }, plot), ...bar, fill: `url(#${id}-veil)` })] : []),
    ...spans.flatMap((span) => word(span, bar.y, plot, type)),
  )
}

function extent({ from, to }: Pick<Stretch<unknown>, 'from' | 'to'>, plot: Plot) {
  const x = plot.x(from)
  return { x, width: px(plot.x(to) - x) }
}

function classOf(era: Era): string {
  return `era ${era.replace(' ', '-')}`
}

/** The scenario's line in the margin. */
function key(slot: number, y: number, plot: Plot, type: number): SvgNode {
  const width = px(0.17 * type)
  const dash = dashOf(slot, width)
  const place = { x1: px(0.2 * type), x2: px(plot.left - 0.7 * type), y1: px(y), y2: px(y) }
  return svg('line', {
    ...place,
    class: 'curve',
    'stroke-width': width,
    ...(dash === null ? {} : { 'stroke-dasharray': dash }),
  })
}

function word({ from, to, value }: Stretch<Era>, y: number, plot: Plot, type: number): SvgNode[] {
  const size = px(WORD * type)
  const [left, right] = [plot.x(from), plot.x(to)]
  if (textWidth(value, size) + 0.6 * type > right - left) return []
  // Beside the line of now, never under it.
  const now = plot.x(0)
  const start = left < now && right > now && right - now > now - left ? now : left
  const fits = textWidth(value, size) + 0.6 * type <= right - start
  const place = { x: px((fits ? start : left) + 0.45 * type), y: px(y + 0.79 * type), 'font-size': size }
  return [svg('text', { ...place, class: `era-word ${value.replace(' ', '-')}` }, value)]
}
