/**
 * The Hubble constant at which a scenario has a given acoustic angle, or age, all its other parameters held: what keeps a
 * comparison of dark-energy laws or matter densities in agreement with the microwave background.
 */
import { isUnsolvable } from './history/field/unsolvable'
import { type History, historyOf } from './history/history'
import { isMissing, type Missing, missing } from './measures/outcome'
import { acousticAngle } from './measures/sound'
import { brent } from './numerics/roots'
import { budgetOf } from './scenario/budget'
import { H0 } from './scenario/parameters'
import type { Scenario } from './scenario/scenario'
import { hubbleTimeGyr } from './units'

export interface Kept {
  readonly key: 'acousticAngle' | 'age'
  readonly label: string
  readonly unit: string
  of(history: History, scenario: Scenario): number | Missing
}

export const KEPT: readonly Kept[] = [
  {
    key: 'acousticAngle',
    label: 'acoustic angle',
    unit: 'rad',
    of: (history, scenario) => {
      const angle = acousticAngle(history, scenario)
      return isMissing(angle) ? angle : angle.value
    },
  },
  {
    key: 'age',
    label: 'age',
    unit: 'Gyr',
    of: ({ past }, { h0 }) =>
      Number.isFinite(past.time.total) ? past.time.total * hubbleTimeGyr(h0) : missing('the past is infinite'),
  },
]

/** What a scenario has now, or why it has none. */
export function keptValue(kept: Kept, scenario: Scenario): number | Missing {
  const budget = budgetOf(scenario)
  if (budget.coldMatter < 0) return missing('massive neutrinos would outweigh the matter')
  try {
    return kept.of(historyOf(scenario, budget), scenario)
  } catch (error) {
    if (isUnsolvable(error)) return missing(error.message)
    throw error
  }
}

/** Steps of ln H₀ away from today's value, and how far they grow. */
const FIRST_STEP = 0.02
const GROWTH = 1.6
const SMALLEST_STEP = FIRST_STEP / 64
const MOST_TRIED = 60
/** Digits of H₀ that are kept: θ* then holds to some 1e-12 of itself. */
const DIGITS = 13

/** H₀ in km/s/Mpc nearest to that of the scenario at which `kept` is `target`, or why there is none. */
export function retunedH0(kept: Kept, scenario: Scenario, target: number): number | Missing {
  const excess = (h0: number) => {
    const value = keptValue(kept, { ...scenario, h0 })
    return isMissing(value) ? value : value - target
  }
  const here = excess(scenario.h0)
  if (isMissing(here)) return here
  if (here === 0) return scenario.h0
  const [low, high] = [searched(excess, scenario.h0, here, -1), searched(excess, scenario.h0, here, 1)]
  if (typeof low !== 'number' && typeof high !== 'number') return nowhere(low, high)
  const [bracket] = [low, high]
    .filter((one) => typeof one === 'number')
    .toSorted((one, other) => Math.abs(Math.log(one / scenario.h0)) - Math.abs(Math.log(other / scenario.h0)))
  const exact = brent((h0) => numberOr(excess(h0), here), scenario.h0, bracket as number)
  return Number(exact.toPrecision(DIGITS))
}

function nowhere(low: Stopped, high: Stopped): Missing {
  const tried = [low, high].map(({ last }) => Number(last.toPrecision(4)))
  const why = (side: string, { because }: Stopped) => (because === null ? [] : [`${side}, ${because}`])
  return missing(
    [`no H_0 from ${tried.join(' to ')} km/s/Mpc does it`, ...why('below', low), ...why('above', high)].join('; '),
  )
}

/** Inside a bracket every value exists; should one not, its neighbour's sign keeps the search going. */
const numberOr = (value: number | Missing, other: number): number => (isMissing(value) ? other : value)

/** How far a search came without finding the other sign, and what is amiss beyond; null where nothing is. */
interface Stopped {
  readonly last: number
  readonly because: string | null
}

/** A value of H₀ on one side where the excess has the other sign, or where the search came to its end. */
function searched(excess: (h0: number) => number | Missing, from: number, here: number, way: number): number | Stopped {
  let step = FIRST_STEP
  let last = from
  for (let tried = 0; tried < MOST_TRIED; tried++) {
    const next = Math.min(H0.max, Math.max(H0.min, last * Math.exp(way * step)))
    if (next === last) return { last, because: null }
    const value = excess(next)
    if (!isMissing(value)) {
      if (value > 0 !== here > 0) return next
      last = next
      step *= GROWTH
    } else if (step < SMALLEST_STEP) return { last, because: value.because }
    else step /= 4
  }
  return { last, because: null }
}
