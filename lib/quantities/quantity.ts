/** What every output of Longhence says about itself. */
import { type History, historyOf } from '../history/history'
import {
  accelerationChanges,
  type Crossing,
  darkOverMatter,
  matterOverRadiation,
  overtakings,
} from '../measures/epochs'
import { type Budget, budgetOf } from '../scenario/budget'
import type { Scenario } from '../scenario/scenario'

export interface Quantity {
  /** Name in answers and tables. */
  readonly key: string
  /** In the markup of labels: `_` starts a subscript. */
  readonly symbol: string
  readonly label: string
  /** Empty for a pure number. */
  readonly unit: string
  /** Decimals for fixed, significant digits for the others: how the page rounds it. */
  readonly digits: { readonly kind: 'fixed' | 'significant'; readonly count: number }
  /** One sentence. */
  readonly meaning: string
  readonly formula: string
  readonly source: string
  /** How good the number is, in a sentence. */
  readonly accuracy: string
}

/** What quantities are read from. */
export interface Subject {
  readonly scenario: Scenario
  readonly budget: Budget
  readonly history: History
  readonly epochs: Epochs
}

/** When one thing overtakes another, in order of a; empty where one of the two is missing. */
export interface Epochs {
  readonly acceleration: readonly Crossing[]
  readonly matterRadiation: readonly Crossing[]
  readonly matterDark: readonly Crossing[]
}

export function subjectOf(scenario: Scenario): Subject {
  const budget = budgetOf(scenario)
  const history = historyOf(scenario, budget)
  return { scenario, budget, history, epochs: epochsOf(history, budget) }
}

function epochsOf(history: History, budget: Budget): Epochs {
  const cold = budget.coldMatter > 0
  const radiation = budget.photons + budget.masslessNeutrinos + budget.massiveNeutrinos
  return {
    acceleration: accelerationChanges(history),
    matterRadiation: cold && radiation > 0 ? overtakings(history, matterOverRadiation) : [],
    matterDark: cold && budget.dark > 0 ? overtakings(history, darkOverMatter) : [],
  }
}

export const fixed = (count: number) => ({ kind: 'fixed', count }) as const
export const significant = (count: number) => ({ kind: 'significant', count }) as const

export const FRIEDMANN = 'Friedmann 1922, Z. Phys. 10, 377'
export const HOGG = 'Hogg 1999, arXiv:astro-ph/9905116'
export const HORIZONS = 'Davis & Lineweaver 2004, PASA 21, 97, arXiv:astro-ph/0310808'
