import { fileURLToPath } from 'node:url'
import fc from 'fast-check'
import { expect, test } from 'vitest'
import { VOTABLE } from '../../lib/formats/votable'
import { vounitOf } from '../../lib/formats/votable-words'
import { COLUMNS } from '../../lib/quantities/columns'
import { needs, run } from '../tools'
import { anyRows, sheetOf, written } from './sheet'

const SCHEMA = fileURLToPath(new URL('./votable.xsd', import.meta.url))
const REAL = { ...sheetOf([]), columns: COLUMNS }

const cellsOf = (text: string) =>
  [...text.matchAll(/<TR>(.*?)<\/TR>/g)].map(([, row]) => [...row.matchAll(/<TD>(.*?)<\/TD>/g)].map(([, cell]) => cell))
const numberOf = (cell: string) => (cell === 'NaN' ? null : Number(cell))

test('numbers read back to the same doubles, and no number is NaN', () => {
  fc.assert(
    fc.property(anyRows, (rows) => {
      expect(cellsOf(written(VOTABLE, sheetOf(rows))).map((row) => row.map(numberOf))).toEqual(rows)
    }),
  )
})

test('one scenario has no column of its own, several have', () => {
  expect(written(VOTABLE, sheetOf([[1, 2]]))).not.toContain('name="scenario" datatype')
  const text = written(VOTABLE, sheetOf([[1, null]], [[2, 3]]))
  expect(text).toContain('<FIELD name="scenario" datatype="char" arraysize="*"')
  expect(cellsOf(text)).toEqual([
    ['h0:70,matter:0.1,as:a%26b_0', '1', 'NaN'],
    ['h0:70,matter:0.2,as:a%26b_1', '2', '3'],
  ])
})

test('carries code, link, engine version, units and citation', () => {
  const text = written(VOTABLE, sheetOf([[1, 2]]))
  expect(text).toContain('<INFO name="scenario" value="h0:70,matter:0.1,as:a%26b_0"/>')
  expect(text).toContain('<INFO name="link" value="/?s=h0:70&amp;s=x"/>')
  expect(text).toContain('<INFO name="engine" value="7"/>')
  expect(text).toContain('<INFO name="citation" value="The Longhence authors')
  expect(text).toContain('name="x" datatype="double" unit="Gyr"')
})

test('every unit of a column has its VOUnit', () => {
  for (const { unit } of COLUMNS) expect(vounitOf(unit)).not.toBe('')
  expect(() => vounitOf('furlong')).toThrow()
})

test('xmllint finds it well formed, and as the standard wants it', (context) => {
  needs(context, 'xmllint')
  const check = (text: string) => run('xmllint', ['--noout', '--nonet', '--schema', SCHEMA, 'a.vot'], { 'a.vot': text })
  for (const sheet of [sheetOf([[1, null]]), sheetOf([[1, 2]], [[3, 4]]), sheetOf([]), REAL]) {
    expect(check(written(VOTABLE, sheet))).toMatchObject({ status: 0 })
  }
  // The schema does refuse something.
  const good = written(VOTABLE, sheetOf([[1, null]]))
  expect(check(good.replace('unit="Gyr"', 'unit="Gyr year"')).status).not.toBe(0)
  expect(check(good.replace('datatype="double"', 'datatype="real"')).status).not.toBe(0)
  expect(check(good.replace('v1.3', 'v1.2')).status).not.toBe(0)
})

const READ = `
import json, math, xml.etree.ElementTree as tree
V = '{http://www.ivoa.net/xml/VOTable/v1.3}'
table = tree.parse('a.vot').find(f'{V}RESOURCE/{V}TABLE')
assert [f.get('datatype') for f in table.iter(f'{V}FIELD')] == ['double', 'double']
rows = [[float(cell.text) for cell in row] for row in table.iter(f'{V}TR')]
print(json.dumps([[None if math.isnan(x) else x for x in row] for row in rows]))
`

test("Python's xml module reads the same doubles", (context) => {
  needs(context, 'python3')
  const rows = [...fc.sample(anyRows, { numRuns: 20, seed: 1 }), [[5e-324, 1.7976931348623157e308]] as const].flat()
  const { said } = run('python3', ['-c', READ], { 'a.vot': written(VOTABLE, sheetOf(rows)) })
  expect(JSON.parse(said)).toEqual(rows)
})
