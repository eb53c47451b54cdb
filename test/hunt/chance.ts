/** Random numbers from a seed: equal steps through a mixing function, as by Steele, Lea & Flood 2014 (OOPSLA); constants from memory. */

export interface Chance {
  /** Evenly in [from, to). */
  between(from: number, to: number): number
  /** Evenly in the logarithm. */
  size(from: number, to: number): number
  pick<T>(list: readonly T[]): T
}

export function chanceOf(seed: number): Chance {
  let state = seed >>> 0
  const next = (): number => {
    state = (state + 0x9e3779b9) >>> 0
    let x = Math.imul(state ^ (state >>> 16), 0x85ebca6b)
    x = Math.imul(x ^ (x >>> 13), 0xc2b2ae35)
    return ((x ^ (x >>> 16)) >>> 0) / 2 ** 32
  }
  const between = (from: number, to: number) => from + (to - from) * next()
  return {
    between,
    size: (from, to) => Math.exp(between(Math.log(from), Math.log(to))),
    pick: (list) => list[Math.floor(next() * list.length)],
  }
}
