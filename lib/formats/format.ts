/** A format of downloads: how tables become text. */
import type { Quantity } from '../quantities/quantity'
import type { Table } from '../tables/table'

/** Where a table comes from. */
export interface Provenance {
  /** Version of the application. */
  readonly version: string
  readonly engine: string
  /** Opens the scenarios on the page. */
  readonly page: string
  /** Makes this very table again. */
  readonly data: string
}

export interface Sheet {
  readonly provenance: Provenance
  readonly columns: readonly Pick<Quantity, 'key' | 'unit' | 'label'>[]
  /** One for each scenario. */
  readonly tables: readonly Table[]
}

export interface Format {
  /** Name in addresses. */
  readonly key: string
  /** Of the file. */
  readonly extension: string
  readonly label: string
  readonly mediaType: string
  /** Most rows of a scenario. */
  readonly mostRows: number
  /** The document in pieces of any length, made while they are read. Numbers read back to the same doubles. */
  pieces(sheet: Sheet): Iterable<string>
}

export const MOST_ROWS = 1_000_000

export const citation = ({ version, engine, page }: Provenance): string =>
  `The Longhence authors, Longhence ${version}, engine ${engine}, ${page}`

/** What stands above a table as remarks, a line each. */
export function remarksOf({ provenance, columns, tables }: Sheet): string[] {
  const { version, engine, page, data } = provenance
  return [
    `Longhence ${version}, engine ${engine}`,
    ...tables.map(({ code }) => `scenario: ${code}`),
    `link: ${page}`,
    `table: ${data}`,
    ...columns.map(({ key, label, unit }) => `${key}: ${label}${unit && `, ${unit}`}`),
    `cite as: ${citation(provenance)}`,
  ]
}
