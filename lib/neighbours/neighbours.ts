/** For each number of a scenario, the smallest change up or down that makes another kind of ending or of origin of it. */
import { familyOf } from '../dark-energy/index'
import type { Scenario } from '../scenario/scenario'
import { type Aspect, boundaryIn, classified, type Purse, stepsOut, type Way } from './boundary'
import { fieldNeighboursOf } from './field'
import { type Free, freeParameters } from './free'
import type { Kinds } from './kinds'
import { leftOutOf, type Neighbour, type Neighbourhood, neighbourAt, PRECISION } from './shape'

/** Classifications for one scenario. */
const MOST = 1500
const BOTH: readonly Aspect[] = ['end', 'origin']
const WAYS: readonly Way[] = [-1, 1]
const GROWTH = 1.7

const SPENT = 'The search for its boundaries is over the budget of classifications.'

export function neighboursOf(scenario: Scenario): Neighbourhood {
  return familyOf(scenario.eos).potential ? fieldNeighboursOf(scenario) : neighboursByLaw(scenario)
}

function neighboursByLaw(scenario: Scenario): Neighbourhood {
  const purse: Purse = { left: MOST }
  const today = classified(scenario, purse)
  if (today === null) throw new TypeError('the scenario code refuses this')
  const leftOut = [...leftOutOf(scenario)]
  const neighbours = freeParameters(scenario).flatMap((one) => {
    const list = neighboursAlong(one, today, purse)
    if (purse.left <= 0) leftOut.push({ parameter: one.key, because: SPENT })
    return list
  })
  return { neighbours, edges: [], leftOut }
}

const neighboursAlong = (one: Free, today: Kinds, purse: Purse): readonly Neighbour[] =>
  WAYS.flatMap((way) =>
    [...stepsOut(one, today, way, distancesOf(one, way), BOTH, purse)].flat().flatMap((bracket) => {
      const boundary = boundaryIn(one, today, bracket, PRECISION, purse)
      return boundary ? neighbourAt(one, today, bracket, boundary) : []
    }),
  )

/** From a slider's step by equal factors to the limit. */
function distancesOf({ value, min, max, slider }: Free, way: Way): readonly number[] {
  const whole = way > 0 ? max - value : value - min
  const list: number[] = []
  for (let distance = slider.step; distance < whole; distance *= GROWTH) list.push(distance)
  return [...list, whole]
}
