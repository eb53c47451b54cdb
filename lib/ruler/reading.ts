/** What a reading of the ruler is: a quantity at an epoch of a history, and perhaps of a length, a line or an area. */
import type { Missing } from '../measures/outcome'
import type { ColumnSubject, Instant } from '../quantities/instant'
import type { Quantity } from '../quantities/quantity'
import type { Given } from './given'

/** A history at an epoch. */
export interface Epoch {
  readonly subject: ColumnSubject
  readonly instant: Instant
  readonly given: Given
}

export interface Reading extends Quantity {
  /** A finite number in the unit of the reading, or the reason why there is none. */
  value(epoch: Epoch): number | Missing
  /** What has to be said beside a value; null where nothing has. */
  note?(epoch: Epoch): string | null
  /** The unit, where it hangs on what is given. */
  unitOf?(given: Given): string
}
