/** For each number of a scenario, the smallest change up or down that makes another kind of ending or of origin of it. */
import type { EndKind, OriginKind } from '../history/outcome'
import type { Scenario } from '../scenario/scenario'
import { type Aspect, type Bracket, boundaryIn, bracketsOf, classified, type Purse, type Way } from './boundary'
import { type Free, freeParameters, LEFT_OUT } from './free'
import type { Kinds } from './kinds'

export interface Neighbour {
  readonly parameter: string
  /** Place in a list, counted from 0; null where the parameter is one number. */
  readonly index: number | null
  readonly symbol: string
  /** Where the kind changes. */
  readonly value: number
  /** The same less the value today: 0 where any change will do. */
  readonly change: number
  readonly direction: 'up' | 'down'
  /** What changes. */
  readonly end: { readonly from: EndKind; readonly to: EndKind } | null
  readonly origin: { readonly from: OriginKind; readonly to: OriginKind } | null
  readonly because: string
}

export interface Neighbourhood {
  readonly neighbours: readonly Neighbour[]
  /** Parameters that were not moved, and why. */
  readonly leftOut: readonly { readonly parameter: string; readonly because: string }[]
}

/** Classifications for one scenario. */
const MOST = 1500
const PRECISION = 2e-10
const BOTH: readonly Aspect[] = ['end', 'origin']
const WAYS: readonly Way[] = [-1, 1]
const GROWTH = 1.7

const INTEGRATION = 'Only the integration of the field could tell how universes near this one end.'
const SPENT = 'The search for its boundaries is over the budget of classifications.'

export function neighboursOf(scenario: Scenario): Neighbourhood {
  const purse: Purse = { left: MOST }
  const today = classified(scenario, purse)
  const parameters = freeParameters(scenario)
  if (today === null)
    return {
      neighbours: [],
      leftOut: [...new Set(parameters.map((one) => one.key))].map((parameter) => ({ parameter, because: INTEGRATION })),
    }
  const leftOut = leftOutOf(scenario)
  const neighbours = parameters.flatMap((one) => {
    const list = neighboursAlong(one, today, purse)
    if (purse.left <= 0) leftOut.push({ parameter: one.key, because: SPENT })
    return list
  })
  return { neighbours, leftOut }
}

function leftOutOf({ radiation, eos }: Scenario): { parameter: string; because: string }[] {
  const keys = ['baryons', ...(radiation.kind === 'thermal' ? ['masses'] : []), ...(eos === 'nodes' ? ['at'] : [])]
  return keys.map((parameter) => ({ parameter, because: LEFT_OUT[parameter] }))
}

const neighboursAlong = (one: Free, today: Kinds, purse: Purse): readonly Neighbour[] =>
  WAYS.flatMap((way) =>
    bracketsOf(one, today, way, distancesOf(one, way), BOTH, purse).flatMap(
      (bracket) => neighbourIn(one, today, bracket, purse) ?? [],
    ),
  )

/** From a slider's step by equal factors to the limit. */
function distancesOf({ value, min, max, slider }: Free, way: Way): readonly number[] {
  const whole = way > 0 ? max - value : value - min
  const list: number[] = []
  for (let distance = slider.step; distance < whole; distance *= GROWTH) list.push(distance)
  return [...list, whole]
}

function neighbourIn(one: Free, today: Kinds, bracket: Bracket, purse: Purse): Neighbour | null {
  const boundary = boundaryIn(one, today, bracket, PRECISION, purse)
  if (!boundary) return null
  const { value, beyond } = boundary
  const { end, origin } = beyond
  const isEnd = bracket.aspect === 'end'
  return {
    parameter: one.key,
    index: one.index,
    symbol: one.symbol,
    value,
    change: changeTo(one, value),
    direction: bracket.way > 0 ? 'up' : 'down',
    end: isEnd ? { from: today.end.kind, to: end.kind } : null,
    origin: isEnd ? null : { from: today.origin.kind, to: origin.kind },
    because: isEnd ? end.because : origin.because,
  }
}

/** What the search cannot tell from nothing is nothing. */
function changeTo({ value: now, slider }: Free, value: number): number {
  const change = value - now
  return Math.abs(change) <= 4 * PRECISION * Math.max(Math.abs(now), slider.step) ? 0 : change
}
