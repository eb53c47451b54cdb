/** Our PNG opened by programs that are not ours: Python's standard library, which reads it byte by byte, and pngcheck. */
import { expect, test } from 'vitest'
import { drawn } from '../../app/api/figure/draw'
import { askFigure, type FigureFile } from '../../lib/answers/figure'
import { answerOf } from '../answers/ask'
import { needs, run } from '../tools'

/** Undoes the filters of a row as the specification says (W3C, Portable Network Graphics, 9.2), and says what is seen. */
const READER = `
import json, struct, zlib
data = open('a.png', 'rb').read()
assert data[:8] == b'\\x89PNG\\r\\n\\x1a\\n'
at, chunks = 8, []
while at < len(data):
    length, kind = struct.unpack('>I4s', data[at:at + 8])
    body = data[at + 8:at + 8 + length]
    assert struct.unpack('>I', data[at + 8 + length:at + 12 + length])[0] == zlib.crc32(kind + body)
    chunks.append((kind, body))
    at += 12 + length
width, height, depth, colour, _, _, interlaced = struct.unpack('>IIBBBBB', chunks[0][1])
step = {2: 3, 6: 4}[colour]
assert (depth, interlaced) == (8, 0)
raw = zlib.decompress(b''.join(body for kind, body in chunks if kind == b'IDAT'))
size = width * step
assert len(raw) == height * (size + 1)
before, seen = bytearray(size), {}
for row in range(height):
    start = row * (size + 1)
    kind, line = raw[start], bytearray(raw[start + 1:start + 1 + size])
    for i in range(size):
        left = line[i - step] if i >= step else 0
        up = before[i]
        corner = before[i - step] if i >= step else 0
        if kind == 1: add = left
        elif kind == 2: add = up
        elif kind == 3: add = (left + up) // 2
        elif kind == 4:
            guess = left + up - corner
            add = min((abs(guess - left), 0, left), (abs(guess - up), 1, up), (abs(guess - corner), 2, corner))[2]
        else: add = 0
        line[i] = (line[i] + add) & 255
    for i in range(0, size, step):
        pixel = bytes(line[i:i + 3])
        seen[pixel] = seen.get(pixel, 0) + 1
    before = line
most = max(seen, key=seen.get)
print(json.dumps({'width': width, 'height': height, 'last': chunks[-1][0].decode(), 'colours': len(seen),
    'most': '#' + most.hex(), 'share': seen[most] / (width * height)}))
`

const DPI = 96
const ask = (pairs: URLSearchParams) => askFigure(pairs, { version: '9.8.7', base: '' })
const fileOf = (theme: string): FigureFile =>
  answerOf(ask, `s=h0:70&s=h0:70,matter:1.4,dark:0&size=column&format=png&dpi=${DPI}&theme=${theme}`)
const pixels = ({ sheet }: FigureFile, length: number): number => (length * sheet.scale * DPI) / 72

test.for(['paper', 'night'])(
  'Python reads every pixel, and they are those of a drawing: %s',
  async (theme, context) => {
    needs(context, 'python3')
    const file = fileOf(theme)
    const { status, said, complaint } = run('python3', ['-c', READER], { 'a.png': await drawn(file) })
    expect([status, complaint]).toEqual([0, ''])
    const { width, height, last, colours, most, share } = JSON.parse(said)
    expect(Math.abs(width - pixels(file, file.sheet.width))).toBeLessThanOrEqual(1)
    expect(Math.abs(height - pixels(file, file.sheet.height))).toBeLessThanOrEqual(1)
    expect(last).toBe('IEND')
    // Most of it is ground, but by far not all: lines, letters and ribbons have some twenty colours, and their edges hundreds.
    expect(most).toBe(file.sheet.ground)
    expect(share).toBeGreaterThan(0.2)
    expect(share).toBeLessThan(0.9)
    expect(colours).toBeGreaterThan(100)
  },
)

test('pngcheck finds nothing wrong', async (context) => {
  needs(context, 'pngcheck', ['-h'])
  const { status, said } = run('pngcheck', ['a.png'], { 'a.png': await drawn(fileOf('paper')) })
  expect(said).toMatch(/^OK: a\.png \(\d+x\d+, 24-bit|^OK: a\.png \(\d+x\d+, 32-bit/)
  expect(status).toBe(0)
})
