/**
 * u′ = α v, v′ = β u on one Chebyshev panel, by Picard's iteration with spectral integration
 * (Clenshaw & Norton 1963, Comput. J. 6, 88; Trefethen, Approximation Theory and Approximation Practice, 2013, ch. 19).
 */
import { antiderivative, coefficientsInto, evaluate, NODE_COUNT, NODES, type Series, sumAtOne } from './chebyshev'

/** Row k: weights of the samples in ∫ from −1 to NODES[k]. */
const INTEGRATION: Float64Array = integrationMatrix()
/** Each step wins a factor of about (step)²/(width²): a panel that needs more is too wide. */
const MOST_STEPS = 30
/** The next change would be below a fiftieth of this. */
const CONVERGED = 1e-14

export interface Pair {
  /** Chebyshev series on the panel. */
  readonly u: Series
  readonly v: Series
  /** Size of the last two coefficients of both slopes, times the half width, over the value at the end. */
  readonly left: number
}

const [u, v, rateU, rateV] = Array.from({ length: 4 }, () => new Float64Array(NODE_COUNT))
const coefficients = new Float64Array(NODE_COUNT)

/**
 * The pair that starts from (u0, v0) at −1, with α and β sampled at NODES by a variable of which the panel covers 2·half;
 * null where the iteration does not settle or leaves the doubles. For α, β, u0, v0 ≥ 0, where nothing is ever subtracted:
 * u and v then keep a relative accuracy of some ten eps, however different they are in size.
 */
export function solvePair(alpha: Float64Array, beta: Float64Array, half: number, u0: number, v0: number): Pair | null {
  v.fill(v0)
  let settled = false
  for (let step = 0; step < MOST_STEPS && !settled; step++) {
    multiply(rateU, alpha, v)
    accumulate(u, u0, half, rateU)
    multiply(rateV, beta, u)
    settled = accumulate(v, v0, half, rateV) <= CONVERGED
  }
  if (!settled) return null
  multiply(rateU, alpha, v)
  const first = seriesOf(rateU, half, u0)
  const second = seriesOf(rateV, half, v0)
  return { u: first.series, v: second.series, left: Math.max(first.left, second.left) }
}

function multiply(out: Float64Array, one: Float64Array, other: Float64Array): void {
  for (let k = 0; k < NODE_COUNT; k++) out[k] = one[k] * other[k]
}

/** out = start + half · ∫ rate; returns the largest change over the largest value. */
function accumulate(out: Float64Array, start: number, half: number, rate: Float64Array): number {
  let change = 0
  let largest = 0
  for (let k = 0, at = 0; k < NODE_COUNT; k++) {
    // Four sums that a processor works on side by side.
    let s0 = 0
    let s1 = 0
    let s2 = 0
    let s3 = 0
    for (let j = 0; j < NODE_COUNT; j += 4, at += 4) {
      s0 += INTEGRATION[at] * rate[j]
      s1 += INTEGRATION[at + 1] * rate[j + 1]
      s2 += INTEGRATION[at + 2] * rate[j + 2]
      s3 += INTEGRATION[at + 3] * rate[j + 3]
    }
    const next = start + half * (s0 + s1 + (s2 + s3))
    const moved = Math.abs(next - out[k])
    if (!(moved <= change)) change = moved
    if (next > largest) largest = next
    out[k] = next
  }
  return change === 0 ? 0 : change / largest
}

function seriesOf(rate: Float64Array, half: number, start: number): { series: number[]; left: number } {
  coefficientsInto(coefficients, rate)
  const series = antiderivative(coefficients, half)
  series[0] += start
  const last = Math.abs(coefficients[NODE_COUNT - 1]) + Math.abs(coefficients[NODE_COUNT - 2])
  return { series, left: last === 0 ? 0 : (half * last) / sumAtOne(series) }
}

function integrationMatrix(): Float64Array {
  const out = new Float64Array(NODE_COUNT * NODE_COUNT)
  for (let j = 0; j < NODE_COUNT; j++) {
    const unit = new Float64Array(NODE_COUNT)
    unit[j] = 1
    const series = new Float64Array(NODE_COUNT)
    coefficientsInto(series, unit)
    const integral = antiderivative(series, 1)
    for (let k = 0; k < NODE_COUNT; k++) out[k * NODE_COUNT + j] = evaluate(integral, NODES[k])
  }
  return out
}
