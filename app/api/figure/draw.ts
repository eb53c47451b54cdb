/** From a sheet to the bytes of a file. */
import { buffer } from 'node:stream/consumers'
import { createDeflate } from 'node:zlib'
import { renderAsync } from '@resvg/resvg-js'
import type { FigureFile } from '../../../lib/answers/figure'
import { filteredStrips, type Picture, pngFile } from '../../../lib/print/png'
import { toPdf } from '../../../lib/print/to-pdf'
import { toSvg } from '../../../lib/print/to-svg'
import { typeface } from './faces'

/** Of the first version: the same figure has the same bytes whenever it is made. */
const DATE = new Date(Date.UTC(2026, 11, 1))

export async function drawn(file: FigureFile): Promise<Uint8Array<ArrayBuffer>> {
  const { sheet, about, format } = file
  const { faces, files } = typeface()
  if (format.key === 'pdf') return toPdf(sheet, { faces, files, about, date: DATE })
  const svg = toSvg(sheet, faces, about)
  return format.key === 'svg' ? new TextEncoder().encode(svg) : png(svg, file)
}

/** Letters are outlines already, so no font is looked for. */
async function png(svg: string, { sheet, dpi, about }: FigureFile): Promise<Uint8Array<ArrayBuffer>> {
  const value = Math.round((sheet.width * sheet.scale * dpi) / 72)
  const { width, height, pixels } = await renderAsync(svg, {
    fitTo: { mode: 'width', value },
    font: { loadSystemFonts: false },
    // The last row may be covered in part.
    background: sheet.ground,
  })
  const picture = { width, height, pixels }
  const words = { Title: about.title, Description: about.description, Software: 'Longhence' }
  return pngFile(picture, await compressed(picture), dpi, words)
}

/** Higher levels take far more time for little, since most of a filtered figure is nothing. */
const LEVEL = 3

async function compressed(picture: Picture): Promise<Uint8Array> {
  const deflate = createDeflate({ level: LEVEL, memLevel: 9 })
  const all = buffer(deflate)
  for (const strip of filteredStrips(picture)) {
    await new Promise<void>((resolve, reject) => {
      deflate.write(strip, (error) => (error ? reject(error) : resolve()))
    })
  }
  deflate.end()
  return all
}
