/** The texts of a drawing as runs of one face, each with its place: what `text-anchor` and `tspan` leave to the reader. */
import type { Attributes, SvgNode } from '../figures/svg'
import { type FaceKey, type Faces, widthOf } from './face'

export interface Run {
  readonly text: string
  readonly face: FaceKey
  readonly size: number
  readonly x: number
  readonly y: number
  readonly fill: string
  /** Colour of a rim around the letters; null where there is none. */
  readonly halo: string | null
}

export function runsOfText(
  { attributes, children }: SvgNode,
  faces: Faces,
  inherited: Attributes = {},
): readonly Run[] {
  const own = { ...inherited, ...attributes }
  const size = Number(own['font-size'])
  const parts = children.flatMap((child) =>
    typeof child === 'string'
      ? [{ text: child, face: faceOf(own) }]
      : [{ text: child.children.join(''), face: faceOf({ ...own, ...child.attributes }) }],
  )
  const widths = parts.map(({ text, face }) => widthOf(faces[face], text, size))
  const total = widths.reduce((sum, width) => sum + width, 0)
  let x = Number(own.x) - total * shareBefore(own['text-anchor'])
  return parts.map(({ text, face }, i) => {
    const run = {
      text,
      face,
      size,
      x,
      y: Number(own.y),
      fill: String(own.fill ?? '#000000'),
      halo: own.halo === undefined ? null : String(own.halo),
    }
    x += widths[i]
    return run
  })
}

/** The part of a text that stands before its place. */
const shareBefore = (anchor: string | number | undefined): number =>
  anchor === 'end' ? 1 : anchor === 'middle' ? 0.5 : 0

function faceOf(attributes: Attributes): FaceKey {
  if (attributes['font-style'] === 'italic') return 'italic'
  return Number(attributes['font-weight'] ?? 400) >= 600 ? 'semibold' : 'regular'
}
