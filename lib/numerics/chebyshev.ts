/**
 * Chebyshev interpolation on [−1, 1] at the sixteen first-kind nodes, and its exact antiderivative.
 * Formulas: Trefethen, Approximation Theory and Approximation Practice, 2013, ch. 3 and 19; Clenshaw & Curtis 1960.
 */

export const NODE_COUNT = 16

/** x_k = cos(π(k + ½)/16), descending from just below 1, exactly mirrored about 0. */
export const NODES: Float64Array = Float64Array.from({ length: NODE_COUNT }, (_, k) =>
  k < NODE_COUNT / 2
    ? Math.cos((Math.PI * (k + 0.5)) / NODE_COUNT)
    : -Math.cos((Math.PI * (NODE_COUNT - k - 0.5)) / NODE_COUNT),
)

/** Coefficients of a series. Plain arrays are made and dropped faster than typed ones of this length. */
export type Series = ArrayLike<number>
const BLANK: readonly number[] = Array.from({ length: NODE_COUNT + 1 }, () => 0.5)

const HALF = NODE_COUNT / 2

/** Row j holds the weights that turn eight sums (even j) or differences (odd j) of mirrored samples into the coefficient of T_j. */
const TRANSFORM: Float64Array = Float64Array.from({ length: NODE_COUNT * HALF }, (_, index) => {
  const [j, k] = [Math.floor(index / HALF), index % HALF]
  const weight = (j === 0 ? 1 : 2) / NODE_COUNT
  return weight * Math.cos((Math.PI * j * (k + 0.5)) / NODE_COUNT)
})

/**
 * Coefficients of the interpolant through the samples at NODES, written into `out` (16 numbers). Written out, since the loop over
 * eight products takes twice as long.
 */
export function coefficientsInto(out: Float64Array, samples: Float64Array): void {
  for (let parity = 0; parity < 2; parity++) {
    const sign = parity === 0 ? 1 : -1
    const f0 = samples[0] + sign * samples[15]
    const f1 = samples[1] + sign * samples[14]
    const f2 = samples[2] + sign * samples[13]
    const f3 = samples[3] + sign * samples[12]
    const f4 = samples[4] + sign * samples[11]
    const f5 = samples[5] + sign * samples[10]
    const f6 = samples[6] + sign * samples[9]
    const f7 = samples[7] + sign * samples[8]
    for (let j = parity; j < NODE_COUNT; j += 2) {
      const at = j * HALF
      out[j] =
        TRANSFORM[at] * f0 +
        TRANSFORM[at + 1] * f1 +
        TRANSFORM[at + 2] * f2 +
        TRANSFORM[at + 3] * f3 +
        TRANSFORM[at + 4] * f4 +
        TRANSFORM[at + 5] * f5 +
        TRANSFORM[at + 6] * f6 +
        TRANSFORM[at + 7] * f7
    }
  }
}

/**
 * Coefficients (17) of scale · ∫_{−1}^{x} of the series, from b_j = (c_{j−1} − c_{j+1})/2j.
 * The value at x = −1 is zero by the choice of b_0.
 */
export function antiderivative(coefficients: Series, scale: number): number[] {
  const out = BLANK.slice()
  let constant = 0
  for (let j = 1; j <= NODE_COUNT; j++) {
    const before = j === 1 ? 2 * coefficients[0] : coefficients[j - 1]
    const after = j + 1 < NODE_COUNT ? coefficients[j + 1] : 0
    out[j] = (scale * (before - after)) / (2 * j)
    constant += j % 2 === 1 ? out[j] : -out[j]
  }
  out[0] = constant
  return out
}

/** Coefficients of the derivative, c_{j−1} = c_{j+1} + 2j b_j, written into `out`, which is as long as the series. */
export function derivativeInto(out: Float64Array, series: Series): void {
  const last = series.length - 1
  out[last] = 0
  for (let j = last; j > 0; j--) out[j - 1] = (j < last ? out[j + 1] : 0) + 2 * j * series[j]
  out[0] /= 2
}

/** Sum of the series at 1: the integral over the whole panel when the series is an antiderivative from −1. */
export function sumAtOne(coefficients: Series): number {
  let sum = 0
  for (let j = coefficients.length - 1; j >= 0; j--) sum += coefficients[j]
  return sum
}

/** Value of Σ c_j T_j(x) by Clenshaw's recurrence (Clenshaw 1955, MTAC 9, 118). */
export function evaluate(coefficients: Series, x: number): number {
  let [b1, b2] = [0, 0]
  for (let j = coefficients.length - 1; j > 0; j--) {
    const b = coefficients[j] + 2 * x * b1 - b2
    b2 = b1
    b1 = b
  }
  return coefficients[0] + x * b1 - b2
}

/**
 * Values of two series of one length at many places x = (s − from)·scale − 1, written from `first` up to `last`. Two places at a
 * time, since a processor works on independent recurrences side by side.
 */
export function evaluatePairs(
  outA: Float64Array,
  outB: Float64Array,
  a: Series,
  b: Series,
  s: Float64Array,
  from: number,
  scale: number,
  first: number,
  last: number,
): void {
  const [a0, b0] = [a[0], b[0]]
  for (let i = first; i < last; i += 2) {
    const j = i + 1 < last ? i + 1 : i
    const x = (s[i] - from) * scale - 1
    const y = (s[j] - from) * scale - 1
    const twoX = 2 * x
    const twoY = 2 * y
    let ax1 = 0
    let ax2 = 0
    let bx1 = 0
    let bx2 = 0
    let ay1 = 0
    let ay2 = 0
    let by1 = 0
    let by2 = 0
    for (let k = a.length - 1; k > 0; k--) {
      const ca = a[k]
      const cb = b[k]
      const ax = twoX * ax1 + (ca - ax2)
      const bx = twoX * bx1 + (cb - bx2)
      const ay = twoY * ay1 + (ca - ay2)
      const by = twoY * by1 + (cb - by2)
      ax2 = ax1
      ax1 = ax
      bx2 = bx1
      bx1 = bx
      ay2 = ay1
      ay1 = ay
      by2 = by1
      by1 = by
    }
    outA[i] = x * ax1 + (a0 - ax2)
    outB[i] = x * bx1 + (b0 - bx2)
    outA[j] = y * ay1 + (a0 - ay2)
    outB[j] = y * by1 + (b0 - by2)
  }
}

/**
 * x in [−1, 1] at which an increasing series has the value `target`; the nearer end where it has not.
 * Newton's steps with value and slope from one recurrence, kept inside a shrinking bracket; to the rounding of the series.
 */
export function solveIncreasing(coefficients: Series, target: number): number {
  let [low, high] = [-1, 1]
  const total = sumAtOne(coefficients)
  let x = Math.max(-1, Math.min(1, total > 0 ? (2 * target) / total - 1 : 0))
  for (let step = 0; step < 60; step++) {
    let [b1, b2, d1, d2] = [0, 0, 0, 0]
    for (let j = coefficients.length - 1; j > 0; j--) {
      const d = 2 * b1 + 2 * x * d1 - d2
      const b = coefficients[j] + 2 * x * b1 - b2
      ;[b2, b1, d2, d1] = [b1, b, d1, d]
    }
    const value = coefficients[0] + x * b1 - b2 - target
    if (value > 0) high = x
    else low = x
    const newton = x - value / (b1 + x * d1 - d2)
    const next = newton >= low && newton <= high ? newton : (low + high) / 2
    if (Math.abs(next - x) <= 2e-16) return next
    x = next
  }
  return x
}

/** Size of the last two coefficients relative to the largest: the series is resolved when this is near eps. */
export function relativeTail(coefficients: Series): number {
  let largest = 0
  for (let j = 0; j < NODE_COUNT; j++) {
    const size = Math.abs(coefficients[j])
    if (size > largest) largest = size
  }
  const last = Math.abs(coefficients[NODE_COUNT - 1]) + Math.abs(coefficients[NODE_COUNT - 2])
  return largest === 0 ? 0 : last / largest
}

/**
 * What a narrower trial no longer betters is noise: how much of it there is, with a margin; 0 while there is no sign of it, or where
 * it is above `most`. A series that is resolved should be 60 times better for two thirds of the width.
 */
export function noiseIn(before: number, now: number, most: number): number {
  const noise = now > 0.2 * before ? 4 * Math.max(before, now) : 0
  return noise < most ? noise : 0
}
