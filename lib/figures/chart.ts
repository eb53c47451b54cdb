/** A figure of quantities as plain data. Whoever draws it chooses sizes and colours. */
import type { Eras } from './eras'
import type { Readings } from './readings'
import type { Point } from './sample'
import type { Range } from './scale'

/** An axis: a quantity, and which values of it are shown. */
export interface Axis extends Range {
  /** Name in answers and tables, where it has one there. */
  readonly quantity: string
  readonly label: string
  /** A symbol with which the label begins. */
  readonly lead?: string
  /** In the markup of labels: `_` starts a subscript. */
  readonly symbol: string
  readonly unit: string
}

/** What is put where a curve begins or stops. */
export type Mark =
  /** Where a history begins or turns: a ring. */
  | { readonly kind: 'ring'; readonly at: Point }
  /** Where a history ends: a cross. */
  | { readonly kind: 'cross'; readonly at: Point }
  /** Where it leaves the figure: an arrow along the curve. */
  | { readonly kind: 'arrow'; readonly at: Point; readonly from: Point }

export interface Curve {
  /** What the curve is of: `slot-0` for the first scenario, `part-…` for a component or a horizon. Hue follows from it. */
  readonly tone: string
  /** Which of the dashes. */
  readonly dash: number
  readonly name: string
  /** True for the scenario in focus, and where there is no such thing. */
  readonly strong: boolean
  /** The visible parts from left to right. */
  readonly segments: readonly (readonly Point[])[]
  readonly marks: readonly Mark[]
  /** Beside the name. */
  readonly note: string
  /** Where the label belongs: at the end of the curve, or anywhere along it; null where nothing of the curve is seen. */
  readonly finish: { readonly at: Point; readonly edge: 'top' | 'right' | 'inside' | 'along' } | null
  /** Where the curve goes up without end, within the figure. */
  readonly asymptote: { readonly at: number; readonly label: string } | null
}

/** A line across the figure, with a word at its end where there is room. */
export interface Reference {
  readonly axis: 'x' | 'y'
  readonly at: number
  readonly label: string
  /** On a phone. */
  readonly short?: string
}

/** A place with a name of its own. */
export interface Spot {
  readonly tone: string
  readonly at: Point
  readonly label: string
}

export interface Ribbon {
  readonly tone: string
  readonly dash: number
  readonly eras: Eras
  /** True where the future is the extrapolation of a law fitted to the past. */
  readonly extrapolated: boolean
}

export interface Chart {
  readonly title: string
  readonly x: Axis
  readonly y: Axis
  readonly curves: readonly Curve[]
  readonly references: readonly Reference[]
  readonly spots: readonly Spot[]
  readonly ribbons: readonly Ribbon[]
  /** Where today lies on the horizontal axis; null where it is not on it. */
  readonly now: number | null
  /** What lies right of today: nothing of its own, a tint, or hatching where it is an extrapolation. */
  readonly future: 'none' | 'tint' | 'hatched'
  /** For a cursor: it reads all curves at once. */
  readonly readings: Readings
  readonly caption: string
  readonly alternative: string
}
