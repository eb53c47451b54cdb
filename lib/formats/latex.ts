/** A LaTeX table for booktabs: cells are the doubles themselves, padded so that the source can be read too. */
import type { Table } from '../tables/table'
import { type Format, remarksOf, type Sheet } from './format'
import { tex } from './tex'

const MOST = 1000
/** Longer ones break over pages. */
const ONE_PAGE = 45
/** An en dash. */
const MISSING = '--'

export const LATEX: Format = {
  key: 'latex',
  extension: 'tex',
  label: 'LaTeX',
  mediaType: 'text/x-tex; charset=utf-8',
  mostRows: MOST,
  *pieces(sheet) {
    const body = sheet.tables.flatMap((table) => rowsOf(table, sheet.tables.length > 1))
    const heads = headsOf(sheet)
    const widths = heads[0].map((_, i) => Math.max(...[...heads, ...body].map((row) => row[i].length)))
    const line = (row: readonly string[]) => `${row.map((cell, i) => cell.padStart(widths[i])).join(' & ')} \\\\\n`
    yield remarks(sheet, body.length > ONE_PAGE)
    const frame = body.length > ONE_PAGE ? longFrame(sheet) : floatFrame(sheet)
    yield frame.before
    yield `\\toprule\n${heads.map(line).join('')}\\midrule\n${frame.afterHead}`
    for (const row of body) yield line(row)
    yield `\\bottomrule\n${frame.after}`
  },
}

function rowsOf({ code, rows }: Table, several: boolean): (readonly string[])[] {
  const first = several ? [`\\texttt{${tex(code)}}`] : []
  return [...rows()].map((cells) => [...first, ...cells.map((cell) => (cell === null ? MISSING : String(cell)))])
}

/** Labels over units; a line of units only where there is one. */
function headsOf({ columns, tables }: Sheet): [readonly string[], ...(readonly string[])[]] {
  const several = tables.length > 1
  const labels = [...(several ? ['scenario'] : []), ...columns.map(({ label }) => tex(label))]
  const units = [...(several ? [''] : []), ...columns.map(({ unit }) => tex(unit))]
  return units.every((unit) => unit === '') ? [labels] : [labels, units]
}

function remarks(sheet: Sheet, long: boolean): string {
  return [...remarksOf(sheet), `needs: \\usepackage{booktabs}${long ? '\\usepackage{longtable}' : ''}`]
    .map((text) => `% ${text}\n`)
    .join('')
}

interface Frame {
  readonly before: string
  readonly afterHead: string
  readonly after: string
}

function floatFrame(sheet: Sheet): Frame {
  return {
    before: `\\begin{table}\n\\caption{${caption(sheet)}}\n\\begin{tabular}{${alignment(sheet)}}\n`,
    afterHead: '',
    after: '\\end{tabular}\n\\end{table}\n',
  }
}

function longFrame(sheet: Sheet): Frame {
  return {
    before: `\\begin{longtable}{${alignment(sheet)}}\n\\caption{${caption(sheet)}}\\\\\n`,
    afterHead: '\\endhead\n',
    after: '\\end{longtable}\n',
  }
}

function alignment({ columns, tables }: Sheet): string {
  return `${tables.length > 1 ? 'l' : ''}${'r'.repeat(columns.length)}`
}

/** Codes may break after their commas. */
function caption({ provenance: { version, engine }, tables }: Sheet): string {
  const codes = tables.map(({ code }) => `\\texttt{${tex(code).replaceAll(',', ',\\allowbreak{}')}}`)
  const noun = codes.length > 1 ? 'Scenarios' : 'Scenario'
  return `${noun} ${codes.join('; ')}. Computed with Longhence ${tex(version)}, engine ${tex(engine)} (The Longhence authors).`
}
