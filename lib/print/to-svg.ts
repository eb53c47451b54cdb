/** A sheet as an SVG file that needs nothing else: letters are outlines, with their words beside them for a voice. */
import { px, type SvgNode, serialize, svg } from '../figures/svg'
import type { Faces } from './face'
import { type Letters, lettersWith } from './letters'
import type { Sheet } from './sheet'

export interface About {
  readonly title: string
  /** For those who do not see it, and where it comes from. */
  readonly description: string
}

export function toSvg({ node, width, height, scale }: Sheet, faces: Faces, { title, description }: About): string {
  const letters = lettersWith(faces)
  const drawing = outlined(node, letters)
  const root = svg(
    'svg',
    {
      xmlns: 'http://www.w3.org/2000/svg',
      // Without its prefix, references are not known to every program.
      'xmlns:xlink': 'http://www.w3.org/1999/xlink',
      width: `${px(width * scale)}pt`,
      height: `${px(height * scale)}pt`,
      viewBox: `0 0 ${width} ${height}`,
      role: 'img',
      'aria-labelledby': 'title description',
    },
    svg('title', { id: 'title' }, title),
    svg('desc', { id: 'description' }, description),
    letters.definitions(),
    drawing,
  )
  return `<?xml version="1.0" encoding="UTF-8"?>\n${serialize(root)}\n`
}

/** The rim is drawn below the letters by itself, since not every program knows `paint-order`. */
function outlined(node: SvgNode, letters: Letters): SvgNode {
  if (node.tag === 'text') return letters.placed(node)
  const children = node.children.map((child) => (typeof child === 'string' ? child : outlined(child, letters)))
  return { ...node, children }
}
