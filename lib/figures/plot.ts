/** From the quantities of a figure to pixels. */
import { fractionOf, type Range } from './scale'
import { px } from './svg'

/** What the place of a figure asks for: a wide page, a phone, a slide. */
export interface Frame {
  readonly width: number
  readonly height: number
  /** Size of the type; lines and gaps follow from it. */
  readonly type: number
  /** True where labels have no room beside the plot. */
  readonly compact: boolean
  /** Begins the ids of this drawing, so that several fit one page. */
  readonly id: string
}

/** The plot's edges, in pixels from the upper left corner. */
export interface Edges {
  readonly left: number
  readonly right: number
  readonly top: number
  readonly bottom: number
}

export interface Plot extends Edges {
  readonly x: (value: number) => number
  readonly y: (value: number) => number
}

/** How much of a frame lies outside the plot, on each side. */
export type Margins = Edges

export function plotOf(
  frame: Pick<Frame, 'width' | 'height'>,
  margins: Margins,
  axes: { readonly x: Range; readonly y: Range },
): Plot {
  const [left, top] = [px(margins.left), px(margins.top)]
  const right = px(frame.width - margins.right)
  const bottom = px(frame.height - margins.bottom)
  return {
    left,
    right,
    top,
    bottom,
    x: (value) => px(left + fractionOf(axes.x, value) * (right - left)),
    y: (value) => px(bottom - fractionOf(axes.y, value) * (bottom - top)),
  }
}

/** The page's widths: a phone, a tablet, a desk or a hall. The long view is low, since it stays in sight. */
export const LONG_FRAMES: readonly Frame[] = [
  { id: 'narrow', width: 370, height: 262, type: 13, compact: true },
  { id: 'middle', width: 800, height: 330, type: 15, compact: false },
  { id: 'wide', width: 1240, height: 365, type: 15, compact: false },
]

export const VIEW_FRAMES: readonly Frame[] = [
  { id: 'narrow', width: 370, height: 310, type: 13, compact: true },
  { id: 'middle', width: 800, height: 400, type: 15, compact: false },
  { id: 'wide', width: 1240, height: 460, type: 15, compact: false },
]
