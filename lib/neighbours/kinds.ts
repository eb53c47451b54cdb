/** How a scenario begins and ends, by classification alone: no times, no distances. */
import { familyOf } from '../dark-energy/index'
import { powerLaw } from '../dark-energy/power-law'
import { fateOf } from '../history/ending'
import { fieldKinds, followedKinds } from '../history/field/kinds'
import { isOverBudget, isUnsolvable } from '../history/field/unsolvable'
import { beginningOf } from '../history/origin'
import type { EndKind, OriginKind } from '../history/outcome'
import { type Search, searchTurning } from '../history/turning'
import { modelOf } from '../model'
import { type Budget, budgetOf } from '../scenario/budget'
import type { Scenario } from '../scenario/scenario'

export interface Kind<K> {
  readonly kind: K
  /** One sentence. */
  readonly because: string
  readonly proven: boolean
}

export interface Kinds {
  readonly end: Kind<EndKind>
  readonly origin: Kind<OriginKind>
}

/** Whether the scenario code refuses it. */
export function refuses(scenario: Scenario, budget: Budget = budgetOf(scenario)): boolean {
  const family = familyOf(scenario.eos)
  return budget.coldMatter < 0 || ((family.positive || family.potential !== undefined) && !(budget.dark > 0))
}

/** Evaluations of the equation of motion that may still be spent; counted down, and below 0 by one classification at most. */
export interface Tally {
  left: number
}

export interface Unsolved {
  /** Whether there is no history at all, or none within the budget of computation. */
  readonly dear: boolean
  readonly because: string
}

export const isUnsolved = (one: Kinds | Unsolved): one is Unsolved => 'because' in one

/** The same for a scalar field, followed where theorems do not decide; it is looked for whether the field comes to its density at all. */
export function kindsFollowed(scenario: Scenario, tally: Tally): Kinds | Unsolved {
  const potential = familyOf(scenario.eos).potential
  if (!potential) throw new TypeError('the kinds of a law need no integration')
  try {
    return followedKinds(budgetOf(scenario), potential(scenario.law), scenario.beyond === 'hold', tally)
  } catch (error) {
    if (!isUnsolvable(error)) throw error
    return { dear: isOverBudget(error), because: error.message }
  }
}

/** Null for what the scenario code refuses, and where only an integration could tell. */
export function kindsOf(scenario: Scenario): Kinds | null {
  const budget = budgetOf(scenario)
  const family = familyOf(scenario.eos)
  if (refuses(scenario, budget)) return null
  const hold = scenario.beyond === 'hold'
  if (family.potential) return hold ? null : fieldKinds(budget, family.potential(scenario.law))
  const law = family.law(scenario.law)
  const model = modelOf(budget, law)
  const ahead = hold && budget.dark !== 0 ? modelOf(budget, powerLaw(law.w(0))) : model
  const past = searchTurning(model, -1)
  const future = searchTurning(ahead, 1)
  const before = ahead === model || !turns(past) ? future : searchTurning(model, 1)
  const home = ahead === model || !turns(future) ? past : searchTurning(ahead, -1)
  return { end: fateOf(ahead, future, home), origin: beginningOf(model, past, before) }
}

const turns = (search: Search): boolean => search.kind === 'root' || (search.kind === 'none' && search.farRoot !== null)
