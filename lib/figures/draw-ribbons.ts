/** Era ribbons on the time axis of the long view: one per scenario, named where a word fits. */

import type { Chart, Ribbon } from './chart'
import type { Era } from './contents'
import { strokeOf } from './dash'
import { within } from './draw-axes'
import type { Stretch } from './eras'
import type { Frame, Plot } from './plot'
import { px, type SvgNode, svg } from './svg'
import { textWidth } from './text-width'

/** In units of the type. */
const PITCH = { wide: 1.75, compact: 1.5 }
const BAR = 1.08
const ABOVE = 0.16
const WORD = 0.78

/** A row below the ribbons, where their colours are named that have no room for a word, and none beside the ribbons. */
const KEY = 1.3

export function ribbonsHeight({ ribbons }: Pick<Chart, 'ribbons'>, plot: Plot, frame: Frame): number {
  const eras = unnamed(ribbons, plot, frame)
  const below = eras.length > 0 && !fitsBeside(eras, ribbons.length, plot, frame)
  return rowsHeight(ribbons.length, frame) + (below ? KEY * frame.type : 0)
}

const rowsHeight = (rows: number, { type, compact }: Frame): number =>
  rows === 0 ? 0 : (rows * (compact ? PITCH.compact : PITCH.wide) + 0.5) * type

/** The ribbons hang below the frame's own height. */
export function drawRibbons({ ribbons, now, x: axis }: Chart, plot: Plot, frame: Frame): SvgNode[] {
  const pitch = (frame.compact ? PITCH.compact : PITCH.wide) * frame.type
  const rows = ribbons.map((one, i) => drawRibbon(one, frame.height + 0.3 * frame.type + i * pitch, plot, frame))
  const below = frame.height + rowsHeight(ribbons.length, frame)
  const eras = unnamed(ribbons, plot, frame)
  const keys = fitsBeside(eras, ribbons.length, plot, frame)
    ? eras.map((era, i) => ({
        era,
        x: plot.right + BESIDE * frame.type,
        y: below - (i + 1) * pitch + 0.26 * frame.type,
      }))
    : inRow(eras, below + 0.25 * frame.type, plot, frame)
  const drawn = [...rows, ...keys.flatMap((key) => drawKey(key, frame))]
  if (ribbons.length === 0 || now === null || !within(axis, now)) return drawn
  const x = plot.x(now)
  const line = svg('line', {
    x1: x,
    x2: x,
    y1: frame.height,
    y2: px(below),
    class: 'now',
  })
  return [...drawn, line]
}

function drawRibbon({ tone, dash, eras, extrapolated }: Ribbon, y: number, plot: Plot, frame: Frame): SvgNode {
  const { type, id } = frame
  const line = px(ABOVE * type)
  const bar = { y: px(y + 2 * line), height: px(BAR * type) }
  const spans = eras.dominant
  const last = spans.at(-1)
  const hatched = extrapolated && last && last.to > 0
  return svg(
    'g',
    { class: tone },
    key(dash, bar.y + bar.height / 2, plot, type),
    ...eras.accelerating.map((span) => svg('rect', { ...extent(span, plot), y: px(y), height: line, class: 'faster' })),
    ...spans.map((span) => svg('rect', { ...extent(span, plot), ...bar, class: classOf(span.value) })),
    ...(hatched
      ? [
          svg('rect', {
            ...extent({ from: Math.max(0, spans[0]?.from ?? 0), to: last.to }, plot),
            ...bar,
            fill: `url(#${id}-veil)`,
          }),
        ]
      : []),
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
function key(place: number, y: number, plot: Plot, type: number): SvgNode {
  const width = px(0.17 * type)
  const ends = { x1: px(0.2 * type), x2: px(plot.left - 0.7 * type), y1: px(y), y2: px(y) }
  return svg('line', { ...ends, ...strokeOf(place, width) })
}

/** Narrower than this many pixels nothing is seen. */
const SEEN = 2

/** The eras that are seen and have their word nowhere. */
function unnamed(ribbons: readonly Ribbon[], plot: Plot, { type }: Frame): readonly Era[] {
  const spans = ribbons.flatMap(({ eras }) => eras.dominant)
  const named = new Set(spans.filter((span) => wordStart(span, plot, type) !== null).map(({ value }) => value))
  const seen = spans.filter(({ from, to, value }) => !named.has(value) && plot.x(to) - plot.x(from) >= SEEN)
  return [...new Set(seen.map(({ value }) => value))]
}

/** Right of the plot, in units of the type. */
const BESIDE = 0.8

function fitsBeside(eras: readonly Era[], rows: number, plot: Plot, { type, width }: Frame): boolean {
  const widest = Math.max(0, ...eras.map((era) => keyWidth(era, type)))
  return eras.length <= rows && plot.right + BESIDE * type + widest <= width
}

const keyWidth = (era: Era, type: number): number => 1.35 * type + textWidth(era, px(WORD * type))

interface Keyed {
  readonly era: Era
  readonly x: number
  readonly y: number
}

function inRow(eras: readonly Era[], y: number, plot: Plot, { type }: Frame): readonly Keyed[] {
  let next = plot.left
  return eras.map((era) => {
    const x = next
    next += keyWidth(era, type) + 1.05 * type
    return { era, x, y }
  })
}

function drawKey({ era, x, y }: Keyed, { type }: Frame): SvgNode[] {
  const swatch = { x: px(x), y: px(y), width: px(type), height: px(0.8 * type), class: classOf(era) }
  const place = { x: px(x + 1.35 * type), y: px(y + 0.68 * type), 'font-size': px(WORD * type) }
  return [svg('rect', swatch), svg('text', { ...place, class: 'axis' }, era)]
}

const wordStart = ({ from, to, value }: Stretch<Era>, plot: Plot, type: number): number | null =>
  startOf(plot.x(from), plot.x(to), plot.x(0), textWidth(value, px(WORD * type)) + 0.6 * type)

function word(span: Stretch<Era>, y: number, plot: Plot, type: number): SvgNode[] {
  const { value } = span
  const start = wordStart(span, plot, type)
  if (start === null) return []
  const size = px(WORD * type)
  const place = { x: px(start + 0.45 * type), y: px(y + 0.79 * type), 'font-size': size }
  return [svg('text', { ...place, class: `era-word ${value.replace(' ', '-')}` }, value)]
}

/** Where a word begins that needs so much room: beside the line of now, never under it. */
function startOf(left: number, right: number, now: number, needed: number): number | null {
  const parts = now > left && now < right ? [[left, now] as const, [now, right] as const] : [[left, right] as const]
  const [start, end] = parts.reduce((best, part) => (part[1] - part[0] > best[1] - best[0] ? part : best))
  return end - start >= needed ? start : null
}
