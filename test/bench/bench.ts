/** What a file of benchmarks exports as `benches`: a function by what it does. */
export interface Bench {
  readonly run: () => unknown
  /** Seconds. */
  readonly aim?: number
}

export type Benches = Readonly<Record<string, Bench>>
