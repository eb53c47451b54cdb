/** What a column of numbers along a history says about itself, and how its value is read. */
import { type Missing, missing } from '../measures/outcome'
import type { ColumnSubject, Instant } from './instant'
import type { Quantity } from './quantity'

/** Every column, in the order of answers and tables. */
export const COLUMN_KEYS = [
  'time',
  'age',
  'lookback',
  'scale',
  'redshift',
  'hubble',
  'deceleration',
  'jerk',
  'omegaMatter',
  'omegaRadiation',
  'omegaNeutrino',
  'omegaCurvature',
  'omegaDark',
  'w',
  'comoving',
  'transverse',
  'angular',
  'luminosity',
  'modulus',
  'arcsecond',
  'volume',
  'conformal',
  'particleHorizon',
  'eventHorizon',
  'hubbleRadius',
  'temperature',
  'criticalDensity',
  'drift',
  'growth',
  'growthRate',
] as const
export type ColumnKey = (typeof COLUMN_KEYS)[number]

export interface Column extends Quantity {
  readonly key: ColumnKey
  /** A finite number in the unit of the column, or the reason why there is none. */
  value(subject: ColumnSubject, instant: Instant): number | Missing
  /** What has to be said beside a value; null where nothing has. */
  note?(subject: ColumnSubject, instant: Instant): string | null
}

const OUT_OF_RANGE = missing('the value is outside the range of floating-point numbers')

/** The same column, which never gives NaN, an infinity or −0. */
export const guarded = (column: Column): Column => ({
  ...column,
  value: (subject, instant) => {
    const value = column.value(subject, instant)
    return typeof value !== 'number' ? value : Number.isFinite(value) ? value + 0 : OUT_OF_RANGE
  },
})
