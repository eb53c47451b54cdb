/** JSON: `{engine, scenarios: [{code, columns, rows}]}`. */
import type { Table } from '../tables/table'
import { type Format, MOST_ROWS, type Sheet } from './format'

export const JSON_FORMAT: Format = {
  key: 'json',
  extension: 'json',
  label: 'JSON',
  mediaType: 'application/json',
  mostRows: MOST_ROWS,
  *pieces(sheet) {
    yield `{"engine":${JSON.stringify(sheet.provenance.engine)},"scenarios":[`
    let comma = ''
    for (const table of sheet.tables) {
      yield comma
      yield* scenario(sheet, table)
      comma = ','
    }
    yield ']}'
  },
}

function* scenario({ columns }: Sheet, { code, rows }: Table): Generator<string> {
  const heads = columns.map(({ key, unit, label }) => ({ name: key, unit, label }))
  yield `{"code":${JSON.stringify(code)},"columns":${JSON.stringify(heads)},"rows":[`
  let comma = ''
  for (const cells of rows()) {
    yield comma + JSON.stringify(cells)
    comma = ','
  }
  yield ']}'
}
