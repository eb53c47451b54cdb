/** From a sheet to the bytes of a file. */
import { buffer } from 'node:stream/consumers'
import { createDeflate } from 'node:zlib'
import { renderAsync } from '@resvg/resvg-js'
import type { FigureFile } from '../../../lib/answers/figure'
import { type Band, pngFile, rowFilter } from '../../../lib/print/png'
import type { Sheet } from '../../../lib/print/sheet'
import { toPdf } from '../../../lib/print/to-pdf'
import { bandsOf, pixelsOf, toSvg } from '../../../lib/print/to-svg'
import { typeface } from './faces'

/** Of the first version: the same figure has the same bytes whenever it is made. */
const DATE = new Date(Date.UTC(2026, 11, 1))

export async function drawn(file: FigureFile): Promise<Uint8Array<ArrayBuffer>> {
  const { sheet, about, format } = file
  const { faces, files } = typeface()
  if (format.key === 'pdf') return toPdf(sheet, { faces, files, about, date: DATE })
  return format.key === 'svg' ? new TextEncoder().encode(toSvg(sheet, faces, about)) : png(file)
}

/** Pixels that are drawn at a time. Memory for a whole picture would have to be found by the system first, which takes longer than drawing. */
const BAND = 2 ** 20
/** Higher levels take far more time for little, since most of a filtered figure is nothing. */
const LEVEL = 3

async function png({ sheet, dpi, about }: FigureFile): Promise<Uint8Array<ArrayBuffer>> {
  const size = pixelsOf(sheet, Math.round((sheet.width * sheet.scale * dpi) / 72))
  const deflate = createDeflate({ level: LEVEL, memLevel: 9 })
  const compressed = buffer(deflate)
  const most = Math.ceil(BAND / size.width)
  const filtered = rowFilter(size.width, most)
  for await (const band of bands(sheet, size, most)) {
    await new Promise<void>((resolve, reject) => {
      deflate.write(filtered(band), (error) => (error ? reject(error) : resolve()))
    })
  }
  deflate.end()
  const words = { Title: about.title, Description: about.description, Software: 'Longhence' }
  return pngFile(size, await compressed, dpi, words)
}

/** One after the other; while one is read, the next is drawn. */
async function* bands(
  sheet: Sheet,
  { width, height }: Pick<Band, 'width' | 'height'>,
  rows: number,
): AsyncGenerator<Band> {
  const svgOf = bandsOf(sheet, typeface().faces, width)
  const draw = (first: number): Promise<Band> | null => {
    if (first >= height) return null
    // Letters are outlines already, so no font is looked for. The last row may be covered in part.
    const options = { font: { loadSystemFonts: false }, background: sheet.ground }
    return renderAsync(svgOf(first, Math.min(rows, height - first)), options)
  }
  let next = draw(0)
  for (let first = rows; next !== null; first += rows) {
    const band: Band = await next
    next = draw(first)
    yield band
  }
}
