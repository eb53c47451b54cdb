import { existsSync } from 'node:fs'
import { join } from 'node:path'
import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { LATEX } from '../../lib/formats/latex'
import { tex } from '../../lib/formats/tex'
import { COLUMNS } from '../../lib/quantities/columns'
import { needs, run } from '../tools'
import { anyRows, sheetOf, written } from './sheet'

/** What stands between the rules, cell by cell. */
const cellsOf = (text: string) =>
  text
    .split(/\\midrule\n(?:\\endhead\n)?|\\bottomrule/)[1]
    .split('\\\\\n')
    .slice(0, -1)
    .map((line) => line.split(' & ').map((cell) => cell.trim()))

test('numbers read back to the same doubles, and no number is a dash', () => {
  fc.assert(
    fc.property(anyRows, (rows) => {
      const read = cellsOf(written(LATEX, sheetOf(rows)))
      expect(read.map((row) => row.map((cell) => (cell === '--' ? null : Number(cell))))).toEqual(rows)
    }),
  )
})

test('the columns are aligned in the source', () => {
  const lines = written(
    LATEX,
    sheetOf([
      [1, -2.5e-7],
      [null, 3.25],
    ]),
  )
    .split('\n')
    .filter((line) => line.includes(' & '))
  expect(new Set(lines.map((line) => line.indexOf('&'))).size).toBe(1)
  expect(new Set(lines.map((line) => line.length)).size).toBe(1)
})

test('carries code, link, engine version, units and citation', () => {
  const text = written(LATEX, sheetOf([[1, 2]]))
  expect(text).toContain('% scenario: h0:70,matter:0.1,as:a%26b_0\n')
  expect(text).toContain('% link: /?s=h0:70&s=x\n')
  expect(text).toContain('% x: time, Gyr\n')
  expect(text).toContain('% cite as: The Longhence authors')
  expect(text).toMatch(/\\caption\{Scenario \\texttt\{h0:70,\\allowbreak\{\}.*engine 7 \(The Longhence authors\)\.\}/)
})

test('several scenarios stand in a first column', () => {
  const [first] = cellsOf(written(LATEX, sheetOf([[1, 2]], [[3, 4]])))
  expect(first).toEqual(['\\texttt{h0:70,matter:0.1,as:a\\%26b\\_0}', '1', '2'])
})

describe('signs of TeX', () => {
  test.each([
    ['100 % & more_or $less', '100 \\% \\& more\\_or \\$less'],
    ['\\input{x}', '\\textbackslash{}input\\{x\\}'],
    ['kg/m³', 'kg/m$^3$'],
  ])('%s', (plain, escaped) => expect(tex(plain)).toBe(escaped))
})

const around = (table: string) =>
  `\\documentclass{article}\\usepackage{booktabs,longtable}\\begin{document}\n${table}\\end{document}\n`

test('LaTeX sets it', (context) => {
  needs(context, 'latex')
  const long = Array.from({ length: 60 }, (_, i) => [i, null] as const)
  for (const sheet of [
    sheetOf([[1, null]]),
    sheetOf([[1, 2]], [[3, 4]]),
    sheetOf(long),
    { ...sheetOf([]), columns: COLUMNS },
  ]) {
    let made = false
    const { status, said } = run(
      'latex',
      ['-interaction=nonstopmode', '-halt-on-error', 'a.tex'],
      { 'a.tex': around(written(LATEX, sheet)) },
      (folder) => {
        made = existsSync(join(folder, 'a.dvi'))
      },
    )
    expect([status, made], said).toEqual([0, true])
  }
}, 60_000)
