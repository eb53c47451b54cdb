/** How far the vertical axis goes, from the values that are to be seen. */
import { linearRange, type Range } from './scale'

// All numbers here are tuned by eye.
/** Values that run away at an edge are cut: what lies beyond these parts of all values. */
const CUT = { low: 0.03, high: 0.95 }
/** But not where the whole is hardly larger than the rest. */
const HARDLY = 1.7
const PAD = 0.06
/** What varies by less in parts of itself does not vary. */
const LEVEL = 1e-12
/** What must be seen fills at least one part in so many. */
const RUNAWAY = 8
/** From here on what is positive everywhere begins at 0. */
const NEAR_ZERO = 0.45
/** A logarithmic axis, for what spans more than this. */
const DECADES = 12

/** `steady`: values that must be seen. `logarithmic`: a logarithm may be used where it helps. */
export function spanOf(values: readonly (number | null)[], steady: readonly number[], logarithmic: boolean): Range {
  const known = values.filter((value) => value !== null && Number.isFinite(value)) as number[]
  const sorted = known.sort((one, other) => one - other)
  const [least, most] = [sorted[0], sorted.at(-1)]
  if (least === undefined || most === undefined) return linearRange(0, 1)
  if (logarithmic && least > 0 && most > DECADES * least) {
    return { scaling: 'log', from: least / 1.2, to: most * 1.2, linear: 1 }
  }
  return padded(bulk(sorted, steady), least)
}

function bulk(sorted: readonly number[], steady: readonly number[]): readonly [number, number] {
  const at = (part: number) => sorted[Math.round(part * (sorted.length - 1))] as number
  const [low, high] = [Math.min(at(CUT.low), ...steady), Math.max(at(CUT.high), ...steady)]
  const [least, most] = [Math.min(at(0), ...steady), Math.max(at(1), ...steady)]
  const [bottom, top] =
    most - least <= HARDLY * (high - low) ? [least, most] : [Math.max(least, low), Math.min(most, high)]
  const largest = RUNAWAY * Math.max(...steady.map(Math.abs))
  return largest > 0 ? [Math.max(bottom, -largest), Math.min(top, largest)] : [bottom, top]
}

function padded([low, high]: readonly [number, number], least: number): Range {
  const size = Math.max(Math.abs(low), Math.abs(high))
  const pad = high - low > LEVEL * size ? PAD * (high - low) : PAD * size || 1
  if (least >= 0 && low < NEAR_ZERO * high) return linearRange(0, high + pad)
  return linearRange(low - pad, high + pad)
}
