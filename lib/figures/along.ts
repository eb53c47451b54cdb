/** Columns along a horizontal axis, in blocks. */
import { isBlock, runsAlong } from '../quantities/blocks'
import type { Column } from '../quantities/column'
import { BLOCK_SIZE, borrowWorkspace, returnWorkspace } from '../quantities/workspace'
import type { Solution } from '../solve'
import type { Horizontal } from './horizontal'

/** What is drawn at places along the axis; null where there is no value. */
export type Values = (places: readonly number[]) => readonly (number | null)[]

/** Along an axis of one of the variables by which instants are asked for. */
export function columnAlong({ values }: Column, subject: Solution, { asked }: Horizontal): Values {
  return (places) => {
    const found: (number | null)[] = places.map(() => null)
    if (asked === null) return found
    const legal = places.flatMap((place, i) => (asked.sign * place > asked.above ? [i] : []))
    const workspace = borrowWorkspace()
    try {
      for (let first = 0; first < legal.length; first += BLOCK_SIZE) {
        const page = legal.slice(first, first + BLOCK_SIZE)
        const sheet = Float64Array.from(page, (i) => asked.sign * (places[i] as number))
        const runs = runsAlong({ subject, variable: asked.variable, values: sheet, count: page.length, workspace })
        let done = 0
        for (const run of runs) {
          if (isBlock(run)) fill(found, page, done, run.count, values(run))
          done += run.count
        }
      }
    } finally {
      returnWorkspace(workspace)
    }
    return found
  }
}

function fill(found: (number | null)[], page: readonly number[], done: number, count: number, values: Float64Array) {
  for (let i = 0; i < count; i++) {
    const value = values[i] as number
    if (Number.isFinite(value)) found[page[done + i] as number] = value + 0
  }
}
