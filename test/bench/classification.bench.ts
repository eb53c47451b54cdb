/** Whether the universe turns round in the past or in the future, found with certainty, for scenarios away from any boundary. */
import { familyOf } from '../../lib/dark-energy/index'
import { searchTurning } from '../../lib/history/turning'
import { type Model, modelOf } from '../../lib/model'
import { budgetOf } from '../../lib/scenario/budget'
import type { Benches } from './bench'
import { inTurn, numbers, read } from './scenarios'

const COUNT = 1000
/** A scenario is away from boundaries when its densities, changed by this part, leave the kinds of both ends as they are. */
const MARGIN = 0.01

const modelFrom = (code: string): Model => {
  const scenario = read(code)
  return modelOf(budgetOf(scenario), familyOf(scenario.eos).law(scenario.law))
}

const search = (model: Model) => [searchTurning(model, -1), searchTurning(model, 1)]
const kinds = (model: Model): string =>
  search(model)
    .map(({ kind }) => kind)
    .join()

/** Models with dark energy of either sign and any curvature; `law` is the rest of their code. */
function models(law: (between: (from: number, to: number) => number) => string): readonly Model[] {
  const between = numbers()
  const list: Model[] = []
  while (list.length < COUNT) {
    const [matter, dark, rest] = [between(0.05, 2), between(-2, 3), law(between)]
    const changed = [1, 1 - MARGIN, 1 + MARGIN].map((factor) =>
      modelFrom(`matter:${(matter * factor).toFixed(6)},dark:${(dark / factor).toFixed(6)}${rest}`),
    )
    if (new Set(changed.map(kinds)).size === 1) list.push(changed[0])
  }
  return list
}

const constant = models(() => '')
const varying = models((between) => `,eos:cpl,w0:${between(-1.5, -0.5).toFixed(4)},wa:${between(-1, 0.4).toFixed(4)}`)

export const benches: Benches = {
  'both ends, random scenarios, cosmological constant': { run: inTurn(constant, search), aim: 10e-6 },
  'both ends, random scenarios, w changes': { run: inTurn(varying, search), aim: 10e-6 },
}
