/** Small sheets for the tests of formats. */
import fc from 'fast-check'
import type { Format, Sheet } from '../../lib/formats/format'
import type { Cells } from '../../lib/tables/table'

export const sheetOf = (...tables: readonly (readonly Cells[])[]): Sheet => ({
  provenance: { version: '9.8.7', engine: '7', page: '/?s=h0:70&s=x', data: '/api/table?s=h0:70&by=time' },
  columns: [
    { key: 'x', unit: 'Gyr', label: 'time' },
    { key: 'y', unit: '', label: 'number' },
  ],
  tables: tables.map((rows, i) => ({ code: `h0:70,matter:0.${i + 1},as:a%26b_${i}`, rows: () => rows })),
})

export const written = (format: Format, sheet: Sheet): string => [...format.pieces(sheet)].join('')

/** A number, any finite double but −0, or none. */
export const anyCell = fc.option(fc.double({ noNaN: true, noDefaultInfinity: true }).map((x) => x + 0))
export const anyRows = fc.array(fc.tuple(anyCell, anyCell), { maxLength: 20 })
