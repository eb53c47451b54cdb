/** The typeface as drawers of files need it: three faces, of each the outlines and advances of a run of text. */

export interface Glyph {
  readonly id: number
  readonly path: { readonly commands: readonly { readonly command: string; readonly args: readonly number[] }[] }
}

export interface Face {
  readonly unitsPerEm: number
  layout(text: string): {
    readonly glyphs: readonly Glyph[]
    readonly positions: readonly { readonly xAdvance: number; readonly xOffset: number; readonly yOffset: number }[]
  }
}

export const FACE_KEYS = ['regular', 'semibold', 'italic'] as const
export type FaceKey = (typeof FACE_KEYS)[number]
export type Faces = Readonly<Record<FaceKey, Face>>

export function widthOf(face: Face, text: string, size: number): number {
  const units = face.layout(text).positions.reduce((sum, { xAdvance }) => sum + xAdvance, 0)
  return (units * size) / face.unitsPerEm
}
