/** The long view as a drawing. */
import { axes, timeAxisTitle } from './draw-axes'
import { drawCurve } from './draw-curve'
import { drawLabel } from './draw-label'
import { drawRibbons, ribbonsHeight } from './draw-ribbons'
import { labelHeight, labelWidth, namedAbove, nameOf, placeLabels } from './labels'
import type { Curve, LongView } from './long-view'
import { type Frame, type Margins, type Plot, plotOf } from './plot'
import { px, type SvgNode, svg } from './svg'
import { textWidth } from './text-width'

/** The vertical axis stands above its upper end. */
const SCALE_TITLE = 'scale factor a'

export function drawLongView(view: LongView, frame: Frame): SvgNode {
  const plot = plotOfView(view, frame)
  const labels = placeLabels(view, plot, frame, freeAbove(frame))
  return svg(
    'svg',
    {
      viewBox: `0 0 ${frame.width} ${heightOfView(view, frame)}`,
      class: 'chart',
      role: 'img',
      'aria-label': view.alternative,
    },
    ...ground(view, plot, frame),
    ...axes(view.window, plot, frame, SCALE_TITLE),
    ...view.curves.map((curve) => drawCurve(curve, plot, frame)),
    ...drawRibbons(view.curves, plot, frame),
    ...labels.map((label) => drawLabel(label, frame)),
  )
}

/** Where the plot lies within the drawing. */
export function plotOfView(view: LongView, frame: Frame): Plot {
  return plotOf(frame, marginsOf(view, frame), view.window)
}

/** Of the whole drawing: the ribbons hang below the frame. */
export function heightOfView(view: LongView, frame: Frame): number {
  return px(frame.height + ribbonsHeight(view.curves, frame))
}

/** Left margin in units of the type. */
const LEFT = 2.4

/** Where the row above the plot begins to be free, right of the axis title. */
function freeAbove({ type }: Frame): number {
  return LEFT * type + textWidth(SCALE_TITLE, type * 0.9) + type
}

function marginsOf(view: LongView, frame: Frame): Margins {
  const { type, compact } = frame
  const textsOf = (curve: Curve) => ({ name: nameOf(curve, frame), note: compact ? '' : curve.note })
  const others = view.curves.filter(({ finish }) => finish?.edge !== 'top')
  const beside = others.map((curve) => labelWidth(textsOf(curve), type))
  const above = namedAbove(view.curves, frame, freeAbove(frame)).map((curve) => labelHeight(textsOf(curve), type))
  const title = textWidth(timeAxisTitle(), type * 0.9)
  return {
    left: LEFT * type,
    right: compact ? 0.6 * type : Math.max(title, ...beside) + 1.4 * type,
    top: Math.max(1.5 * type, ...above.map((height) => height + 1.3 * type)),
    bottom: compact ? 3.2 * type : 2 * type,
  }
}

/** The future lies on a tint; hatched where it is an extrapolation. */
function ground(view: LongView, plot: Plot, { id }: Frame): SvgNode[] {
  const x = plot.x(0)
  const area = { x, y: plot.top, width: px(plot.right - x), height: px(plot.bottom - plot.top) }
  const pattern = (name: string) => {
    const lines = svg('path', { d: 'M-2 10L10 -2M6 18L18 6', class: name })
    return svg('pattern', { id: `${id}-${name}`, width: 8, height: 8, patternUnits: 'userSpaceOnUse' }, lines)
  }
  const tint = svg('rect', { ...area, class: 'tint' })
  if (!view.hatched) return [tint]
  return [svg('defs', {}, pattern('hatch'), pattern('veil')), tint, svg('rect', { ...area, fill: `url(#${id}-hatch)` })]
}
