import { Resvg } from '@resvg/resvg-js'
import { askQr, type QrFile } from '../../../lib/answers/qr'
import { mapped } from '../../../lib/answers/question'
import { serialize } from '../../../lib/figures/svg'
import { HOME } from '../home'
import { type Body, pairsOf, reply } from '../reply'

export const dynamic = 'force-dynamic'

/** Pixels along the side of a PNG, at least. */
const SIDE = 1000

/** The link of scenarios as a QR code. */
export function GET(request: Request): Response {
  return reply(request, '/api/qr', askQr(pairsOf(request), HOME), (question) => mapped(question.answer(), bodyOf))
}

function bodyOf({ mediaType, format, fileName, code }: QrFile): Body {
  const svg = serialize(code.node)
  const content = format === 'svg' ? new TextEncoder().encode(svg) : png(svg, code.size)
  return { content, headers: { 'Content-Type': mediaType, 'Content-Disposition': `inline; filename="${fileName}"` } }
}

/** Each module is a whole number of pixels. */
function png(svg: string, size: number): Uint8Array<ArrayBuffer> {
  const value = Math.ceil(SIDE / size) * size
  return new Uint8Array(
    new Resvg(svg, { fitTo: { mode: 'width', value }, font: { loadSystemFonts: false } }).render().asPng(),
  )
}
