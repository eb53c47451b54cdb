/**
 * How far the field as it is followed strays from the true one: it is followed once more by steps of ten times the tolerance, which
 * stray up to ten times as far. Three times what lies between the two is the bound, since both come to today's density only so well. Where a universe nearly rests, or a field
 * rolls off the top of its potential, errors of steps grow on the way, by how much no constant could say.
 */
import type { Law } from '../../dark-energy/law'
import { type Height, heightBeside } from './height'
import type { Field } from './motion'
import { FINAL, fieldOf, passage, type Search } from './shot'
import { intervalOf } from './trail'
import { isUnsolvable } from './unsolvable'

export const LOOSER = 10
export const MARGIN = 3
/** What is said where the looser steps lead elsewhere. */
export const LOST = 1e-4
/** Of n = −d ln ρ/dN: errors of f′ and f″ count as those of f times this and its square. */
const STEEPEST = 6

/** Relative errors of ρ at the edges between steps, from the same law by looser steps; of ρ and its slopes no less than `least`. */
export function straysOf(edges: Float64Array, law: Law, beside: Law, least: (N: number) => number): Float64Array {
  const [one, other] = [new Float64Array(3), new Float64Array(3)]
  return edges.map((N) => {
    law.derivativesInto(one, N)
    beside.derivativesInto(other, N)
    const scale = [1, STEEPEST, STEEPEST ** 2]
    let stray = 0
    for (let k = 0; k < 3; k++) {
      const off = Math.max(MARGIN * Math.abs(one[k] - other[k]), least(N) * Math.abs(one[k]))
      stray = Math.max(stray, off / scale[k] / Math.abs(one[0]))
    }
    return Number.isFinite(stray)
      ? stray
      : /* v8 ignore next -- an energy of exactly 0 at the end of a step: by chance alone */ LOST
  })
}

/** The larger of both ends of the interval that holds N. */
export function strayAt(edges: Float64Array, strays: Float64Array, N: number): number {
  const i = intervalOf(edges, N, 0)
  return Math.max(strays[i], strays[i + 1])
}

export interface Beside {
  readonly field: Field
  readonly steps: ReturnType<typeof passage>['steps']
  readonly state: Float64Array
}

/** The field by looser steps from rest to today, with the height that these lead to; null where they do not come through. */
export function beside(search: Search, height: Height): Beside | null {
  try {
    const field = fieldOf(search, heightBeside(search, height, LOOSER * FINAL))
    return { field, ...passage(field, search.purse, LOOSER * FINAL) }
  } catch (error) {
    /* v8 ignore if -- nothing else is thrown on the way */
    if (!isUnsolvable(error)) throw error
    return null
  }
}
