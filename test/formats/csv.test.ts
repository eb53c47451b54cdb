import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { CSV, textCell } from '../../lib/formats/csv'
import type { Sheet } from '../../lib/formats/format'
import { needs, run } from '../tools'
import { anyRows } from './sheet'

const provenance = { version: '1', engine: '1', page: '/', data: '/api/table' }
const columns = [
  { key: 'x', unit: 'Gyr', label: 'time' },
  { key: 'y', unit: '', label: 'number' },
]
const sheet = (rows: readonly (readonly (number | null)[])[]): Sheet => ({
  provenance,
  columns,
  tables: [{ code: 'h0:70', rows: () => rows }],
})
const written = (one: Sheet) => [...CSV.pieces(one)].join('')

describe('text cells', () => {
  test.each(['=1+1', '+1', '-1', '@SUM(A1)', '\t=1', '\r=1', '\n=1'])(
    '%j would run, so an apostrophe stands first',
    (text) => {
      expect(textCell(text).replace(/^"/, '')[0]).toBe("'")
    },
  )
  test.each([
    ['plain', 'plain'],
    ['a,b', '"a,b"'],
    ['a"b', '"a""b"'],
    ['a\r\nb', '"a\r\nb"'],
    ['=a,b', '"\'=a,b"'],
  ])('%j is written %j (RFC 4180, section 2)', (text, cell) => expect(textCell(text)).toBe(cell))
})

test('lines end with CR LF, remarks come first, then the header', () => {
  const lines = written(sheet([[1, null]])).split('\r\n')
  expect(lines.slice(-3)).toEqual(['x,y', '1,', ''])
  expect(lines.slice(0, -3).every((line) => line.startsWith('# '))).toBe(true)
  expect(lines.join('')).not.toMatch(/[\r\n]/)
})
test('negative numbers get no apostrophe', () => {
  expect(written(sheet([[-1.5, -1e-300]]))).toContain('\r\n-1.5,-1e-300\r\n')
})
test('numbers read back to the same doubles', () => {
  fc.assert(
    fc.property(fc.double({ noNaN: true, noDefaultInfinity: true }), (x) => {
      const cell = written(sheet([[x, 0]]))
        .split('\r\n')
        .at(-2)
        ?.split(',')[0]
      expect(Number(cell)).toBe(x + 0)
    }),
  )
})

const READ = `
import csv, json
with open('a.csv', newline='', encoding='utf-8') as file:
    lines = [line for line in file if not line.startswith('#')]
head, *rows = csv.reader(lines)
assert head == ['x', 'y'], head
print(json.dumps([[float(cell) if cell else None for cell in row] for row in rows]))
`

test("Python's csv module reads the same doubles", (context) => {
  needs(context, 'python3')
  const rows = fc.sample(anyRows, { numRuns: 20, seed: 2 }).flat()
  const { said } = run('python3', ['-c', READ], { 'a.csv': written(sheet(rows)) })
  expect(JSON.parse(said)).toEqual(rows)
})
