/** How far the vertical axis goes, from the values that are to be seen. */
import { linearRange, type Range } from './scale'

// All numbers here are tuned by eye.
/** Where a curve runs away at an edge it is cut: what lies beyond these parts of its values. */
const CUT = { low: 0.03, high: 0.92 }
/** But not where the whole is hardly larger than the rest. */
const HARDLY = 1.7
const PAD = 0.06
/** What varies by less in parts of itself does not vary. */
const LEVEL = 1e-12
/** What must be seen fills at least one part in so many. */
const RUNAWAY = { value: 5, difference: 5, ratio: 8, log: 1e6 }
/** From here on what is positive everywhere begins at 0. */
const NEAR_ZERO = 0.45
/** A logarithmic axis, for what spans more than this; where values begin at 0, of which it shows nothing, for more. */
const DECADES = { positive: 12, fromZero: 100 }

/** A ratio is drawn so only where it spans more than this. */
const RATIOS = 30

export interface Wish {
  /** Values that must be seen. */
  readonly steady: readonly number[]
  /** A curve that stays within them is shown as a whole. */
  readonly bounds?: Extent
  /** Values whose logarithm may be drawn where it helps, ratios, differences, or others. */
  readonly kind: 'size' | 'ratio' | 'difference' | 'value'
}

type Sorted = readonly number[]
export type Extent = readonly [low: number, high: number]

export function spanOf(curves: readonly (readonly (number | null)[])[], wish: Wish): Range {
  const known = curves.map(ascending).filter(({ length }) => length > 0)
  if (known.length === 0) return linearRange(0, 1)
  const least = Math.min(...known.map(first))
  const seen = known.map((sorted) => bulk(sorted, wish.bounds))
  const main = capped(merged(seen, wish.steady), known, wish)
  return logarithmic(known, main, wish) ?? padded(main, least)
}

const byValue = (one: number, other: number) => one - other
const isKnown = (value: number | null): value is number => value !== null && Number.isFinite(value)
const ascending = (values: readonly (number | null)[]): Sorted => values.filter(isKnown).sort(byValue)
const first = (sorted: Sorted) => sorted[0] as number
const last = (sorted: Sorted) => sorted.at(-1) as number
const at = (sorted: Sorted, part: number) => sorted[Math.round(part * (sorted.length - 1))] as number

/** Of each curve by itself: one that is short has few values among those of all. */
function bulk(sorted: Sorted, bounds?: Extent): Extent {
  const [low, high] = [at(sorted, CUT.low), at(sorted, CUT.high)]
  const whole = [first(sorted), last(sorted)] as const
  if (bounds && whole[0] >= bounds[0] && whole[1] <= bounds[1]) return whole
  return whole[1] - whole[0] <= HARDLY * (high - low) ? whole : [low, high]
}

function merged(extents: readonly Extent[], steady: readonly number[]): Extent {
  return [Math.min(...extents.map(([low]) => low), ...steady), Math.max(...extents.map(([, high]) => high), ...steady)]
}

/** What must be seen says how large the others may be; of differences it does not. */
function capped([low, high]: Extent, curves: readonly Sorted[], { steady, kind }: Wish): Extent {
  const typical = kind === 'difference' ? curves.map((sorted) => at(ascending(sorted.map(Math.abs)), 0.5)) : []
  const largest = RUNAWAY[kind === 'size' ? 'value' : kind] * Math.max(0, ...steady.map(Math.abs), ...typical)
  return largest > 0 ? [Math.max(low, -largest), Math.min(high, largest)] : [low, high]
}

function logarithmic(curves: readonly Sorted[], [low]: Extent, { steady, kind }: Wish): Range | null {
  const least = Math.min(...curves.map(first))
  if (kind === 'ratio' && least > 0) return logRange(low, Math.max(...curves.map((sorted) => bulk(sorted)[1])), RATIOS)
  if (kind !== 'size' || least < 0) return null
  const most = Math.max(...curves.map(last))
  const to = Math.min(most, RUNAWAY.log * Math.max(0, ...steady) || most)
  if (least > 0) return logRange(least, to, DECADES.positive)
  return logRange(at(ascending(curves.flat()), CUT.low), to, DECADES.fromZero)
}

function logRange(from: number, to: number, enough: number): Range | null {
  return from > 0 && to > enough * from ? { scaling: 'log', from: from / 1.2, to: to * 1.2, linear: 1 } : null
}

function padded([low, high]: Extent, least: number): Range {
  const size = Math.max(Math.abs(low), Math.abs(high))
  const pad = high - low > LEVEL * size ? PAD * (high - low) : PAD * size || 1
  if (least >= 0 && low < NEAR_ZERO * high) return linearRange(0, high + pad)
  return linearRange(low - pad, high + pad)
}
