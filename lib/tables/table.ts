/** Rows of a scenario at evenly spaced values of a variable, made one at a time while they are read. */
import { isMissing } from '../measures/outcome'
import type { Column } from '../quantities/column'
import { type ColumnSubject, instantAt, isInstant } from '../quantities/instant'
import { type Ends, type Spacing, valueAt } from './spacing'

/** A number for each column, null where there is none. */
export type Cells = readonly (number | null)[]

export interface Table {
  /** Canonical scenario code. */
  readonly code: string
  rows(): Iterable<Cells>
}

export interface Layout {
  readonly spacing: Spacing
  readonly given: Partial<Ends>
  readonly rows: number
  readonly columns: readonly Column[]
}

export function tableOf(subject: ColumnSubject, code: string, layout: Layout): Table {
  return { code, rows: () => rowsOf(subject, layout) }
}

function* rowsOf(subject: ColumnSubject, layout: Layout): Generator<Cells> {
  const { spacing, given, rows } = layout
  const ends = spacing.ends(subject, rows, given)
  for (let i = 0; i < rows; i++) yield rowAt(subject, layout, valueAt(spacing, ends, rows, i))
}

function rowAt(subject: ColumnSubject, { spacing, columns }: Layout, value: number): Cells {
  const instant = instantAt(subject, spacing.variable, value)
  // Outside the history the row says at least where it would have been.
  if (!isInstant(instant)) return columns.map(({ key }) => (key === spacing.column ? value : null))
  return columns.map((column) => {
    const cell = column.value(subject, instant)
    return isMissing(cell) ? null : cell
  })
}
