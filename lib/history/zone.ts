/**
 * The two integrands of every time and distance, dt = dN/E and dη = dN/(aE), in variables in which they are smooth.
 * A zone is a stretch of one direction from today; s grows outwards, and m = |N| is the distance from today in ln a.
 */
import type { Anchor, Model } from '../model'

export interface Samples {
  readonly time: Float64Array
  readonly conformal: Float64Array
}

export interface Zone {
  readonly from: number
  readonly to: number
  /** Is s the distance m itself, and E² what the model gives at N = ±m? */
  readonly plain?: true
  /** First panel width to try. */
  readonly width: number
  distanceAt(s: number): number
  variableAt(m: number): number
  /** E² at s, in the form that rounds least here. */
  expansion(s: number): number
  /** Rounding error of E² at s relative to E², in units of eps. */
  conditioning(s: number): number
  /** What the error of a law of steps adds to that; absent where there is none. */
  stray?(s: number): number
  /** dt/ds and dη/ds at the sixteen nodes of the panel centre ± half. */
  sampleInto(out: Samples, centre: number, half: number): void
}

/** Where E² and its reciprocal are doubles with all their digits. */
export const [SMALLEST, LARGEST] = [1e-290, 1e290]

/** Rounding of a sum of this magnitude relative to its value; where both leave the doubles nothing cancels. */
export function conditioningOf(magnitude: number, value: number): number {
  const ratio = magnitude / value
  return ratio >= 0 && ratio < 1e16 ? 1 + ratio : 2
}

/** Within this of a place where E² and its slope nearly vanish, its second differences tell it; farther off its first ones do as well. */
const BENT = 0.05

/** E² about an anchor at which its slope is known. */
export function expansionAbout(model: Model, anchor: Anchor, slope: number, d: number): number {
  if (Math.abs(d) > BENT) return model.expansionFrom(anchor, d)
  return anchor.value + slope * d + model.bendFrom(anchor.N, d)
}
