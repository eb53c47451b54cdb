/** Chunks that a PNG gets beside its pixels (W3C, Portable Network Graphics, third edition): its density, and words about it. */

const SIGNATURE_AND_HEADER = 33

/** Polynomial of CRC-32, annex D of the standard. */
const TABLE = Uint32Array.from({ length: 256 }, (_, n) => {
  let c = n
  for (let k = 0; k < 8; k++) c = c & 1 ? 0xedb88320 ^ (c >>> 1) : c >>> 1
  return c
})

export function crc32(bytes: Uint8Array): number {
  let c = 0xffffffff
  for (const byte of bytes) c = TABLE[(c ^ byte) & 0xff] ^ (c >>> 8)
  return (c ^ 0xffffffff) >>> 0
}

function chunk(type: string, data: Uint8Array): Uint8Array {
  const bytes = new Uint8Array(12 + data.length)
  const view = new DataView(bytes.buffer)
  view.setUint32(0, data.length)
  bytes.set(new TextEncoder().encode(type), 4)
  bytes.set(data, 8)
  view.setUint32(8 + data.length, crc32(bytes.subarray(4, 8 + data.length)))
  return bytes
}

/** Pixels a metre, as the standard wants it. */
function density(dpi: number): Uint8Array {
  const data = new Uint8Array(9)
  const view = new DataView(data.buffer)
  const perMetre = Math.round(dpi / 0.0254)
  view.setUint32(0, perMetre)
  view.setUint32(4, perMetre)
  data[8] = 1
  return chunk('pHYs', data)
}

/** International text without compression, language or translated keyword. */
const words = (keyword: string, text: string): Uint8Array =>
  chunk('iTXt', new TextEncoder().encode(`${keyword}\0\0\0\0\0${text}`))

export function withWords(
  png: Uint8Array,
  dpi: number,
  about: Readonly<Record<string, string>>,
): Uint8Array<ArrayBuffer> {
  const added = [density(dpi), ...Object.entries(about).map(([keyword, text]) => words(keyword, text))]
  const bytes = new Uint8Array(png.length + added.reduce((sum, { length }) => sum + length, 0))
  bytes.set(png.subarray(0, SIGNATURE_AND_HEADER))
  let at = SIGNATURE_AND_HEADER
  for (const one of added) {
    bytes.set(one, at)
    at += one.length
  }
  bytes.set(png.subarray(SIGNATURE_AND_HEADER), at)
  return bytes
}
