/** A curve with its marks. Hue comes by class, dash by the place in the list: a reader without colours can tell them apart. */
import type { Curve, Mark } from './chart'
import { strokeOf } from './dash'
import type { Stroke } from './label'
import type { Frame, Plot } from './plot'
import type { Point } from './sample'
import { px, type SvgNode, svg } from './svg'

/** Line width and marks in units of the type. */
const LINE = { strong: 0.2, quiet: 0.13 }
const RING = 0.32
const CROSS = 0.36
const ARROW = 0.62

export function drawCurve(curve: Curve, plot: Plot, { type }: Frame): SvgNode {
  const width = widthOf(curve, type)
  return svg(
    'g',
    { class: curve.tone },
    ...asymptote(curve, plot, type),
    svg('path', { d: curve.segments.map((segment) => pathOf(segment, plot)).join(''), ...strokeOf(curve.dash, width) }),
    ...curve.marks.map((mark) => drawMark(mark, plot, type, width)),
  )
}

export const widthOf = ({ strong }: Stroke, type: number): number => px((strong ? LINE.strong : LINE.quiet) * type)

function pathOf(points: readonly Point[], plot: Plot): string {
  return points.map(([x, y], i) => `${i === 0 ? 'M' : 'L'}${fine(plot.x(x))} ${fine(plot.y(y))}`).join('')
}

/** A tenth of a unit cannot be seen, and paths are most of what a drawing weighs. */
const fine = (value: number): number => Math.round(value * 10) / 10

function asymptote({ asymptote }: Curve, plot: Plot, type: number): SvgNode[] {
  if (asymptote === null) return []
  const x = plot.x(asymptote.at)
  const dash = `${px(0.1 * type)} ${px(0.3 * type)}`
  return [svg('line', { x1: x, x2: x, y1: plot.top, y2: plot.bottom, class: 'asymptote', 'stroke-dasharray': dash })]
}

function drawMark(mark: Mark, plot: Plot, type: number, width: number): SvgNode {
  const [x, y] = [plot.x(mark.at[0]), plot.y(mark.at[1])]
  if (mark.kind === 'ring')
    return svg('circle', { cx: x, cy: y, r: px(RING * type), class: 'ring', 'stroke-width': px(0.8 * width) })
  if (mark.kind === 'arrow') return arrow([plot.x(mark.from[0]), plot.y(mark.from[1])], [x, y], ARROW * type)
  const arm = CROSS * type
  const d = `M${px(x - arm)} ${px(y - arm)}L${px(x + arm)} ${px(y + arm)}M${px(x - arm)} ${px(y + arm)}L${px(x + arm)} ${px(y - arm)}`
  return svg('path', { d, class: 'cross', 'stroke-width': width })
}

/** A head along the last stretch of the curve, its tip just beyond the point. */
function arrow([x1, y1]: readonly [number, number], [x2, y2]: readonly [number, number], size: number): SvgNode {
  const length = Math.hypot(x2 - x1, y2 - y1) || 1
  const [ux, uy] = [(x2 - x1) / length, (y2 - y1) / length]
  const [tipX, tipY] = [x2 + 0.5 * size * ux, y2 + 0.5 * size * uy]
  const [backX, backY] = [tipX - size * ux, tipY - size * uy]
  const half = 0.42 * size
  const d = `M${px(tipX)} ${px(tipY)}L${px(backX - half * uy)} ${px(backY + half * ux)}L${px(backX + half * uy)} ${px(backY - half * ux)}Z`
  return svg('path', { d, class: 'arrow' })
}
