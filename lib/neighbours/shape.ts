/** How an answer on the neighbourhood of a scenario looks. */
import type { EndKind, OriginKind } from '../history/outcome'
import type { Scenario } from '../scenario/scenario'
import type { Boundary, Bracket } from './boundary'
import { type Free, LEFT_OUT } from './free'
import type { Kinds } from './kinds'

export interface Neighbour {
  readonly parameter: string
  /** Place in a list, counted from 0; null where the parameter is one number. */
  readonly index: number | null
  readonly symbol: string
  /** Where the kind changes. */
  readonly value: number
  /** It lies no farther from `value`. */
  readonly accuracy: number
  /** The same less the value today: 0 where any change will do. */
  readonly change: number
  readonly direction: 'up' | 'down'
  /** What changes. */
  readonly end: { readonly from: EndKind; readonly to: EndKind } | null
  readonly origin: { readonly from: OriginKind; readonly to: OriginKind } | null
  /** False where a kind on either side is seen, not proven. */
  readonly certain: boolean
  readonly because: string
}

/** Where a parameter leaves what has a solution. */
export interface Edge extends Pick<Neighbour, 'parameter' | 'index' | 'symbol' | 'value' | 'accuracy' | 'change'> {
  readonly direction: Neighbour['direction']
  /** Why there is none beyond. */
  readonly because: string
}

export interface Neighbourhood {
  readonly neighbours: readonly Neighbour[]
  /** Beyond these there is no solution. */
  readonly edges: readonly Edge[]
  /** Parameters that were not moved, and why. */
  readonly leftOut: readonly { readonly parameter: string; readonly because: string }[]
}

/** Relative to a number, or to its slider's step. */
export const PRECISION = 2e-10

export function leftOutOf({ radiation, eos }: Scenario): Neighbourhood['leftOut'] {
  const keys = ['baryons', ...(radiation.kind === 'thermal' ? ['masses'] : []), ...(eos === 'nodes' ? ['at'] : [])]
  return keys.map((parameter) => ({ parameter, because: LEFT_OUT[parameter] }))
}

type Named = Pick<Neighbour, 'parameter' | 'index' | 'symbol'>

export const named = ({ key, index, symbol }: Free): Named => ({ parameter: key, index, symbol })

export function neighbourAt(one: Free, today: Kinds, bracket: Bracket, boundary: Boundary): Neighbour {
  const { value, accuracy, beyond } = boundary
  const { aspect, way } = bracket
  const { end, origin } = beyond
  return {
    ...named(one),
    value,
    accuracy,
    change: changeTo(one, value),
    direction: way > 0 ? 'up' : 'down',
    end: aspect === 'end' ? { from: today.end.kind, to: end.kind } : null,
    origin: aspect === 'origin' ? { from: today.origin.kind, to: origin.kind } : null,
    certain: today[aspect].proven && beyond[aspect].proven,
    because: beyond[aspect].because,
  }
}

/** What the search cannot tell from nothing is nothing. */
export function changeTo({ value: now, slider }: Free, value: number): number {
  const change = value - now
  return Math.abs(change) <= 4 * PRECISION * Math.max(Math.abs(now), slider.step) ? 0 : change
}
