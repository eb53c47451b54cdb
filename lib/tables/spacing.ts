/** How the rows of a table are spaced: by which variable, in which steps, and between which ends where none are given. */
import type { ColumnKey } from '../quantities/column'
import type { ColumnSubject, Variable } from '../quantities/instant'
import { hubbleTimeGyr } from '../units'

export interface Ends {
  readonly from: number
  readonly to: number
}

export interface Spacing {
  readonly key: string
  /** One sentence, with the ends that hold where none are given. */
  readonly meaning: string
  readonly variable: Variable
  /** The column that repeats the variable. */
  readonly column: ColumnKey
  /** Ends must lie above this. */
  readonly above: number
  readonly even: 'steps' | 'ratios'
  /** The ends, where one or both are not given. */
  ends(subject: ColumnSubject, rows: number, given: Partial<Ends>): Ends
}

export const SPACINGS: readonly Spacing[] = [
  {
    key: 'logscale',
    meaning: 'Equal steps in ln a, from a = 0.001 to a = 1.',
    variable: 'scale',
    column: 'scale',
    above: 0,
    even: 'ratios',
    ends: (_subject, _rows, { from = 0.001, to = 1 }) => ({ from, to }),
  },
  {
    key: 'scale',
    meaning: 'Equal steps in a, from one step above 0 to a = 1.',
    variable: 'scale',
    column: 'scale',
    above: 0,
    even: 'steps',
    ends: (_subject, rows, { to = 1, from = to / rows }) => ({ from, to }),
  },
  {
    key: 'time',
    meaning:
      'Equal steps in time (Gyr from now), from one step after the origin, or three Hubble times ago where there is none, to now.',
    variable: 'time',
    column: 'time',
    above: Number.NEGATIVE_INFINITY,
    even: 'steps',
    ends: (subject, rows, { to = 0, from = firstTime(subject, rows, to) }) => ({ from, to }),
  },
  {
    key: 'redshift',
    meaning: 'Equal steps in z, from 0 to 10.',
    variable: 'z',
    column: 'redshift',
    above: -1,
    even: 'steps',
    ends: (_subject, _rows, { from = 0, to = 10 }) => ({ from, to }),
  },
]

const HUBBLE_TIMES = 3

function firstTime({ scenario, history }: ColumnSubject, rows: number, to: number): number {
  const gyr = hubbleTimeGyr(scenario.h0)
  const { time } = history.origin
  return time === null ? -HUBBLE_TIMES * gyr : time * gyr + (to - time * gyr) / rows
}

/** The values of `count` rows from row `first` on; the first and the last of all rows are the ends themselves. */
export function valuesInto(
  out: Float64Array,
  { even }: Spacing,
  { from, to }: Ends,
  rows: number,
  first: number,
  count: number,
): void {
  const ratios = even === 'ratios'
  const [low, high] = ratios ? [Math.log(from), Math.log(to)] : [from, to]
  for (let i = 0; i < count; i++) {
    const part = (first + i) / (rows - 1)
    const value = low * (1 - part) + high * part
    out[i] = ratios ? Math.exp(value) : value
  }
  if (first === 0) out[0] = from
  if (first + count === rows) out[count - 1] = to
}
