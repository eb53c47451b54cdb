/** The rows that are made side by side with other methods: 512, equally spaced in ln a, through the product's own tables. */
import { historyOf } from '../../lib/history/history'
import type { Column } from '../../lib/quantities/column'
import { COLUMNS } from '../../lib/quantities/columns'
import type { ColumnSubject } from '../../lib/quantities/instant'
import { budgetOf } from '../../lib/scenario/budget'
import type { Scenario } from '../../lib/scenario/scenario'
import { SPACINGS } from '../../lib/tables/spacing'
import { tableOf } from '../../lib/tables/table'
import { hubbleLengthGly, hubbleLengthMpc, hubbleTimeGyr } from '../../lib/units'
import { inTurn, MASSLESS, variants } from './scenarios'

export const ROWS = 512
/** Scale factor of the first row; the last is today. */
export const FROM = 1e-3

const FIVE_KEYS = ['age', 'comoving', 'conformal', 'hubble', 'scale']
/** Time since the big bang, comoving distance, conformal time, E, a. */
export const FIVE: readonly Column[] = FIVE_KEYS.flatMap((key) => COLUMNS.filter((one) => one.key === key))

const spacing = SPACINGS.find(({ key }) => key === 'logscale') ?? SPACINGS[0]

const tableFor = (subject: ColumnSubject, columns: readonly Column[]) =>
  tableOf(subject, '', { spacing, given: { from: FROM, to: 1 }, rows: ROWS, columns })

/** All pages of the table, read through once: what a writer of a format goes by. */
export function pagesOf(subject: ColumnSubject, columns: readonly Column[]): number {
  let count = 0
  for (const page of tableFor(subject, columns).pages()) count += page.count
  return count
}

/** A scenario alone: its history is not known yet. */
export function tableSubject(scenario: Scenario): ColumnSubject {
  const budget = budgetOf(scenario)
  return { scenario, budget, history: historyOf(scenario, budget) }
}

const scenarios = variants(MASSLESS)
const [scenario] = scenarios

export const make = inTurn(scenarios, (scenario) => pagesOf(tableSubject(scenario), FIVE))

/** The rows of one scenario, in 1/H₀, c/H₀ and H₀. */
export function rows(): readonly (readonly number[])[] {
  const { h0 } = scenario
  const units = [hubbleTimeGyr(h0), hubbleLengthMpc(h0), hubbleLengthGly(h0), h0, 1]
  return [...tableFor(tableSubject(scenario), FIVE).rows()].map((cells) =>
    cells.map((cell, i) => (cell ?? Number.NaN) / units[i]),
  )
}

/** The densities today of the same scenario: radiation, matter, curvature, dark energy. */
export function densities(): readonly number[] {
  const { photons, masslessNeutrinos, coldMatter, curvature, dark } = budgetOf(scenario)
  return [photons + masslessNeutrinos, coldMatter, curvature, dark]
}
