/** Ranges that a person steps to along an axis. Known to the page too, for keys and brush. */
import { type Range, valueAt } from './scale'

export interface Ends {
  readonly from: number
  readonly to: number
}

/** How much closer or wider one step is, and how far one step aside. */
const STEP = 0.6
const ASIDE = 0.25

/** Closer about a part of the axis, which keeps its place; `times` below 1 makes it closer. */
function about(range: Range, part: number, times: number): Ends {
  return between(range, part - part * times, part + (1 - part) * times)
}

export const closer = (range: Range, part: number): Ends => about(range, part, STEP)
export const wider = (range: Range, part: number): Ends => about(range, part, 1 / STEP)
export const aside = (range: Range, direction: 1 | -1): Ends => between(range, direction * ASIDE, 1 + direction * ASIDE)

/** The values between two parts of an axis, with no more digits than it takes to tell them apart. */
export function between(range: Range, one: number, other: number): Ends {
  const [from, to] = [valueAt(range, Math.min(one, other)), valueAt(range, Math.max(one, other))]
  const digits = Math.max(0, Math.min(9, 2 - Math.floor(Math.log10(to - from))))
  const short = (value: number) => {
    const own =
      range.scaling === 'linear' ? digits : Math.max(0, Math.min(9, 2 - Math.floor(Math.log10(Math.abs(value) || 1))))
    return Number(value.toFixed(own))
  }
  return { from: short(from), to: short(to) }
}

const FROM = 'FROM'
const TO = 'TO'

/** A link that waits for its range. */
export const TEMPLATE = { from: FROM, to: TO } as const

export function ranged(template: string, { from, to }: Ends): string {
  return template.replace(FROM, String(from)).replace(TO, String(to))
}
