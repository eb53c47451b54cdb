/** What a cursor over a figure reads: every curve at the same places along the horizontal axis. */
import { evenParts } from '../numerics/list'
import { fractionOf, type Range, valueAt } from './scale'

export interface Readings {
  /** Values of the horizontal quantity, ascending. */
  readonly places: readonly number[]
  /** For each curve its values there, null where it has none; they may lie outside the figure. */
  readonly values: readonly (readonly (number | null)[])[]
}

export const NO_READINGS: Readings = { places: [], values: [] }

type Values = (places: readonly number[]) => readonly (number | null)[]

/** Together with now and three special places of each of six scenarios: 300 at most. */
const STEPS = 279
/** Nearer to a special place than this part of a step there is no other: a hand that steps along should see something change. */
const LEAST_STEP = 0.5

export function readingsOf(curves: readonly Values[], x: Range, special: readonly number[], steps = STEPS): Readings {
  const parts = special.map((place) => fractionOf(x, place))
  const isApart = (part: number) =>
    part === 0 || part === 1 || parts.every((one) => !(Math.abs(one - part) < LEAST_STEP / steps))
  const even = evenParts(steps)
    .filter(isApart)
    .map((part) => valueAt(x, part))
  const inside = [...even, ...special].filter((place) => place >= x.from && place <= x.to)
  const places = [...new Set(inside.map((place) => digits(place, 7)))].sort((one, other) => one - other)
  return {
    places,
    values: curves.map((values) => values(places).map((value) => (known(value) ? digits(value, 5) : null))),
  }
}

const known = (value: number | null): value is number => value !== null && Number.isFinite(value)

/** As many as a screen can show and a read-out can use. */
function digits(value: number, count: number): number {
  return Number(value.toPrecision(count))
}
