/** Rows of a scenario at evenly spaced values of a variable, made page by page while they are read. */
import type { Block } from '../quantities/block'
import { isBlock, type Run, runsAlong } from '../quantities/blocks'
import type { Column } from '../quantities/column'
import type { ColumnSubject } from '../quantities/instant'
import { BLOCK_SIZE, borrowWorkspace, returnWorkspace, type Workspace } from '../quantities/workspace'
import { type Ends, type Spacing, valuesInto } from './spacing'

/** A number for each column, null where there is none. */
export type Cells = readonly (number | null)[]

/** Some rows, as an array for each column: what is not finite is no value. Overwritten when the next page is asked for. */
export interface Page {
  readonly count: number
  readonly columns: readonly Float64Array[]
}

export interface Table {
  /** Canonical scenario code. */
  readonly code: string
  rows(): Iterable<Cells>
}

export interface PagedTable extends Table {
  pages(): Iterable<Page>
}

export interface Layout {
  readonly spacing: Spacing
  readonly given: Partial<Ends>
  readonly rows: number
  readonly columns: readonly Column[]
}

export function tableOf(subject: ColumnSubject, code: string, layout: Layout): PagedTable {
  const pages = () => pagesOf(subject, layout)
  return { code, pages, rows: () => rowsOf(pages()) }
}

function* pagesOf(subject: ColumnSubject, layout: Layout): Generator<Page> {
  const { spacing, given, rows, columns } = layout
  const ends = spacing.ends(subject, rows, given)
  // What is asked for outlives the blocks that are made of it.
  const [workspace, asked] = [borrowWorkspace(), borrowWorkspace()]
  asked.clear()
  try {
    const values = asked.take()
    for (let first = 0; first < rows; first += BLOCK_SIZE) {
      const count = Math.min(BLOCK_SIZE, rows - first)
      valuesInto(values, spacing, ends, rows, first, count)
      let done = 0
      for (const run of runsAlong({ subject, variable: spacing.variable, values, count, workspace })) {
        yield isBlock(run) ? pageOf(run, columns) : emptyPage(layout, run, values.subarray(done), workspace)
        done += run.count
      }
    }
  } finally {
    returnWorkspace(workspace)
    returnWorkspace(asked)
  }
}

const pageOf = (block: Block, columns: readonly Column[]): Page => ({
  count: block.count,
  columns: columns.map((column) => column.values(block)),
})

/** Outside the history the rows say at least where they would have been. */
function emptyPage({ spacing, columns }: Layout, { count }: Run, values: Float64Array, workspace: Workspace): Page {
  const empty = workspace.take().fill(Number.NaN)
  return { count, columns: columns.map(({ key }) => (key === spacing.column ? values : empty)) }
}

function* rowsOf(pages: Iterable<Page>): Generator<Cells> {
  for (const { count, columns } of pages) {
    for (let i = 0; i < count; i++) {
      // Never −0.
      yield columns.map((values) => (Number.isFinite(values[i]) ? values[i] + 0 : null))
    }
  }
}
