/** Every column of numbers along a history once, in the order of answers and tables. */
import { type Column, type ColumnKey, columnFrom } from './column'
import { CONTENT_COLUMNS, TEMPERATURE } from './contents'
import { DISTANCE_COLUMNS, DRIFT } from './distances'
import { GROWTH_COLUMNS } from './growth'
import { HORIZON_COLUMNS } from './horizons'
import { CRITICAL_DENSITY, HUBBLE_RADIUS, RATE_COLUMNS } from './rates'
import { TIME_COLUMNS } from './times'

export const COLUMNS: readonly Column[] = [
  ...TIME_COLUMNS,
  ...RATE_COLUMNS,
  ...CONTENT_COLUMNS,
  ...DISTANCE_COLUMNS,
  ...HORIZON_COLUMNS,
  HUBBLE_RADIUS,
  TEMPERATURE,
  CRITICAL_DENSITY,
  DRIFT,
  ...GROWTH_COLUMNS,
].map(columnFrom)

const byKey: ReadonlyMap<string, Column> = new Map(COLUMNS.map((one) => [one.key, one]))

/** The column of a name; undefined for a name that is none. */
export const columnNamed = (key: ColumnKey | string): Column | undefined => byKey.get(key)

/** The column of a key. */
export function columnOf(key: ColumnKey): Column {
  const column = byKey.get(key)
  if (!column) throw new Error(`there is no column ${key}`)
  return column
}
