/**
 * The neighbourhood of a scalar field's scenario. Each look integrates the field, so steps are few, and what they may cost is counted
 * in evaluations of the equation of motion: some 250 ms for all, too much for the verdict that goes with every view.
 */

import { CMB, H0, NU } from '../scenario/parameters'
import type { Scenario } from '../scenario/scenario'
import { type Bracket, placeIn, type Way } from './boundary'
import { type Free, freeParameters } from './free'
import { isUnsolved, kindsFollowed, type Tally } from './kinds'
import { changeTo, type Edge, leftOutOf, type Neighbour, type Neighbourhood, named, neighbourAt } from './shape'
import { fallsShort, goesOn, MOST_STEPS, narrowBracket, narrowWall, type Walk, walkFrom, walkOn } from './walk'

/** Evaluations for one scenario; the last classification may go beyond by what a whole history may cost. */
export const MOST_EVALUATIONS = 1_100_000
/** What steps outwards leave for the narrowing. */
const FOR_NARROWING = 400_000
/** With fewer, numbers that act through the weight of light alone are left out. */
const ENOUGH_STEPS = 6
/** Fewer say too little; a way that is too dear for them is cut short. */
const LEAST_STEPS = 3
const WAYS: readonly Way[] = [-1, 1]

const LIGHT: readonly string[] = [H0.key, CMB.key, NU.key]
const TOO_DEAR =
  'It acts through the weight of light and neutrinos alone, and the integration of this field leaves no budget to follow it.'

export function fieldNeighboursOf(scenario: Scenario, tally: Tally = { left: MOST_EVALUATIONS }): Neighbourhood {
  const all = freeParameters(scenario)
  const today = kindsFollowed(scenario, tally)
  if (isUnsolved(today)) {
    const leftOut = all.map((one) => ({ parameter: one.key, because: today.because }))
    return { neighbours: [], edges: [], leftOut }
  }
  const cost = MOST_EVALUATIONS - tally.left
  const dear = stepsFor(cost, all) < ENOUGH_STEPS
  const light = all.filter((one) => LIGHT.includes(one.key))
  const others = all.filter((one) => !light.includes(one))
  const parameters = dear ? others : [...others, ...light]
  const steps = Math.max(LEAST_STEPS, stepsFor(cost, parameters))
  const walks = parameters.flatMap((one) => WAYS.map((way) => walkFrom(one, way, today, steps)))
  const found = explored(walks, tally)
  const skipped = (dear ? light : []).map(({ key }) => ({ parameter: key, because: TOO_DEAR }))
  return { ...found, leftOut: [...leftOutOf(scenario), ...skipped, ...walks.filter(fallsShort).map(cutShort)] }
}

/** As many as the purse allows if every look costs what that of today did. */
const stepsFor = (cost: number, parameters: readonly Free[]): number =>
  Math.min(
    MOST_STEPS,
    Math.floor((MOST_EVALUATIONS - FOR_NARROWING) / (WAYS.length * parameters.length * Math.max(1, cost))),
  )

/** Each way gets an equal share of what those before it have left. */
function inShares(walks: readonly Walk[], tally: Tally, kept: number, act: (walk: Walk, floor: number) => void): void {
  walks.forEach((walk, i) => {
    act(walk, tally.left - Math.max(0, tally.left - kept) / (walks.length - i))
  })
}

/** Outwards; on with what others left; then the boundaries; then farther still, with what these have left. */
function explored(walks: readonly Walk[], tally: Tally): Pick<Neighbourhood, 'neighbours' | 'edges'> {
  const outwards = (kept: number) =>
    inShares(walks.filter(goesOn), tally, kept, (walk, floor) => walkOn(walk, tally, floor))
  const known = new Map<Bracket, Neighbour | null>()
  const inwards = () =>
    inShares(
      walks.filter((one) => isOpen(one, known)),
      tally,
      0,
      (walk, floor) => narrow(walk, known, tally, floor),
    )
  outwards(FOR_NARROWING)
  outwards(FOR_NARROWING)
  inwards()
  outwards(tally.left / 2)
  inwards()
  const inOrder = walks.flatMap(({ brackets }) => brackets.map((one) => known.get(one) ?? null))
  return { neighbours: inOrder.filter((one) => one !== null), edges: walks.flatMap(edgeOf) }
}

type Known = Map<Bracket, Neighbour | null>

const isOpen = ({ wall, brackets }: Walk, known: Known): boolean =>
  wall !== null || brackets.some((one) => !known.has(one))

function narrow(walk: Walk, known: Known, tally: Tally, floor: number): void {
  narrowWall(walk, tally, (tally.left + floor) / 2)
  for (const bracket of walk.brackets) {
    if (known.has(bracket)) continue
    const boundary = narrowBracket(walk, bracket, tally, floor)
    known.set(bracket, boundary && neighbourAt(walk.one, walk.today, bracket, boundary))
  }
}

function edgeOf({ one, way, wall }: Walk): readonly Edge[] {
  if (!wall) return []
  const { value, accuracy } = placeIn(wall.near, wall.far)
  const change = changeTo(one, value)
  return [{ ...named(one), value, accuracy, change, direction: way > 0 ? 'up' : 'down', because: wall.because }]
}

function cutShort({ one, way, reached }: Walk): Neighbourhood['leftOut'][number] {
  const direction = way > 0 ? 'up' : 'down'
  const because =
    reached === one.value
      ? `Not followed ${direction}: that is over the budget of integration.`
      : `Followed ${direction} to ${Number(reached.toPrecision(6))} only: what lies beyond is over the budget of integration.`
  return { parameter: one.key, because }
}
