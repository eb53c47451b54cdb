/** Which component dominates when, and when the expansion accelerates: stretches of time within a window. */
import type { Contents, Era } from './contents'
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

/** Shorter stretches than one of so many in a window can be missed; they could not be seen. Every other place is one of the curve's. */
const SAMPLES = 2 * EVEN
/** Halvings until a boundary is finer than a hundredth of a pixel. */
const HALVINGS = 12

export function erasOf(contents: (time: number) => Contents | null, x: Range): Eras {
  const times = Array.from({ length: SAMPLES + 1 }, (_, i) => valueAt(x, i / SAMPLES))
  const dominant = stretches(times, (time) => contents(time)?.dominant ?? null)
  const accelerating = stretches(times, (time) => (contents(time)?.accelerating ? true : null))
  return { dominant, accelerating }
}

/** Maximal stretches of one value; null is no value. */
export function stretches<T>(times: readonly number[], valueAt: (time: number) => T | null): Stretch<T>[] {
  const found: Stretch<T>[] = []
  let start = times[0] ?? 0
  let value = valueAt(start)
  times.slice(1).forEach((time, i) => {
    const next = valueAt(time)
    const last = i === times.length - 2
    if (next === value && !last) return
    const end = next === value ? time : boundary(times[i] ?? start, time, value, valueAt)
    if (value !== null && end > start) found.push({ from: start, to: end, value })
    start = end
    value = next
  })
  return found
}

function boundary<T>(from: number, to: number, value: T | null, valueAt: (time: number) => T | null): number {
  let [low, high] = [from, to]
  for (let i = 0; i < HALVINGS; i++) {
    const middle = (low + high) / 2
    if (valueAt(middle) === value) low = middle
    else high = middle
  }
  return (low + high) / 2
}
