/** The ending next to that of a scenario, within what its sliders offer: quick enough to go with every view of it. */
import type { EndKind } from '../history/outcome'
import type { Scenario } from '../scenario/scenario'
import { type Bracket, boundaryIn, bracketsOf, classified, type Purse, type Way } from './boundary'
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
const STEPS = 8
const WAYS: readonly Way[] = [-1, 1]

interface Candidate {
  readonly one: Free
  readonly bracket: Bracket
  /** The least that the change can be, as a share of the slider. */
  readonly least: number
}

/**
 * The boundary that is the smallest share of a slider away; null where none is in reach. Where only the integration of a scalar field
 * could tell, nothing is said: a look takes some 2 ms, a search a hundred looks, and this goes with every view.
 */
export function nearestOf(scenario: Scenario): Nearest | null {
  const purse: Purse = { left: MOST }
  const today = classified(scenario, purse)
  if (today === null) return null
  const candidates = freeParameters(scenario).flatMap((one) =>
    WAYS.flatMap((way) => candidateOf(one, way, today, purse)),
  )
  let best: (Nearest & { readonly share: number }) | null = null
  for (const candidate of candidates.toSorted((a, b) => a.least - b.least)) {
    if (best && candidate.least >= best.share) break
    const found = nearestIn(candidate, today, purse)
    if (found && (!best || found.share < best.share)) best = found
  }
  return best
}

const widthOf = ({ slider }: Free): number => slider.max - slider.min

function candidateOf(one: Free, way: Way, today: Kinds, purse: Purse): readonly Candidate[] {
  const width = widthOf(one)
  const distances = Array.from({ length: STEPS }, (_, i) => width * ((i + 1) / STEPS) ** 2)
  return bracketsOf(one, today, way, distances, ['end'], purse).map((bracket) => ({
    one,
    bracket,
    least: Math.abs(bracket.near - one.value) / width,
  }))
}

function nearestIn(
  { one, bracket }: Candidate,
  today: Kinds,
  purse: Purse,
): (Nearest & { readonly share: number }) | null {
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
