/** `/api/history`: whole histories as plain data. */
import type { Reading } from '../scenario/scenario'
import { linkQuery } from '../scenario/write'
import { ENGINE, type Solution } from '../solve'
import { readKeys } from './keys'
import { mapped, type Pairs, type Question, scenariosOf, solved } from './question'
import { seriesOf } from './series'

export type HistoryAnswer = ReturnType<typeof historyAnswer>

export function askHistory(pairs: Pairs): Reading<Question<HistoryAnswer>> {
  const keys = readKeys(pairs, [])
  return mapped(scenariosOf(keys.codes, keys.faults), (scenarios) => ({
    canonical: linkQuery(scenarios),
    answer: () => mapped(solved(scenarios, historyOfScenario), enclosed),
  }))
}

export const historyAnswer = (solutions: readonly Solution[]) => enclosed(solutions.map(historyOfScenario))

const enclosed = (scenarios: readonly ReturnType<typeof historyOfScenario>[]) => ({ engine: ENGINE, scenarios })

/** One scenario of the answer. */
export function historyOfScenario(solution: Solution) {
  const { code, label, budget, origin, end, measures, moments } = solution
  const { photons, masslessNeutrinos, massiveNeutrinos, coldMatter, curvature, dark } = budget
  return {
    code,
    label,
    densities: { photons, masslessNeutrinos, massiveNeutrinos, coldMatter, curvature, dark },
    origin: { kind: origin.kind, time: origin.time, scale: origin.scale },
    end: {
      kind: end.kind,
      time: end.time,
      scale: end.scale,
      turnaround: end.turnaround,
      proven: end.proven,
      because: end.because,
    },
    measures,
    moments,
    series: seriesOf(solution),
  }
}
