/** What a column of numbers along a history says about itself, and how its values are made. */
import { type Missing, missing } from '../measures/outcome'
import { type Block, blockOf } from './block'
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
  readonly key: ColumnKey | `${ColumnKey}Error`
  /** A number for each instant of a block in the unit of the column; where it is not finite there is none. */
  values(block: Block): Float64Array
  /** A finite number, or the reason why there is none. */
  value(subject: ColumnSubject, instant: Instant): number | Missing
  /** What has to be said beside a value; null where nothing has. */
  note(subject: ColumnSubject, instant: Instant): string | null
}

/** A column as it is written down. */
export interface Definition extends Quantity {
  readonly key: Column['key']
  values(block: Block): Float64Array
  /** Why there is no value at place i; null, as where this is not given, when it leaves the doubles. */
  why?(block: Block, i: number): Missing | null
  /** What has to be said beside the value at place i. */
  remark?(block: Block, i: number): string | null
}

const OUT_OF_RANGE = missing('the value is outside the range of floating-point numbers')

export const columnFrom = (definition: Definition): Column => ({
  ...definition,
  value: (subject, instant) => {
    const block = blockOf(subject, instant)
    const [value] = definition.values(block)
    // Never −0.
    return Number.isFinite(value) ? value + 0 : (definition.why?.(block, 0) ?? OUT_OF_RANGE)
  },
  note: (subject, instant) => definition.remark?.(blockOf(subject, instant), 0) ?? null,
})
