/**
 * The whole history of a scenario: up to four arms, glued at today and at the turning points.
 * before a bounce ← bounce ← past — today — future → turnaround → home again.
 */
import { familyOf } from '../dark-energy/index'
import type { Law } from '../dark-energy/law'
import { powerLaw } from '../dark-energy/power-law'
import { type Model, modelOf } from '../model'
import type { Budget } from '../scenario/budget'
import type { Scenario } from '../scenario/scenario'
import { armOf } from './arm'
import { endOf } from './ending'
import { fieldHistory } from './field/history'
import { originOf } from './origin'
import type { History } from './whole'

export type { History, Unfollowed } from './whole'

/** All of it, in 1/H₀ and c/H₀. Every time carries the error bound of its arm. */
export function historyOf(scenario: Scenario, budget: Budget): History {
  const family = familyOf(scenario.eos)
  if (family.potential) return fieldHistory(budget, family.potential(scenario.law), scenario.beyond === 'hold')
  const followed = family.law(scenario.law)
  const past = modelOf(budget, followed)
  const held = scenario.beyond === 'hold' && budget.dark !== 0
  return assemble(past, held ? modelOf(budget, heldLaw(followed)) : past)
}

/** w of today from today on: the contraction after a turnaround keeps it too. */
const heldLaw = (law: Law): Law => powerLaw(law.w(0))

function assemble(pastLaw: Model, futureLaw: Model): History {
  const past = armOf(pastLaw, -1)
  const future = armOf(futureLaw, 1)
  const same = pastLaw === futureLaw
  const before = same || past.end.kind === 'none' ? future : armOf(pastLaw, 1)
  const home = same || future.end.kind === 'none' ? past : armOf(futureLaw, -1)
  return { past, future, before, descent: future, home, origin: originOf(past, before), end: endOf(future, home) }
}
