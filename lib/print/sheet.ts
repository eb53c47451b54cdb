/** A figure upon its sheet: ground, heading, drawing and the line that says where it comes from. */
import type { Frame } from '../figures/plot'
import { px, type SvgNode, svg } from '../figures/svg'
import { AFTER_PARTS, fitted, inLines } from '../figures/text-width'
import type { Size } from './sizes'
import { styled } from './style'
import type { Palette } from './theme'

/** A view that can be drawn into a frame. */
export interface Picture {
  readonly draw: (frame: Frame) => SvgNode
  /** Of the whole drawing, which may be higher than its frame. */
  readonly heightOf: (frame: Frame) => number
  /** The same without what hangs below, for where that would leave too little room. */
  readonly lean?: Picture
}

export interface Origin {
  /** Above the drawing, where the size has a heading. */
  readonly heading: readonly string[]
  /** Under it. */
  readonly foot: string
}

/** The drawing in its own units, `scale` points each. */
export interface Sheet {
  readonly node: SvgNode
  /** Colour of what lies below everything. */
  readonly ground: string
  readonly width: number
  readonly height: number
  readonly scale: number
}

/** Drawings are made for type of this size; sheets scale them as a whole. */
const TYPE = 15
/** In units of the type. */
const MARGIN = 0.9
const FOOT = { first: 1.5, more: 1.05 }
/** Six scenarios with long names need so many lines of a column. */
const MOST_FOOT = 8
const HEADING = 1.7
/** Sizes of letters over that of the type. */
const FOOT_SIZE = 0.78
const HEADING_SIZES = [1.3, 1] as const

export function sheetOf(picture: Picture, size: Size, palette: Palette, { heading, foot }: Origin): Sheet {
  const scale = size.type / TYPE
  const width = px(size.width / scale)
  const margin = MARGIN * TYPE
  const inner = px(width - 2 * margin)
  const lines = size.headed ? headlines(heading, inner) : []
  const top = margin + lines.length * HEADING * TYPE
  const origin = inLines(foot, FOOT_SIZE * TYPE, inner, MOST_FOOT, AFTER_PARTS)
  const bottom = margin + (FOOT.first + (origin.length - 1) * FOOT.more) * TYPE
  const { drawing, height } = drawnIn(picture, size, { width: inner, height: size.height / scale, taken: top + bottom })
  const node = svg(
    'g',
    {},
    svg('rect', { x: 0, y: 0, width, height, fill: palette('ground') }),
    ...lines.map((line, i) => headline(line, i, margin, inner)),
    svg('g', { transform: `translate(${px(margin)} ${px(top)})` }, ...drawing.children),
    ...origin.map((line, i) => {
      const y = height - 0.75 * margin - (origin.length - 1 - i) * FOOT.more * TYPE
      return text(line, { x: margin, y, size: FOOT_SIZE, width: inner }, 'foot')
    }),
  )
  return { node: styled(node, palette), ground: palette('ground'), width, height, scale }
}

interface Room {
  readonly width: number
  readonly height: number
  /** By margins, heading and foot. */
  readonly taken: number
}

/** The plot with its axes and the names above it gets at least so much of the room. */
const LEAST_PLOT = 0.6

/** The drawing, and the height of the sheet that it asks for. */
function drawnIn(picture: Picture, size: Size, { width, height, taken }: Room): { drawing: SvgNode; height: number } {
  const frame = { width, height: px(height), type: TYPE, compact: size.compact, id: 'figure' }
  if (!size.fixed) return { drawing: picture.draw(frame), height: px(picture.heightOf(frame) + taken) }
  const room = height - taken
  const fit = (one: Picture) => ({ ...frame, height: px(room - (one.heightOf(frame) - frame.height)) })
  const chosen = picture.lean && fit(picture).height < LEAST_PLOT * room ? picture.lean : picture
  return { drawing: chosen.draw(fit(chosen)), height: px(height) }
}

/** The title has one line; what is said below it may have two. */
function headlines([title = '', ...said]: readonly string[], width: number): readonly string[] {
  return [title, ...said.flatMap((one) => inLines(one, HEADING_SIZES[1] * TYPE, width, 2))]
}

function headline(line: string, i: number, margin: number, width: number): SvgNode {
  const place = { x: margin, y: margin + (0.9 + i * HEADING) * TYPE, size: HEADING_SIZES[i === 0 ? 0 : 1], width }
  return text(line, place, i === 0 ? 'heading' : 'axis')
}

interface Place {
  readonly x: number
  readonly y: number
  readonly size: number
  readonly width: number
}

function text(words: string, { x, y, size, width }: Place, kind: string): SvgNode {
  const type = size * TYPE
  return svg('text', { x: px(x), y: px(y), 'font-size': px(type), class: kind }, fitted(words, type, width))
}
