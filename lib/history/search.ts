/** What a search for turning points finds. */

/** Farthest |ln a| for which a and 1/a are doubles. */
export const FARTHEST = 700

/** Where E² passes a minimum that doubles hardly tell from zero: E²(N + d) = value + slope d + what bends. */
export interface Narrow {
  readonly N: number
  readonly value: number
  readonly slope: number
}

interface Found {
  /** Where E² only just stays above zero on the way. */
  readonly narrows: readonly Narrow[]
  /** One sentence on why this is not proven; null where it is. */
  readonly doubt: string | null
}

export type Search = Found &
  (
    | {
        /** No turning point; or one at a scale factor outside the doubles, of which nothing but N can be said. */
        readonly kind: 'none'
        readonly farRoot: number | null
      }
    | {
        /** E² vanishes at N and is negative beyond. */
        readonly kind: 'root'
        readonly N: number
        /** dE²/dN there, where doubles would lose it: near a double root. */
        readonly slope?: number
      }
    /** E² and its slope vanish together: a static state, for certain or as far as the digits tell. */
    | {
        readonly kind: 'double'
        readonly N: number
        /** By exact arithmetic on the decimals of the densities. */
        readonly exact: boolean
      }
    /** The law of dark energy ends at N before E² vanishes: its density or its pressure diverges. */
    | { readonly kind: 'singular'; readonly N: number }
  )
