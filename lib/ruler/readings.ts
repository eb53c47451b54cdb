/** What the ruler reads at one epoch: every column of tables, and what needs more than the epoch. */
import type { Column } from '../quantities/column'
import { COLUMNS } from '../quantities/columns'
import { EXTRA_READINGS } from './extra'
import type { Reading } from './reading'

const fromColumn = (column: Column): Reading => ({
  ...column,
  value: ({ subject, instant }) => column.value(subject, instant),
  note: ({ subject, instant }) => column.note(subject, instant),
})

export const READINGS: readonly Reading[] = [...COLUMNS.map(fromColumn), ...EXTRA_READINGS]

const byKey: ReadonlyMap<string, Reading> = new Map(READINGS.map((one) => [one.key, one]))

/** The reading of a name; undefined for a name that is none. */
export const readingNamed = (key: string): Reading | undefined => byKey.get(key)
