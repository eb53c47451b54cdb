/** A figure as a drawing. */
import type { Chart, Curve, Spot } from './chart'
import { drawAxes, SMALL, uprightTicks, within } from './draw-axes'
import { drawCurve } from './draw-curve'
import { drawLabel } from './draw-label'
import { drawRibbons, ribbonsHeight } from './draw-ribbons'
import { titleWidth } from './draw-text'
import { labelHeight, labelWidth, textsOf } from './label'
import { namedAbove, placeLabels } from './labels'
import { type Frame, type Margins, type Plot, plotOf } from './plot'
import { fractionOf } from './scale'
import { px, type SvgNode, svg } from './svg'
import { textWidth } from './text-width'

/** `className` beside `drawn`, for whoever has to find it. */
export function drawChart(chart: Chart, frame: Frame, className = ''): SvgNode {
  const plot = plotOfChart(chart, frame)
  const labels = placeLabels(chart, plot, frame, freeAbove(chart, frame))
  return svg(
    'svg',
    {
      viewBox: `0 0 ${frame.width} ${heightOfChart(chart, frame)}`,
      class: `drawn ${className}`.trim(),
      role: 'img',
      'aria-label': chart.alternative,
    },
    ...ground(chart, plot, frame),
    drawAxes(chart, plot, frame, titleInRow(chart, frame)),
    ...inOrder(chart.curves).map((curve) => drawCurve(curve, plot, frame)),
    ...drawRibbons(chart, plot, frame),
    ...chart.spots.map((spot) => drawSpot(spot, plot, frame)),
    ...labels.map((label) => drawLabel(label, frame)),
  )
}

/** The strong ones lie on top. */
function inOrder(curves: readonly Curve[]): readonly Curve[] {
  return [...curves.filter(({ strong }) => !strong), ...curves.filter(({ strong }) => strong)]
}

/** Where the plot lies within the drawing. */
export function plotOfChart(chart: Chart, frame: Frame): Plot {
  return plotOf(frame, marginsOf(chart, frame), chart)
}

/** Of the whole drawing: the ribbons hang below the frame. */
export function heightOfChart(chart: Chart, frame: Frame): number {
  return px(frame.height + (chart.ribbons.length > 0 ? ribbonsHeight(chart, plotOfChart(chart, frame), frame) : 0))
}

/** Left margin with the shortest ticks, in units of the type. */
const LEAST_LEFT = 2.4

function leftOf({ y }: Chart, { type, height }: Frame): number {
  const widest = Math.max(...uprightTicks(y, 0.8 * height, { type }).map(({ text }) => textWidth(text, SMALL * type)))
  return Math.max(LEAST_LEFT * type, widest + 1.1 * type)
}

/** Where the row above the plot begins to be free, right of the axis title. */
function freeAbove(chart: Chart, frame: Frame): number {
  const start = frame.compact ? 0 : leftOf(chart, frame)
  return start + titleWidth(chart.y, frame.type * SMALL) + frame.type
}

/** The title of the horizontal axis stands beside its ticks where labels need a margin there anyway. */
function titleInRow(chart: Chart, frame: Frame): boolean {
  return !frame.compact && titleWidth(chart.x, frame.type * SMALL) < Math.max(9 * frame.type, besideOf(chart, frame))
}

/** A label at a mark so near the right edge needs room beside it too. */
const NEAR_EDGE = 0.93

function besideOf({ curves, x }: Chart, frame: Frame): number {
  const near = ({ edge, at }: NonNullable<Curve['finish']>) => edge === 'inside' && fractionOf(x, at[0]) > NEAR_EDGE
  const others = curves.filter(({ finish }) => finish !== null && (finish.edge === 'right' || near(finish)))
  return Math.max(0, ...others.map((curve) => labelWidth(textsOf(curve, frame), frame.type)))
}

function marginsOf(chart: Chart, frame: Frame): Margins {
  const { type, compact } = frame
  const above = namedAbove(chart.curves, frame, freeAbove(chart, frame)).map((curve) =>
    labelHeight(textsOf(curve, frame), type),
  )
  const inRow = titleInRow(chart, frame)
  const title = inRow ? titleWidth(chart.x, type * SMALL) : 0
  return {
    left: leftOf(chart, frame),
    right: compact ? 0.6 * type : Math.max(title, besideOf(chart, frame)) + 1.4 * type,
    top: Math.max(1.5 * type, ...above.map((height) => height + 1.3 * type)),
    bottom: inRow ? 2 * type : 3.2 * type,
  }
}

/** The future lies on a tint; hatched where it is an extrapolation. */
function ground({ now, future, x: axis, ribbons }: Chart, plot: Plot, { id }: Frame): SvgNode[] {
  const pattern = (name: string) => {
    const lines = svg('path', { d: 'M-2 10L10 -2M6 18L18 6', class: name })
    return svg('pattern', { id: `${id}-${name}`, width: 8, height: 8, patternUnits: 'userSpaceOnUse' }, lines)
  }
  const hatched = future === 'hatched' || ribbons.some(({ extrapolated }) => extrapolated)
  const defs = hatched ? [svg('defs', {}, pattern('hatch'), pattern('veil'))] : []
  if (now === null || future === 'none' || axis.to <= now) return defs
  const x = within(axis, now) ? plot.x(now) : plot.left
  const area = { x, y: plot.top, width: px(plot.right - x), height: px(plot.bottom - plot.top) }
  const tint = svg('rect', { ...area, class: 'tint' })
  return [...defs, tint, ...(future === 'hatched' ? [svg('rect', { ...area, fill: `url(#${id}-hatch)` })] : [])]
}

function drawSpot({ tone, at }: Spot, plot: Plot, { type }: Frame): SvgNode {
  const place = { cx: plot.x(at[0]), cy: plot.y(at[1]), r: px(0.3 * type) }
  return svg('g', { class: tone }, svg('circle', { ...place, class: 'spot' }))
}
