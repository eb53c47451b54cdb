/** How a history begins and ends. Times are in 1/H₀ from now (past negative), null when infinite; scale factors are limits. */

export type OriginKind = 'big-bang' | 'bounce' | 'eternal' | 'static' | 'oscillating' | 'singular'

export type EndKind =
  | 'crunch'
  | 'rip'
  | 'little-rip'
  | 'exponential'
  | 'accelerating'
  | 'coasting'
  | 'decelerating'
  | 'static'
  | 'singular'
  | 'oscillating'

export interface Origin {
  readonly kind: OriginKind
  readonly time: number | null
  readonly scale: number
  readonly proven: boolean
  readonly because: string
}

export interface End {
  readonly kind: EndKind
  readonly time: number | null
  /** Limit of a; null when infinite. */
  readonly scale: number | null
  readonly turnaround: { readonly time: number; readonly scale: number } | null
  readonly proven: boolean
  /** One sentence. */
  readonly because: string
}
