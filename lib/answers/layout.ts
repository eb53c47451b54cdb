/** Which rows, columns and format a request to `/api/table` asks for. */
import { FORMATS } from '../formats'
import { type Format, MOST_ROWS } from '../formats/format'
import { COLUMNS } from '../quantities/columns'
import { type Fault, fault } from '../scenario/problems'
import { SPACINGS, type Spacing } from '../tables/spacing'
import type { Layout } from '../tables/table'
import { allowedNumber, boundsFlag, columnList, count, number, oneOf, take } from './fields'
import { numberText } from './question'

const LEAST_ROWS = 2
const DEFAULT_ROWS = 200
const ANY = Number.NEGATIVE_INFINITY

export const TABLE_FIELDS = {
  format: oneOf('format', FORMATS, 'The format of the download.'),
  by: oneOf('by', SPACINGS, SPACINGS.map(({ key, meaning }) => `${key}: ${meaning}`).join(' ')),
  from: number({ key: 'from', above: ANY, unit: '' }, 'Where the rows begin, in the variable of `by`.'),
  to: number({ key: 'to', above: ANY, unit: '' }, 'Where they end, in the variable of `by`; it is the last row.'),
  rows: count('rows', LEAST_ROWS, MOST_ROWS, `How many rows; ${DEFAULT_ROWS} where none are asked.`),
  columns: columnList,
  bounds: boundsFlag,
}

export interface Order extends Layout {
  readonly format: Format
  /** Whether error bounds are asked for. */
  readonly bounds: boolean
}

/** Adds to `faults`; where it does, the order is not the one asked for. */
export function readOrder(values: ReadonlyMap<string, string>, faults: Fault[]): Order {
  const format = take(values, 'format', TABLE_FIELDS.format, faults) ?? FORMATS[0]
  const spacing = take(values, 'by', TABLE_FIELDS.by, faults) ?? SPACINGS[0]
  const from = take(values, 'from', TABLE_FIELDS.from, faults)
  const to = take(values, 'to', TABLE_FIELDS.to, faults)
  const rows = take(values, 'rows', TABLE_FIELDS.rows, faults) ?? DEFAULT_ROWS
  faults.push(...endFaults(spacing, values, from, to), ...rowFaults(format, rows))
  const columns = take(values, 'columns', TABLE_FIELDS.columns, faults) ?? COLUMNS
  const bounds = take(values, 'bounds', TABLE_FIELDS.bounds, faults)?.key === '1'
  return { format, spacing, given: { from, to }, rows, columns, bounds }
}

function endFaults(
  { key, above }: Spacing,
  values: ReadonlyMap<string, string>,
  from: number | undefined,
  to: number | undefined,
): Fault[] {
  const low = Object.entries({ from, to }).filter(([, value]) => value !== undefined && value <= above)
  const allowed = allowedNumber({ above, unit: '' })
  const faults = low.map(([end]) =>
    fault(end, values.get(end) ?? '', allowed, `${end} is not above ${above}, as by=${key} needs it.`),
  )
  if (from === undefined || from !== to) return faults
  return [...faults, fault('to', values.get('to') ?? '', `other than from=${from}`, 'from and to are the same.')]
}

function rowFaults({ key, mostRows }: Format, rows: number): Fault[] {
  if (rows <= mostRows) return []
  return [fault('rows', String(rows), `up to ${mostRows} with format=${key}`, `rows is too many for format=${key}.`)]
}

/** Ends that are not given stay out: they may differ from scenario to scenario. */
export function orderText({ format, spacing, given, rows, columns, bounds }: Order): string {
  const ends = Object.entries(given).filter(([, value]) => value !== undefined)
  return [
    `format=${format.key}`,
    `by=${spacing.key}`,
    ...ends.map(([key, value]) => `${key}=${numberText(value)}`),
    `rows=${rows}`,
    ...(columns === COLUMNS ? [] : [`columns=${columns.map(({ key }) => key).join(',')}`]),
    ...(bounds ? ['bounds=1'] : []),
  ].join('&')
}
