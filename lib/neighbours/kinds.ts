/** How a scenario begins and ends, by classification alone: no times, no distances. */
import { familyOf } from '../dark-energy/index'
import { powerLaw } from '../dark-energy/power-law'
import { fateOf } from '../history/ending'
import { fieldKinds } from '../history/field/kinds'
import { beginningOf } from '../history/origin'
import type { EndKind, OriginKind } from '../history/outcome'
import { type Search, searchTurning } from '../history/turning'
import { modelOf } from '../model'
import { budgetOf } from '../scenario/budget'
import type { Scenario } from '../scenario/scenario'

export interface Kind<K> {
  readonly kind: K
  /** One sentence. */
  readonly because: string
}

export interface Kinds {
  readonly end: Kind<EndKind>
  readonly origin: Kind<OriginKind>
}

/** Null for what the scenario code refuses, and where only an integration could tell. */
export function kindsOf(scenario: Scenario): Kinds | null {
  const budget = budgetOf(scenario)
  const family = familyOf(scenario.eos)
  if (budget.coldMatter < 0 || (family.positive && !(budget.dark > 0))) return null
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
