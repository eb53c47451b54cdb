/** Texts of a drawing as letters that stand once each in the file and are placed wherever they occur. */
import { px, type SvgNode, svg } from '../figures/svg'
import type { FaceKey, Faces } from './face'
import { lettersOf, outlineOfGlyph } from './outline'
import { type Run, runsOfText } from './runs'

/** Width of the rim around letters, as on the page. */
const HALO = 3

export interface Letters {
  /** A text as drawn letters, with its words beside them for a voice. */
  placed(text: SvgNode): SvgNode
  /** Every letter that was placed. */
  definitions(): SvgNode
}

export function lettersWith(faces: Faces): Letters {
  const outlines = new Map<string, SvgNode>()
  let runs = 0

  const lettersIn = (run: Run): SvgNode[] =>
    lettersOf(run, faces[run.face]).flatMap(({ glyph, x, y }) => {
      if (glyph.path.commands.length === 0) return []
      const id = letterId(run.face, glyph.id)
      if (!outlines.has(id)) outlines.set(id, svg('path', { id, d: outlineOfGlyph(glyph, { x: 0, y: 0, scale: 1 }) }))
      return svg('use', { 'xlink:href': `#${id}`, ...(x === 0 ? {} : { x: px(x) }), ...(y === 0 ? {} : { y: px(y) }) })
    })

  const drawn = (run: Run): SvgNode[] => {
    const scale = run.size / faces[run.face].unitsPerEm
    const place = { transform: `translate(${px(run.x)} ${px(run.y)}) scale(${Number(scale.toPrecision(6))})` }
    const letters = lettersIn(run)
    if (letters.length === 0) return []
    if (run.halo === null) return [svg('g', { ...place, fill: run.fill }, ...letters)]
    const id = `run${++runs}`
    const rim = { fill: 'none', stroke: run.halo, 'stroke-width': px(HALO / scale), 'stroke-linejoin': 'round' }
    return [
      svg('g', { ...place, ...rim }, svg('g', { id }, ...letters)),
      svg('use', { 'xlink:href': `#${id}`, ...place, fill: run.fill }),
    ]
  }

  return {
    placed: (text) => svg('g', { 'aria-label': wordsOf(text) }, ...runsOfText(text, faces).flatMap(drawn)),
    definitions: () => svg('defs', {}, ...outlines.values()),
  }
}

const letterId = (face: FaceKey, glyph: number): string => `${face.charAt(0)}${glyph}`

const wordsOf = ({ children }: SvgNode): string =>
  children.map((child) => (typeof child === 'string' ? child : wordsOf(child))).join('')
