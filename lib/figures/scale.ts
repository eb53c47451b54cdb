/** How values of a quantity lie along an axis. Known to the page too, for its cursor. */

export type Scaling = 'linear' | 'log' | 'signed-log'

export interface Range {
  readonly scaling: Scaling
  readonly from: number
  readonly to: number
  /** For the signed logarithm sign(x) ln(1 + |x|/linear): up to about here it is as good as linear. */
  readonly linear: number
}

export const linearRange = (from: number, to: number): Range => ({ scaling: 'linear', from, to, linear: 1 })

/** The part of the axis below a value: 0 at `from`, 1 at `to`. */
export function fractionOf(range: Range, value: number): number {
  const [low, high] = [bent(range, range.from), bent(range, range.to)]
  return (bent(range, value) - low) / (high - low)
}

/** The value at a part of the axis. */
export function valueAt(range: Range, fraction: number): number {
  if (fraction === 0) return range.from
  if (fraction === 1) return range.to
  const [low, high] = [bent(range, range.from), bent(range, range.to)]
  return unbent(range, low + fraction * (high - low))
}

function bent({ scaling, linear }: Range, value: number): number {
  if (scaling === 'linear') return value
  return scaling === 'log' ? Math.log(value) : Math.sign(value) * Math.log1p(Math.abs(value) / linear)
}

function unbent({ scaling, linear }: Range, value: number): number {
  if (scaling === 'linear') return value
  return scaling === 'log' ? Math.exp(value) : Math.sign(value) * linear * Math.expm1(Math.abs(value))
}

/** The next of 1, 2 and 5 times a power of ten. */
export function roundStep(least: number): number {
  const power = 10 ** Math.floor(Math.log10(least))
  return power * ([1, 2, 5].find((one) => one * power >= least) ?? 10)
}

/** Parts of an axis that nobody can tell apart. */
const FINEST = 1e-5

/** A value with the digits that can be seen along an axis, which far from 0 are more than the first few. */
export function fine({ scaling, from, to }: Range, value: number): number {
  const least = scaling === 'linear' ? FINEST * (to - from) : FINEST * Math.abs(value)
  const decimals = Math.ceil(-Math.log10(least))
  return decimals >= 0 && decimals <= 100 ? Number(value.toFixed(decimals)) : Number(value.toPrecision(6))
}
