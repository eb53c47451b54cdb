/** From the quantities of a figure to pixels. */
import { px } from './svg'
import type { Window } from './window'

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
export interface Plot {
  readonly left: number
  readonly right: number
  readonly top: number
  readonly bottom: number
  readonly x: (time: number) => number
  readonly y: (scale: number) => number
}

export interface Margins {
  readonly left: number
  readonly right: number
  readonly top: number
  readonly bottom: number
}

export function plotOf(frame: Frame, margins: Margins, { from, to, top: a }: Window): Plot {
  const [left, top] = [px(margins.left), px(margins.top)]
  const right = px(frame.width - margins.right)
  const bottom = px(frame.height - margins.bottom)
  return {
    left,
    right,
    top,
    bottom,
    x: (time) => px(left + ((time - from) / (to - from)) * (right - left)),
    y: (scale) => px(bottom - (scale / a) * (bottom - top)),
  }
}

/** The page's widths: a phone, a tablet, a desk or a hall. */
export const FRAMES: readonly Frame[] = [
  { id: 'narrow', width: 370, height: 262, type: 13, compact: true },
  { id: 'middle', width: 800, height: 330, type: 15, compact: false },
  { id: 'wide', width: 1240, height: 365, type: 15, compact: false },
]
