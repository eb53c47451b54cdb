/** Comma-separated values, RFC 4180, after lines that start with # and say where the table comes from. */
import type { Cells } from '../tables/table'
import { type Format, MOST_ROWS, remarksOf } from './format'

const END = '\r\n'

export const CSV: Format = {
  key: 'csv',
  extension: 'csv',
  label: 'CSV',
  mediaType: 'text/csv; charset=utf-8; header=present',
  mostRows: MOST_ROWS,
  *pieces(sheet) {
    const several = sheet.tables.length > 1
    for (const line of remarksOf(sheet)) yield `# ${line}${END}`
    yield [...(several ? ['scenario'] : []), ...sheet.columns.map(({ key }) => key)].map(textCell).join(',') + END
    for (const { code, rows } of sheet.tables) {
      const first = several ? `${textCell(code)},` : ''
      for (const cells of rows()) yield first + numberCells(cells) + END
    }
  },
}

function numberCells(cells: Cells): string {
  let line = ''
  for (let i = 0; i < cells.length; i++) line += (i > 0 ? ',' : '') + (cells[i] ?? '')
  return line
}

/** What a spreadsheet would run gets an apostrophe before it; what would break the line is quoted. */
export function textCell(text: string): string {
  const harmless = /^[=+\-@\t\r\n]/.test(text) ? `'${text}` : text
  return /[",\r\n]/.test(harmless) ? `"${harmless.replaceAll('"', '""')}"` : harmless
}
