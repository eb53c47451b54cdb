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

export function runsOfText({ attributes, children }: SvgNode, faces: Faces): readonly Run[] {
  const parts = partsOf(attributes, children)
  const widths = parts.map(({ text, face, size }) => widthOf(faces[face], text, size))
  const total = widths.reduce((sum, width) => sum + width, 0)
  const fill = String(attributes.fill ?? '#000000')
  const halo = attributes.halo === undefined ? null : String(attributes.halo)
  let [x, y] = [Number(attributes.x) - total * shareBefore(attributes['text-anchor']), Number(attributes.y)]
  return parts.map(({ text, face, size, drop }, i) => {
    y += drop
    const run = { text, face, size, x, y, fill, halo }
    x += widths[i]
    return run
  })
}

interface Part {
  readonly text: string
  readonly face: FaceKey
  readonly size: number
  /** By how much lower than the part before: subscripts and back. */
  readonly drop: number
}

function partsOf(attributes: Attributes, children: SvgNode['children']): readonly Part[] {
  return children.flatMap((child) => {
    const own = typeof child === 'string' ? attributes : { ...attributes, ...child.attributes }
    const text = typeof child === 'string' ? child : child.children.join('')
    const drop = typeof child === 'string' ? 0 : Number(child.attributes.dy ?? 0)
    return text === '' ? [] : [{ text, face: faceOf(own), size: Number(own['font-size']), drop }]
  })
}

/** The part of a text that stands before its place. */
const shareBefore = (anchor: string | number | undefined): number =>
  anchor === 'end' ? 1 : anchor === 'middle' ? 0.5 : 0

function faceOf(attributes: Attributes): FaceKey {
  if (attributes['font-style'] === 'italic') return 'italic'
  return Number(attributes['font-weight'] ?? 400) >= 600 ? 'semibold' : 'regular'
}
