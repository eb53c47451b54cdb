/** What a measure comes to: a number with a bound on its numerical error, or the reason why there is none. */

export interface Bounded {
  readonly value: number
  /** Absolute. */
  readonly error: number
}

export interface Missing {
  readonly because: string
}

export type Outcome = Bounded | Missing

export const missing = (because: string): Missing => ({ because })

export const isMissing = (outcome: Outcome | number): outcome is Missing =>
  typeof outcome === 'object' && 'because' in outcome

/** A value good to `ulps` units in the last place, beside an error from elsewhere. */
export const bounded = (value: number, error = 0, ulps = 4): Bounded => ({
  value,
  error: error + ulps * Number.EPSILON * Math.abs(value),
})

/** A finite number, or the reason why it is infinite. */
export const finiteOr = (value: number, error: number, because: string): Outcome =>
  Number.isFinite(value) ? bounded(value, error) : missing(because)
