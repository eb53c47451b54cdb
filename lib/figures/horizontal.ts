/** The horizontal axes of views: every quantity against which the others can be drawn. */

import { eventAtConformal, isEvent } from '../history/event'
import { type Missing, missing } from '../measures/outcome'
import type { ColumnKey } from '../quantities/column'
import { columnOf } from '../quantities/columns'
import { type Instant, instantAt, instantOf, type Variable } from '../quantities/instant'
import type { Solution } from '../solve'
import { hubbleLengthGly } from '../units'
import type { Axis } from './chart'
import type { Range } from './scale'

export interface Horizontal {
  readonly key: string
  /** In a choice. */
  readonly word: string
  readonly quantity: Pick<Axis, 'quantity' | 'label' | 'symbol' | 'unit'>
  /** Where today lies. */
  readonly now: number
  /** Which way the future lies. */
  readonly future: 'right' | 'none'
  /** How instants are asked for: a variable, which may run the other way, and what it must lie above; null where by none. */
  readonly asked: { readonly variable: Variable; readonly sign: 1 | -1; readonly above: number } | null
  instant(solution: Solution, value: number): Instant | Missing
  /** Where an instant lies on the axis. */
  place(solution: Solution, instant: Instant): number
  /** What is shown of it unless someone asks for a range: the past alone, or the future too. */
  range(solutions: readonly Solution[], whole: boolean): Range
}

// Numbers of ranges are tuned by eye.
/** Future in units of the past, along even and along logarithmic axes. */
const FUTURE = { linear: 1.6, log: 100 }
const ETERNAL_PAST = 1.4
const MARGIN = 1.02
/** Beyond the least and the largest scale factor there ever is. */
const REACHED = 1.25

const axisOf = (key: ColumnKey, symbol?: string): Horizontal['quantity'] => {
  const column = columnOf(key)
  return { quantity: key, label: column.label, symbol: symbol ?? column.symbol, unit: column.unit }
}

const by = (variable: Variable, sign: 1 | -1 = 1): Pick<Horizontal, 'asked' | 'instant'> => ({
  asked: { variable, sign, above: LEAST[variable] },
  instant: (solution, value) =>
    sign * value > LEAST[variable] ? instantAt(solution, variable, sign * value) : missing('there is no such instant'),
})

/** What must lie below a value. */
const LEAST: Readonly<Record<Variable, number>> = {
  z: -1,
  scale: 0,
  time: Number.NEGATIVE_INFINITY,
  age: Number.NEGATIVE_INFINITY,
}
const timeOf = (_: Solution, { time }: Instant) => time
const scaleOf = (_: Solution, { scale }: Instant) => scale
const redshiftOf = (_: Solution, { redshift }: Instant) => redshift

const linear = (from: number, to: number): Range => ({ scaling: 'linear', from, to, linear: 1 })
const log = (from: number, to: number): Range => ({ scaling: 'log', from, to, linear: 1 })
const signedLog = (from: number, to: number, even: number): Range => ({ scaling: 'signed-log', from, to, linear: even })

const pastOf = (solutions: readonly Solution[]): number =>
  Math.max(
    ...solutions.map(({ origin, measures }) =>
      origin.time === null ? ETERNAL_PAST * (measures.hubbleTime.value ?? 1) : -origin.time,
    ),
  )

/** The last ending, where it comes soon enough to be seen. */
function futureOf(solutions: readonly Solution[], past: number, share: number): number {
  const ends = solutions.map(({ end }) => end.time ?? Number.POSITIVE_INFINITY)
  const last = Math.max(...ends) * MARGIN
  return last < 2 * share * past ? last : share * past
}

const timeRange = (solutions: readonly Solution[], whole: boolean): Range => {
  const past = pastOf(solutions)
  return linear(-past * (whole ? MARGIN : 1), whole ? futureOf(solutions, past, FUTURE.linear) : 0)
}

const logTimeRange = (solutions: readonly Solution[], whole: boolean): Range => {
  const past = pastOf(solutions)
  const even = 10 ** Math.round(Math.log10(0.07 * past))
  return signedLog(-past * MARGIN, whole ? futureOf(solutions, past, FUTURE.log) : 0, even)
}

/** No more than what the scale factors reach, of which a bounce leaves out the small ones and a turn the large ones. */
function logScaleRange(solutions: readonly Solution[], whole: boolean): Range {
  const least = Math.min(...solutions.map(({ origin }) => origin.scale)) / REACHED
  const most = Math.max(...solutions.map(({ end }) => end.turnaround?.scale ?? Number.POSITIVE_INFINITY)) * REACHED
  return whole ? log(Math.max(1e-5, least), Math.min(100, most)) : log(Math.min(0.1, Math.max(1e-3, least)), 1)
}

/** All of conformal time where it is finite. */
function conformalRange(solutions: readonly Solution[]): Range {
  const gly = ({ scenario }: Solution) => hubbleLengthGly(scenario.h0)
  const pasts = solutions.map((one) => one.history.past.conformal.total * gly(one))
  const past = Math.max(...pasts.map((total) => (Number.isFinite(total) ? total : 40)))
  const futures = solutions.map(({ measures }) => measures.eventHorizon.value ?? Number.POSITIVE_INFINITY)
  return linear(-past * MARGIN, Math.min(2 * past, Math.max(...futures) * MARGIN))
}

export const HORIZONTALS: readonly Horizontal[] = [
  {
    key: 'time',
    word: 'time',
    quantity: axisOf('time', ''),
    now: 0,
    future: 'right',
    ...by('time'),
    place: timeOf,
    range: timeRange,
  },
  {
    key: 'logtime',
    word: 'time, logarithmic',
    quantity: axisOf('time', ''),
    now: 0,
    future: 'right',
    ...by('time'),
    place: timeOf,
    range: logTimeRange,
  },
  {
    key: 'lookback',
    word: 'lookback time',
    quantity: axisOf('lookback'),
    now: 0,
    future: 'none',
    ...by('time', -1),
    place: (_, { time }) => -time,
    range: (solutions) => linear(0, pastOf(solutions)),
  },
  {
    key: 'scale',
    word: 'scale factor',
    quantity: axisOf('scale'),
    now: 1,
    future: 'right',
    ...by('scale'),
    place: scaleOf,
    range: (_, whole) => linear(0, whole ? 3 : 1),
  },
  {
    key: 'logscale',
    word: 'scale factor, logarithmic',
    quantity: axisOf('scale'),
    now: 1,
    future: 'right',
    ...by('scale'),
    place: scaleOf,
    range: logScaleRange,
  },
  {
    key: 'redshift',
    word: 'redshift',
    quantity: axisOf('redshift'),
    now: 0,
    future: 'none',
    ...by('z'),
    place: redshiftOf,
    range: () => linear(0, 6),
  },
  {
    key: 'logredshift',
    word: 'redshift, logarithmic in 1 + z',
    quantity: axisOf('redshift'),
    now: 0,
    future: 'none',
    ...by('z'),
    place: redshiftOf,
    // ln(1 + z) is the signed logarithm with a linear part of 1.
    range: () => signedLog(0, 1100, 1),
  },
  {
    key: 'conformal',
    word: 'conformal time',
    quantity: { quantity: 'conformal', label: 'conformal time from now', symbol: 'c (η − η_0)', unit: 'Gly' },
    now: 0,
    future: 'right',
    asked: null,
    instant: (solution, value) => {
      const event = eventAtConformal(solution.history, value / hubbleLengthGly(solution.scenario.h0))
      return isEvent(event) ? instantOf(solution, event) : missing(event.because)
    },
    place: ({ scenario }, { conformal }) => conformal * hubbleLengthGly(scenario.h0),
    range: conformalRange,
  },
]

export const horizontalNamed = (key: string): Horizontal | undefined => HORIZONTALS.find((one) => one.key === key)
