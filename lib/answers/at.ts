/** `/api/at`: columns at given epochs. */
import { isMissing } from '../measures/outcome'
import { withBounds } from '../quantities/bounds'
import type { Column } from '../quantities/column'
import { type Instant, instantAt, isInstant } from '../quantities/instant'
import type { Fault } from '../scenario/problems'
import type { Reading } from '../scenario/scenario'
import { linkQuery } from '../scenario/write'
import { ENGINE, type Solution } from '../solve'
import { AT_FIELDS, type Epochs, epochsText, readEpochs } from './epochs'
import { readKeys } from './keys'
import { mapped, type Pairs, type Question, scenariosOf, solved } from './question'

export type AtAnswer = ReturnType<typeof atAnswer>

export function askAt(pairs: Pairs): Reading<Question<AtAnswer>> {
  const keys = readKeys(pairs, Object.keys(AT_FIELDS))
  const faults: Fault[] = [...keys.faults]
  const epochs = readEpochs(keys.values, faults)
  return mapped(scenariosOf(keys.codes, faults), (scenarios) => ({
    canonical: `${linkQuery(scenarios)}&${epochsText(epochs)}`,
    answer: () =>
      mapped(
        solved(scenarios, (solution) => scenarioAt(solution, epochs)),
        enclosed,
      ),
  }))
}

export const atAnswer = (solutions: readonly Solution[], epochs: Epochs) =>
  enclosed(solutions.map((solution) => scenarioAt(solution, epochs)))

const enclosed = (scenarios: readonly ReturnType<typeof scenarioAt>[]) => ({ engine: ENGINE, scenarios })

/** Why a cell is empty, or what has to be said beside its value; `column` null: the whole row is empty. */
interface Note {
  readonly row: number
  readonly column: string | null
  readonly because: string
}

function scenarioAt(solution: Solution, { variable, values, branch, columns: asked, bounds = false }: Epochs) {
  const columns = withBounds(asked, bounds)
  const notes: Note[] = []
  const rows = values.map((value, row) => {
    const instant = instantAt(solution, variable, value, branch)
    if (isInstant(instant)) return cellsAt(solution, instant, columns, row, notes)
    notes.push({ row, column: null, because: instant.because })
    return columns.map(() => null)
  })
  return { code: solution.code, columns: columns.map(headOf), rows, notes }
}

const headOf = ({ key, unit, label }: Column) => ({ name: key, unit, label })

function cellsAt(
  solution: Solution,
  instant: Instant,
  columns: readonly Column[],
  row: number,
  notes: Note[],
): (number | null)[] {
  return columns.map((column) => {
    const value = column.value(solution, instant)
    const because = isMissing(value) ? value.because : column.note(solution, instant)
    if (because) notes.push({ row, column: column.key, because })
    return isMissing(value) ? null : value
  })
}
