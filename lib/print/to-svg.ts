/** A sheet as an SVG file that needs nothing else: letters are outlines, with their words beside them for a voice. */
import { px, type SvgNode, serialize, svg } from '../figures/svg'
import type { Face, Faces } from './face'
import { type Run, runsOfText } from './runs'
import type { Sheet } from './sheet'

export interface About {
  readonly title: string
  /** For those who do not see it, and where it comes from. */
  readonly description: string
}

/** Width of the rim around letters, as on the page. */
const HALO = 3

export function toSvg({ node, width, height, scale }: Sheet, faces: Faces, { title, description }: About): string {
  const root = svg(
    'svg',
    {
      xmlns: 'http://www.w3.org/2000/svg',
      width: `${px(width * scale)}pt`,
      height: `${px(height * scale)}pt`,
      viewBox: `0 0 ${width} ${height}`,
      role: 'img',
      'aria-labelledby': 'title description',
    },
    svg('title', { id: 'title' }, title),
    svg('desc', { id: 'description' }, description),
    outlined(node, faces),
  )
  return `<?xml version="1.0" encoding="UTF-8"?>\n${serialize(root)}\n`
}

function outlined(node: SvgNode, faces: Faces): SvgNode {
  if (node.tag === 'text')
    return svg('g', { 'aria-label': wordsOf(node) }, ...runsOfText(node, faces).flatMap((run) => drawn(run, faces)))
  return {
    ...node,
    children: node.children.map((child) => (typeof child === 'string' ? child : outlined(child, faces))),
  }
}

const wordsOf = ({ children }: SvgNode): string =>
  children.map((child) => (typeof child === 'string' ? child : wordsOf(child))).join('')

/** The rim is a path of its own below, since not every program knows `paint-order`. */
function drawn(run: Run, faces: Faces): SvgNode[] {
  const d = outlineOf(run, faces[run.face])
  if (d === '') return []
  const rim = { fill: 'none', stroke: run.halo ?? '', 'stroke-width': HALO, 'stroke-linejoin': 'round' }
  return [...(run.halo === null ? [] : [svg('path', { d, ...rim })]), svg('path', { d, fill: run.fill })]
}

const LETTERS: Readonly<Record<string, string>> = {
  moveTo: 'M',
  lineTo: 'L',
  quadraticCurveTo: 'Q',
  bezierCurveTo: 'C',
  closePath: 'Z',
}

export function outlineOf({ text, x, y, size }: Run, face: Face): string {
  const { glyphs, positions } = face.layout(text)
  const scale = size / face.unitsPerEm
  let [d, pen] = ['', x]
  glyphs.forEach(({ path }, i) => {
    const { xAdvance, xOffset, yOffset } = positions[i]
    const [left, base] = [pen + xOffset * scale, y - yOffset * scale]
    for (const { command, args } of path.commands) {
      d +=
        (LETTERS[command] ?? '') +
        args.map((arg, k) => px(k % 2 === 0 ? left + arg * scale : base - arg * scale)).join(' ')
    }
    pen += xAdvance * scale
  })
  return d
}
