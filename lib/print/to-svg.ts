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

/** The elements of a sheet, letters first. */
function drawingOf({ node }: Sheet, faces: Faces): readonly SvgNode[] {
  const letters = lettersWith(faces)
  const drawing = outlined(node, letters)
  return [letters.definitions(), drawing]
}

const NAMESPACES = {
  xmlns: 'http://www.w3.org/2000/svg',
  // Without its prefix, references are not known to every program.
  'xmlns:xlink': 'http://www.w3.org/1999/xlink',
}

export function toSvg(sheet: Sheet, faces: Faces, { title, description }: About): string {
  const { width, height, scale } = sheet
  const root = svg(
    'svg',
    {
      ...NAMESPACES,
      width: `${px(width * scale)}pt`,
      height: `${px(height * scale)}pt`,
      viewBox: `0 0 ${width} ${height}`,
      role: 'img',
      'aria-labelledby': 'title description',
    },
    svg('title', { id: 'title' }, title),
    svg('desc', { id: 'description' }, description),
    ...drawingOf(sheet, faces),
  )
  return `<?xml version="1.0" encoding="UTF-8"?>\n${serialize(root)}\n`
}

/** Pixels of a sheet drawn `width` wide. */
export const pixelsOf = (sheet: Sheet, width: number) => ({
  width,
  height: Math.round((width * sheet.height) / sheet.width),
})

/** SVG of some of the rows of pixels of a sheet drawn `width` wide. */
export function bandsOf(sheet: Sheet, faces: Faces, width: number): (first: number, rows: number) => string {
  const drawing = drawingOf(sheet, faces).map(serialize).join('')
  const scale = width / sheet.width
  const spaces = Object.entries(NAMESPACES).map(([name, value]) => ` ${name}="${value}"`)
  return (first, rows) =>
    `<svg${spaces.join('')} width="${width}" height="${rows}"><g transform="matrix(${scale} 0 0 ${scale} 0 ${-first})">${drawing}</g></svg>`
}

/** The rim is drawn below the letters by itself, since not every program knows `paint-order`. */
function outlined(node: SvgNode, letters: Letters): SvgNode {
  if (node.tag === 'text') return letters.placed(node)
  const children = node.children.map((child) => (typeof child === 'string' ? child : outlined(child, letters)))
  return { ...node, children }
}
