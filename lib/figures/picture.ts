/** A figure as the page gets it: drawn for its widths, and what a cursor over it needs. */
import type { Axis, Chart } from './chart'
import { drawChart, heightOfChart, plotOfChart } from './draw-chart'
import type { Edges, Frame } from './plot'
import type { Readings } from './readings'
import { type Attributes, serialize } from './svg'

export interface Picture {
  /** Id of the frame. */
  readonly frame: string
  readonly width: number
  readonly height: number
  /** Of the plot within the drawing. */
  readonly plot: Edges
  /** Of the drawing's own element. */
  readonly attributes: Attributes
  /** What is in it, as text with nothing in it that a person typed unescaped: apart, since one change leaves most as they are. */
  readonly parts: readonly string[]
}

export interface Shown {
  readonly title: string
  readonly x: Axis
  readonly y: Axis
  readonly now: number | null
  readonly curves: readonly { readonly tone: string; readonly name: string }[]
  readonly readings: Readings
  readonly pictures: readonly Picture[]
  readonly caption: string
  readonly alternative: string
}

/** `prefix` keeps the ids of several figures on one page apart. */
export function shownOf(chart: Chart, frames: readonly Frame[], prefix: string, className = ''): Shown {
  const { title, x, y, now, curves, readings, caption, alternative } = chart
  return {
    title,
    x,
    y,
    now,
    curves: curves.map(({ tone, name }) => ({ tone, name })),
    readings,
    pictures: frames.map((frame) => pictureOf(chart, frame, prefix, className)),
    caption,
    alternative,
  }
}

function pictureOf(chart: Chart, frame: Frame, prefix: string, className: string): Picture {
  const { left, right, top, bottom } = plotOfChart(chart, frame)
  const { attributes, children } = drawChart(chart, { ...frame, id: `${prefix}-${frame.id}` }, className)
  return {
    frame: frame.id,
    width: frame.width,
    height: heightOfChart(chart, frame),
    plot: { left, right, top, bottom },
    attributes,
    parts: children.map((one) => apostrophes(serialize(one))),
  }
}

/** Quoted by apostrophes, which need no escapes of their own where the page carries the text as data. */
function apostrophes(xml: string): string {
  return xml.replaceAll("'", '&#39;').replaceAll('"', "'")
}
