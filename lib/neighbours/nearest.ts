/** The ending next to that of a scenario, within what its sliders offer: quick enough to go with every view of it. */
import type { EndKind } from '../history/outcome'
import type { Scenario } from '../scenario/scenario'
import { type Bracket, boundaryIn, classified, type Purse, stepsOut, type Way } from './boundary'
import { type Free, freeParameters } from './free'
import type { Kinds } from './kinds'

export interface Nearest {
  readonly symbol: string
  readonly value: number
  /** From there on, or only there, since the code allows no more. */
  readonly where: 'above' | 'below' | 'at'
  /** False where the least change will do. */
  readonly apart: boolean
  readonly to: EndKind
}

const MOST = 400
const PRECISION = 1e-6
const RINGS = 8
const WAYS: readonly Way[] = [-1, 1]

type Found = Nearest & { readonly share: number }

/**
 * The boundary that is the smallest share of a slider away; null where none is in reach. Where only the integration of a scalar field
 * could tell, nothing is said: a look takes some 2 ms, a search a hundred looks, and this goes with every view.
 */
export function nearestOf(scenario: Scenario): Nearest | null {
  const purse: Purse = { left: MOST }
  const today = classified(scenario, purse)
  if (today === null) return null
  const ways = freeParameters(scenario).flatMap((one) =>
    WAYS.map((way) => ({ one, steps: stepsOut(one, today, way, ringsOf(one), ['end'], purse) })),
  )
  // What lies in one ring is nearer than all that lies beyond it.
  for (let ring = 0; ring < RINGS; ring++) {
    let best: Found | null = null
    for (const { one, steps } of ways) {
      const [bracket] = steps.next().value ?? []
      const found = bracket ? nearestIn(one, bracket, today, purse) : null
      if (found && (!best || found.share < best.share)) best = found
    }
    if (best) return best
  }
  return null
}

const widthOf = ({ slider }: Free): number => slider.max - slider.min

/** Distances of equal shares of a slider for all numbers. */
const ringsOf = (one: Free): readonly number[] =>
  Array.from({ length: RINGS }, (_, i) => widthOf(one) * ((i + 1) / RINGS) ** 2)

function nearestIn(one: Free, bracket: Bracket, today: Kinds, purse: Purse): Found | null {
  const boundary = boundaryIn(one, today, bracket, PRECISION, purse)
  if (!boundary) return null
  const change = Math.abs(boundary.value - one.value)
  const near = 4 * PRECISION * Math.max(Math.abs(one.value), one.slider.step)
  const limit = bracket.way > 0 ? one.max : one.min
  const isLimit = Math.abs(limit - boundary.value) <= near
  return {
    symbol: one.symbol,
    value: isLimit ? limit : boundary.value,
    where: isLimit ? 'at' : bracket.way > 0 ? 'above' : 'below',
    apart: change > near,
    to: boundary.beyond.end.kind,
    share: change / widthOf(one),
  }
}
