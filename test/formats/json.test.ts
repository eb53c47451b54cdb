import fc from 'fast-check'
import { expect, test } from 'vitest'
import { JSON_FORMAT } from '../../lib/formats/json'

const provenance = { version: '1', engine: '7', page: '/', data: '/api/table' }
const columns = [{ key: 'x', unit: 'Gyr', label: 'time' }]
const written = (rows: readonly (readonly (number | null)[])[], codes = ['a']) =>
  JSON.parse(
    [...JSON_FORMAT.pieces({ provenance, columns, tables: codes.map((code) => ({ code, rows: () => rows })) })].join(
      '',
    ),
  )

test('engine, scenarios, columns, rows', () => {
  expect(written([[1], [null]], ['a', 'b"'])).toEqual({
    engine: '7',
    scenarios: ['a', 'b"'].map((code) => ({
      code,
      columns: [{ name: 'x', unit: 'Gyr', label: 'time' }],
      rows: [[1], [null]],
    })),
  })
})
test('no rows', () => expect(written([]).scenarios[0].rows).toEqual([]))
test('numbers read back to the same doubles', () => {
  fc.assert(
    fc.property(fc.double({ noNaN: true, noDefaultInfinity: true }), (x) => {
      expect(written([[x + 0]]).scenarios[0].rows).toEqual([[x + 0]])
    }),
  )
})
