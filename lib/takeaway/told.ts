/** A solution with what is known of its numbers: what the words of this folder are made from. */
import { MEASURES } from '../quantities/measures'
import type { Solution } from '../solve'
import { type Doubts, doubtsOf } from './known'
import { type Numbers, numbersOf } from './numbers'
import { type Rounded, roundedBy, textOf } from './rounded'

export interface Known {
  readonly solution: Solution
  readonly numbers: Numbers
  readonly doubts: Doubts
}

export const knownOf = (solution: Solution): Known => ({
  solution,
  numbers: numbersOf(solution),
  doubts: doubtsOf(solution),
})

/** Finer than the page shows them, nothing is stated. */
const FINEST: ReadonlyMap<string, (value: number) => number> = new Map(
  MEASURES.map(({ key, digits }) => [
    key,
    (value: number) =>
      digits.kind === 'fixed'
        ? 10 ** -digits.count
        : 10 ** (Math.floor(Math.log10(Math.abs(value) || 1)) - digits.count + 1),
  ]),
)

/** Null where there is no such number. */
export function rounded({ numbers, doubts }: Known, key: string, most?: number): Rounded | null {
  const value = numbers.get(key)
  if (value === undefined) return null
  return roundedBy(value, doubts.get(key) ?? 0, FINEST.get(key)?.(value) ?? 0.01, most)
}

/** The absolute value in words, e.g. of a time ago; empty where there is none. */
export function sizeText(known: Known, key: string, most?: number): string {
  const found = rounded(known, key, most)
  return found === null ? '' : textOf({ ...found, value: Math.abs(found.value) })
}
