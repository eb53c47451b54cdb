/** Which component dominates when, and when the expansion accelerates: stretches of time within a window. */
import type { Era } from './contents'
import { EVEN } from './sample'
import { type Range, valueAt } from './scale'

export interface Stretch<T> {
  readonly from: number
  readonly to: number
  readonly value: T
}

export interface Eras {
  readonly dominant: readonly Stretch<Era>[]
  readonly accelerating: readonly Stretch<true>[]
}

/** A history as places in the order of time. */
export interface Course<Place> {
  readonly at: (time: number) => Place
  readonly timeOf: (place: Place) => number
  /** A place between two; by what is at hand, so it need not be the middle of their times. */
  readonly between: (one: Place, other: Place) => Place
}

/** What is told of a place; null where there is nothing to tell. */
export interface Told<Place> {
  readonly dominant: (place: Place) => Era | null
  readonly accelerating: (place: Place) => true | null
}

/** Halvings until a boundary is finer than a hundredth of a pixel. */
const HALVINGS = 14

/** What is shorter than half a step of the curve can be missed; it could not be seen. */
export function erasOf<Place>(course: Course<Place>, { dominant, accelerating }: Told<Place>, x: Range): Eras {
  const places = placesOf(course, x)
  return { dominant: stretches(course, places, dominant), accelerating: stretches(course, places, accelerating) }
}

/** At the even steps of the curve, which are known already, and between any two of them. */
function placesOf<Place>({ at, between }: Course<Place>, x: Range): readonly Place[] {
  const places = [at(valueAt(x, 0))]
  for (let i = 1; i <= EVEN; i++) {
    const next = at(valueAt(x, i / EVEN))
    places.push(between(places[places.length - 1] as Place, next), next)
  }
  return places
}

/** Maximal stretches of one value; null is no value. */
export function stretches<T, Place>(
  course: Course<Place>,
  places: readonly Place[],
  valueAt: (place: Place) => T | null,
): Stretch<T>[] {
  const found: Stretch<T>[] = []
  let [before] = places as readonly [Place]
  let start = before
  let value = valueAt(before)
  const end = (to: Place) => {
    const [one, other] = [course.timeOf(start), course.timeOf(to)]
    if (value !== null && other > one) found.push({ from: one, to: other, value })
    start = to
  }
  for (const place of places) {
    const next = valueAt(place)
    if (next !== value) end(boundary(course, before, place, value, valueAt))
    value = next
    before = place
  }
  end(before)
  return found
}

function boundary<T, Place>(
  { between }: Course<Place>,
  from: Place,
  to: Place,
  value: T | null,
  valueAt: (place: Place) => T | null,
): Place {
  let [low, high] = [from, to]
  for (let i = 0; i < HALVINGS; i++) {
    const middle = between(low, high)
    if (valueAt(middle) === value) low = middle
    else high = middle
  }
  return between(low, high)
}
