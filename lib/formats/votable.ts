/** VOTable 1.5 of the IVOA (Recommendation of 16 January 2025), written as TABLEDATA: all cells doubles, but for the scenario. */
import type { Cells } from '../tables/table'
import { citation, type Format, MOST_ROWS, type Sheet } from './format'
import { ucdOf, vounitOf } from './votable-words'
import { xml } from './xml'

/** Of all versions since 1.3. */
const NAMESPACE = 'http://www.ivoa.net/xml/VOTable/v1.3'
const MISSING = 'NaN'

export const VOTABLE: Format = {
  key: 'votable',
  extension: 'vot',
  label: 'VOTable',
  mediaType: 'application/x-votable+xml; serialization=tabledata; charset=utf-8',
  mostRows: MOST_ROWS,
  *pieces(sheet) {
    const several = sheet.tables.length > 1
    yield head(sheet)
    yield `<TABLE name="history">\n${fields(sheet, several)}<DATA>\n<TABLEDATA>\n`
    for (const { code, rows } of sheet.tables) {
      const first = several ? `<TD>${xml(code)}</TD>` : ''
      for (const cells of rows()) yield `<TR>${first}${numberCells(cells)}</TR>\n`
    }
    yield '</TABLEDATA>\n</DATA>\n</TABLE>\n</RESOURCE>\n</VOTABLE>\n'
  },
}

function head({ provenance, tables }: Sheet): string {
  const { version, engine, page, data } = provenance
  const facts = [
    ['version', `Longhence ${version}`],
    ['engine', engine],
    ...tables.map(({ code }) => ['scenario', code] as const),
    ['link', page],
    ['table', data],
    ['citation', citation(provenance)],
  ] as const
  return [
    '<?xml version="1.0" encoding="UTF-8"?>',
    `<VOTABLE version="1.5" xmlns="${NAMESPACE}">`,
    '<RESOURCE type="results" name="longhence">',
    '<DESCRIPTION>Histories of expanding universes, one row an epoch</DESCRIPTION>',
    ...facts.map(([name, value]) => `<INFO name="${name}" value="${xml(value)}"/>`),
    '',
  ].join('\n')
}

function fields({ columns }: Sheet, several: boolean): string {
  const scenario = '<FIELD name="scenario" datatype="char" arraysize="*" ucd="meta.id"/>\n'
  const numbers = columns.map(({ key, unit, label }) => {
    const ucd = ucdOf(key)
    const attributes = `name="${xml(key)}" datatype="double" unit="${xml(vounitOf(unit))}"${ucd ? ` ucd="${ucd}"` : ''}`
    return `<FIELD ${attributes}><DESCRIPTION>${xml(label)}</DESCRIPTION></FIELD>\n`
  })
  return [...(several ? [scenario] : []), ...numbers].join('')
}

function numberCells(cells: Cells): string {
  let line = ''
  for (const cell of cells) line += `<TD>${cell ?? MISSING}</TD>`
  return line
}
