/** Where the kind of an ending or of an origin changes as one number is moved outwards from its value today. */
import type { Scenario } from '../scenario/scenario'
import type { Free } from './free'
import { type Kinds, kindsOf } from './kinds'

export type Aspect = 'end' | 'origin'
export type Way = 1 | -1

/** Classifications that may still be spent; counted down. */
export interface Purse {
  left: number
}

/** Two values between which the kind changes; the first keeps that of today. */
export interface Bracket {
  readonly aspect: Aspect
  readonly way: Way
  readonly near: number
  readonly far: number
}

/** Where it changes, and what to. */
export interface Boundary {
  readonly value: number
  /** It lies no farther from `value`. */
  readonly accuracy: number
  readonly beyond: Kinds
}

export function classified(scenario: Scenario, purse: Purse): Kinds | null {
  if (purse.left <= 0) return null
  purse.left--
  return kindsOf(scenario)
}

/** The nearest bracket of each aspect in one direction, as steps of a list of distances come to it; none beyond what the code allows. */
export function* stepsOut(
  one: Free,
  today: Kinds,
  way: Way,
  distances: readonly number[],
  aspects: readonly Aspect[],
  purse: Purse,
): Generator<readonly Bracket[], undefined> {
  let open = aspects
  const limit = way > 0 ? one.max : one.min
  let near = one.value
  for (const distance of distances) {
    if (open.length === 0 || near === limit) return
    const far = way > 0 ? Math.min(one.value + distance, limit) : Math.max(one.value - distance, limit)
    const kinds = classified(one.with(far), purse)
    if (kinds === null) return
    const met = open.filter((aspect) => kinds[aspect].kind !== today[aspect].kind)
    open = open.filter((aspect) => !met.includes(aspect))
    const step = { way, near, far }
    yield met.map((aspect) => ({ aspect, ...step }))
    near = far
  }
}

/** Halves a bracket down to `precision`, then names the boundary by the shortest number in it. */
export function boundaryIn(
  one: Free,
  today: Kinds,
  bracket: Bracket,
  precision: number,
  purse: Purse,
): Boundary | null {
  const { aspect, way } = bracket
  let { near, far } = bracket
  const size = () => precision * Math.max(Math.abs(near), Math.abs(far), one.slider.step)
  let kinds: Kinds | null = null
  while (Math.abs(far - near) > size()) {
    const middle = near + (far - near) / 2
    const there = classified(one.with(middle), purse)
    if (there === null) return null
    if (there[aspect].kind === today[aspect].kind) near = middle
    else [far, kinds] = [middle, there]
  }
  const place = placeIn(near, far)
  // A little farther on, since a kind of its own may belong to the boundary alone.
  const clear = far + way * 4 * size()
  const beyond = clear >= one.min && clear <= one.max ? classified(one.with(clear), purse) : null
  const other =
    beyond && beyond[aspect].kind !== today[aspect].kind ? beyond : (kinds ?? classified(one.with(far), purse))
  return other && { ...place, beyond: other }
}

/** The shortest number between two, and how far the farther of them is. */
export function placeIn(near: number, far: number): { readonly value: number; readonly accuracy: number } {
  const value = shortest(Math.min(near, far), Math.max(near, far))
  return { value, accuracy: Math.max(Math.abs(value - near), Math.abs(value - far)) }
}

/** The decimal of fewest digits between two numbers. */
function shortest(low: number, high: number): number {
  const middle = low + (high - low) / 2
  if (low <= 0 && high >= 0) return 0
  for (let digits = 1; digits < 17; digits++) {
    const rounded = Number(middle.toPrecision(digits))
    if (rounded >= low && rounded <= high) return rounded
  }
  return middle
}
