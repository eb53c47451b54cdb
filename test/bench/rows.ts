/** The rows that are made side by side with other methods: 512, equally spaced in ln a, through the product's own tables. */
import { historyOf } from '../../lib/history/history'
import type { Column } from '../../lib/quantities/column'
import { COLUMNS } from '../../lib/quantities/columns'
import type { ColumnSubject } from '../../lib/quantities/instant'
import { budgetOf } from '../../lib/scenario/budget'
import type { Scenario } from '../../lib/scenario/scenario'
import { SPACINGS } from '../../lib/tables/spacing'
import { type Cells, tableOf } from '../../lib/tables/table'
import { hubbleLengthGly, hubbleLengthMpc, hubbleTimeGyr } from '../../lib/units'
import { inTurn, MASSLESS, variants } from './scenarios'

export const ROWS = 512
/** Scale factor of the first row; the last is today. */
export const FROM = 1e-3

const FIVE_KEYS = ['age', 'comoving', 'conformal', 'hubble', 'scale']
/** Time since the big bang, comoving distance, conformal time, E, a. */
export const FIVE: readonly Column[] = FIVE_KEYS.flatMap((key) => COLUMNS.filter((one) => one.key === key))

const spacing = SPACINGS.find(({ key }) => key === 'logscale') ?? SPACINGS[0]

export const rowsOf = (subject: ColumnSubject, columns: readonly Column[]): readonly Cells[] => [
  ...tableOf(subject, '', { spacing, given: { from: FROM, to: 1 }, rows: ROWS, columns }).rows(),
]

/** The five columns from a scenario alone: its history is not known yet. */
function fiveColumns(scenario: Scenario): readonly Cells[] {
  const budget = budgetOf(scenario)
  return rowsOf({ scenario, budget, history: historyOf(scenario, budget) }, FIVE)
}

const scenarios = variants(MASSLESS)
const [scenario] = scenarios

export const make = inTurn(scenarios, fiveColumns)

/** The rows of one scenario, in 1/H₀, c/H₀ and H₀. */
export function rows(): readonly (readonly number[])[] {
  const { h0 } = scenario
  const units = [hubbleTimeGyr(h0), hubbleLengthMpc(h0), hubbleLengthGly(h0), h0, 1]
  return fiveColumns(scenario).map((cells) => cells.map((cell, i) => (cell ?? Number.NaN) / units[i]))
}

/** The densities today of the same scenario: radiation, matter, curvature, dark energy. */
export function densities(): readonly number[] {
  const { photons, masslessNeutrinos, coldMatter, curvature, dark } = budgetOf(scenario)
  return [photons + masslessNeutrinos, coldMatter, curvature, dark]
}
