/** QR codes (ISO/IEC 18004), black on white with the quiet zone that readers need. */
import { encode } from 'uqr'
import { type SvgNode, svg } from '../figures/svg'

/** Modules of white around; the standard asks for four. */
const QUIET = 4
/** Bytes that the largest code holds at the lowest level of correction (version 40-L, table 7 of the standard). */
export const MOST_BYTES = 2953

export interface QrCode {
  /** Modules along each side, the quiet zone included. */
  readonly size: number
  readonly node: SvgNode
}

/** Null where the text is too long. The level of correction rises as far as the size allows. */
export function qrCode(text: string): QrCode | null {
  if (new TextEncoder().encode(text).length > MOST_BYTES) return null
  const { size, data } = encode(text, { ecc: 'L', boostEcc: true, border: QUIET })
  const node = svg(
    'svg',
    {
      xmlns: 'http://www.w3.org/2000/svg',
      viewBox: `0 0 ${size} ${size}`,
      width: 8 * size,
      height: 8 * size,
      'shape-rendering': 'crispEdges',
    },
    svg('title', {}, text),
    svg('rect', { width: size, height: size, fill: '#ffffff' }),
    svg('path', { d: data.map(barsOf).join(''), fill: '#000000' }),
  )
  return { size, node }
}

/** Black modules that touch are one bar. */
function barsOf(row: readonly boolean[], y: number): string {
  let path = ''
  for (let x = 0; x < row.length; x++) {
    if (!row[x]) continue
    const from = x
    while (row[x + 1]) x++
    path += `M${from} ${y}h${x + 1 - from}v1h${from - x - 1}z`
  }
  return path
}
