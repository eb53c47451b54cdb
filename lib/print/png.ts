/** PNG (W3C, Portable Network Graphics, third edition): rows as they are compressed, and the file around them. */

const SIGNATURE = Uint8Array.of(0x89, 0x50, 0x4e, 0x47, 0x0d, 0x0a, 0x1a, 0x0a)

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

/** Colour type 2 with eight bits a channel: red, green, blue. */
function header(width: number, height: number): Uint8Array {
  const data = new Uint8Array(13)
  const view = new DataView(data.buffer)
  view.setUint32(0, width)
  view.setUint32(4, height)
  data.set([8, 2, 0, 0, 0], 8)
  return chunk('IHDR', data)
}

/** Some rows of a picture, from above downwards. */
export interface Band {
  readonly width: number
  readonly height: number
  /** Four bytes a pixel, the last of which is left out: our figures have a ground. */
  readonly pixels: Uint8Array
}

/** The filter that takes from each byte the one above it: flat areas and upright lines become nothing. */
const UP = 2

/** Bands one after the other as they are compressed, in an array that is used again. None has more than `most` rows. */
export function rowFilter(width: number, most: number): (band: Band) => Uint8Array {
  const stride = 3 * width + 1
  const out = new Uint8Array(most * stride)
  const above = new Uint32Array(width)
  return ({ height, pixels }) => {
    const words = new Uint32Array(pixels.buffer, pixels.byteOffset, width * height)
    out.fill(0)
    for (let y = 0; y < height; y++) {
      const row = words.subarray(y * width, (y + 1) * width)
      filterRow(row, y === 0 ? above : words.subarray((y - 1) * width, y * width), out, y * stride)
    }
    above.set(words.subarray((height - 1) * width))
    return out.subarray(0, height * stride)
  }
}

/** `out` holds nothing yet. */
function filterRow(row: Uint32Array, above: Uint32Array, out: Uint8Array, at: number): void {
  out[at] = UP
  for (let x = 0; x < row.length; x++) {
    const here = row[x]
    const over = above[x]
    if (here === over) continue
    const to = at + 1 + 3 * x
    out[to] = here - over
    out[to + 1] = (here >>> 8) - (over >>> 8)
    out[to + 2] = (here >>> 16) - (over >>> 16)
  }
}

/** `compressed` are the filtered rows. */
export function pngFile(
  { width, height }: Pick<Band, 'width' | 'height'>,
  compressed: Uint8Array,
  dpi: number,
  about: Readonly<Record<string, string>>,
): Uint8Array<ArrayBuffer> {
  const told = Object.entries(about).map(([keyword, text]) => words(keyword, text))
  const parts = [
    SIGNATURE,
    header(width, height),
    density(dpi),
    ...told,
    chunk('IDAT', compressed),
    chunk('IEND', new Uint8Array()),
  ]
  const bytes = new Uint8Array(parts.reduce((sum, { length }) => sum + length, 0))
  let at = 0
  for (const one of parts) {
    bytes.set(one, at)
    at += one.length
  }
  return bytes
}
