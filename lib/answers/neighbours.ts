/** `/api/neighbours`: for each number of a scenario the smallest change that makes another origin or ending of it. */
import { neighboursOf } from '../neighbours/neighbours'
import type { Reading } from '../scenario/scenario'
import { linkQuery } from '../scenario/write'
import { ENGINE, type Solution } from '../solve'
import { readKeys } from './keys'
import { mapped, type Pairs, type Question, scenariosOf, solved } from './question'

export type NeighboursAnswer = ReturnType<typeof enclosed>

export function askNeighbours(pairs: Pairs): Reading<Question<NeighboursAnswer>> {
  const keys = readKeys(pairs, [])
  return mapped(scenariosOf(keys.codes, keys.faults), (scenarios) => ({
    canonical: linkQuery(scenarios),
    answer: () => mapped(solved(scenarios, neighboursOfScenario), enclosed),
  }))
}

const enclosed = (scenarios: readonly ReturnType<typeof neighboursOfScenario>[]) => ({ engine: ENGINE, scenarios })

/** `closes`: the density that makes up for every change of another. */
function neighboursOfScenario({ code, scenario, budget, end, origin }: Solution) {
  return { code, closes: budget.closes, origin: origin.kind, end: end.kind, ...neighboursOf(scenario) }
}
