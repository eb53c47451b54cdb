/** What a history is made of. */
import type { Arm } from './arm'
import type { End, Origin } from './outcome'

export interface History {
  /** From today to smaller a, by the law of the past. */
  readonly past: Arm
  /** From today to larger a, by the law of the future. */
  readonly future: Arm
  /** To larger a by the law of the past: the way in before a bounce, mirrored. */
  readonly before: Arm
  /** From the turnaround back to today's size, told from there outwards: the future mirrored, unless dark energy has a memory. */
  readonly descent: Arm
  /** On from there to smaller a by the law of the future. */
  readonly home: Arm
  /** What lies beyond the turnaround where it is no single way back to a = 0, and why it is not told further. */
  readonly unfollowed?: Unfollowed
  readonly origin: Origin
  readonly end: End
}

/** Time and conformal time from a turnaround to the end, with the error bound of the latter. */
export interface Unfollowed {
  readonly time: number
  readonly conformal: number
  readonly error: number
  readonly because: string
}
