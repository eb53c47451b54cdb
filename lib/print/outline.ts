/** The outlines of letters as data of paths. */
import { px } from '../figures/svg'
import type { Face, Glyph } from './face'
import type { Run } from './runs'

const LETTERS: Readonly<Record<string, string>> = {
  moveTo: 'M',
  lineTo: 'L',
  quadraticCurveTo: 'Q',
  bezierCurveTo: 'C',
  closePath: 'Z',
}

interface Place {
  readonly x: number
  readonly y: number
  readonly scale: number
}

/** Fonts count upwards, drawings downwards. */
export const outlineOfGlyph = ({ path }: Glyph, { x, y, scale }: Place): string =>
  path.commands
    .map(({ command, args }) => {
      const numbers = args.map((arg, k) => px(k % 2 === 0 ? x + arg * scale : y - arg * scale))
      return (LETTERS[command] ?? '') + numbers.join(' ').replaceAll(' -', '-')
    })
    .join('')

/** Where each letter of a run stands, in units of the font from its beginning. */
export function lettersOf({ text }: Pick<Run, 'text'>, face: Face): readonly { glyph: Glyph; x: number; y: number }[] {
  const { glyphs, positions } = face.layout(text)
  let pen = 0
  return glyphs.map((glyph, i) => {
    const { xAdvance, xOffset, yOffset } = positions[i]
    const letter = { glyph, x: pen + xOffset, y: -yOffset }
    pen += xAdvance
    return letter
  })
}

export function outlineOf(run: Run, face: Face): string {
  const scale = run.size / face.unitsPerEm
  return lettersOf(run, face)
    .map(({ glyph, x, y }) => outlineOfGlyph(glyph, { x: run.x + x * scale, y: run.y + y * scale, scale }))
    .join('')
}
