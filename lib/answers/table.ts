/** `/api/table`: evenly spaced rows in a format of downloads, written while they are read. */
import { fileName } from '../formats/file-name'
import { withBounds } from '../quantities/bounds'
import type { Fault } from '../scenario/problems'
import type { Reading, Scenario } from '../scenario/scenario'
import { linkQuery } from '../scenario/write'
import { ENGINE } from '../solve'
import { type Table, tableOf } from '../tables/table'
import { readKeys } from './keys'
import { type Order, orderText, readOrder, TABLE_FIELDS } from './layout'
import { mapped, type Pairs, type Question, scenariosOf, solved } from './question'

export interface Download {
  readonly mediaType: string
  readonly fileName: string
  pieces(): Iterable<string>
}

/** Where and what the application is: the pure part cannot know. */
export interface Home {
  readonly version: string
  /** What stands before the paths of links; empty where that is not known. */
  readonly base: string
}

export function askTable(pairs: Pairs, home: Home): Reading<Question<Download>> {
  const keys = readKeys(pairs, Object.keys(TABLE_FIELDS))
  const faults: Fault[] = [...keys.faults]
  const order = readOrder(keys.values, faults)
  return mapped(scenariosOf(keys.codes, faults), (scenarios) => ({
    canonical: `${linkQuery(scenarios)}&${orderText(order)}`,
    answer: () =>
      mapped(
        solved(scenarios, (solution) => tableOf(solution, solution.code, { ...order, columns: shown(order) })),
        (tables) => download(scenarios, tables, order, home),
      ),
  }))
}

const shown = ({ columns, bounds }: Order) => withBounds(columns, bounds)

function download(scenarios: readonly Scenario[], tables: readonly Table[], order: Order, home: Home): Download {
  const [{ format }, columns] = [order, shown(order)]
  const query = linkQuery(scenarios)
  const names = scenarios.flatMap(({ name }) => name ?? [])
  const provenance = {
    version: home.version,
    engine: ENGINE,
    page: `${home.base}/?${query}&engine=${ENGINE}`,
    data: `${home.base}/api/table?${query}&${orderText(order)}`,
  }
  return {
    mediaType: format.mediaType,
    fileName: fileName(names.length > 0 ? names : ['table'], format.extension),
    pieces: () => format.pieces({ provenance, columns, tables }),
  }
}
