/** Times in words: Gyr to two decimals, from a thousand on to none, smaller units where Gyr would round to nothing. */
import { fixed, MINUS, signed, significant, withUnit } from './number'

const SMALLER: readonly (readonly [unit: string, perGyr: number])[] = [
  ['Myr', 1e3],
  ['kyr', 1e6],
  ['yr', 1e9],
  ['days', 365.25e9],
  ['h', 24 * 365.25e9],
  ['s', 31557600e9],
]

/** Below this many Gyr two decimals say too little. */
export const NEAR = 0.5
/** From here on they say too much. */
const FAR = 1000

const plain = (gyr: number): string => fixed(gyr, Math.abs(gyr) < FAR ? 2 : 0)

/** A length of time, e.g. `13.79 Gyr`, `110 Myr`. */
export function duration(gyr: number): string {
  if (gyr >= NEAR || gyr === 0) return withUnit(plain(gyr), 'Gyr')
  const fitting = SMALLER.find(([, perGyr]) => gyr * perGyr >= 1) ?? (['s', 31557600e9] as const)
  return withUnit(significant(gyr * fitting[1], 3), fitting[0])
}

/** Gyr: nearer than rounding tells. */
export const isNow = (gyr: number): boolean => Math.abs(gyr) < 1e-9

/** Nearer to now two decimals of a Gyr say too little. */
const AT_HAND = 0.1

/** A time from now, e.g. `+53.28 Gyr`, `−13.79 Gyr`, `+3.21 Myr`. */
export function fromNow(gyr: number): string {
  if (Math.abs(gyr) >= AT_HAND || gyr === 0) return withUnit(signed(plain(gyr)), 'Gyr')
  return `${gyr < 0 ? MINUS : '+'}${duration(Math.abs(gyr))}`
}

/** A scale factor as a multiple of today's. */
export function size(scale: number): string {
  return significant(scale, 3)
}
