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

export interface Picture {
  readonly width: number
  readonly height: number
  /** Four bytes a pixel, the last of which is left out: our figures have a ground. */
  readonly pixels: Uint8Array
}

/** Bytes that are made at a time. */
const STRIP = 2 ** 18
/** The filter that takes from each byte the one above it: flat areas and upright lines become nothing. */
const UP = 2

/** The rows as they are compressed, some at a time in an array that is used again. */
export function* filteredStrips({ width, height, pixels }: Picture): Generator<Uint8Array> {
  const words = new Uint32Array(pixels.buffer, pixels.byteOffset, width * height)
  const stride = 3 * width + 1
  const rows = Math.max(1, Math.floor(STRIP / stride))
  const strip = new Uint8Array(rows * stride)
  for (let y = 0; y < height; y += rows) {
    const count = Math.min(rows, height - y)
    strip.fill(0)
    for (let row = 0; row < count; row++) filterRow(words, (y + row) * width, width, strip, row * stride)
    yield strip.subarray(0, count * stride)
  }
}

/** `strip` holds nothing yet. */
function filterRow(words: Uint32Array, from: number, width: number, strip: Uint8Array, at: number): void {
  strip[at] = UP
  for (let x = 0; x < width; x++) {
    const here = words[from + x]
    const above = from === 0 ? 0 : words[from + x - width]
    if (here === above) continue
    const to = at + 1 + 3 * x
    strip[to] = here - above
    strip[to + 1] = (here >>> 8) - (above >>> 8)
    strip[to + 2] = (here >>> 16) - (above >>> 16)
  }
}

/** `compressed` are the filtered rows. */
export function pngFile(
  { width, height }: Picture,
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
