/** Integrals over all that is left, of functions given by their logarithm: for what lies beyond the range of scale factors. */
import { coefficientsInto, NODE_COUNT, NODES, noiseIn, relativeTail, type Series } from '../numerics/chebyshev'
import { overBudget } from './field/unsolvable'

const samples = new Float64Array(NODE_COUNT)
const coefficients = new Float64Array(NODE_COUNT)
const MOST_PANELS = 4000
/** Terms of a logarithm that cancel leave so much noise in its exponential at most. */
const NOISIEST = 1e-8

/** ∫ e^(log) from x to `to`, or until nothing more is added, to 1e-14 or the noise of e^(log); Infinity where the sum leaves the doubles. */
export function integralOfExp(log: (x: number) => number, from: number, to = Number.POSITIVE_INFINITY): number {
  let [x, width, sum] = [from, 1, 0]
  let [noise, before] = [0, Number.POSITIVE_INFINITY]
  for (let tried = 0; x < to; tried++) {
    if (tried === MOST_PANELS) throw overBudget(`What is left takes more than ${MOST_PANELS} panels.`)
    const half = Math.min(width, to - x) / 2
    let largest = 0
    for (let k = 0; k < NODE_COUNT; k++) {
      const exponent = log(x + half * (1 + NODES[k]))
      samples[k] = Math.exp(exponent)
      largest = Math.max(largest, Math.abs(exponent))
    }
    coefficientsInto(coefficients, samples)
    const tail = relativeTail(coefficients)
    noise = Math.max(noise, noiseIn(before, tail, NOISIEST))
    // Rounding of the exponent shows in the last coefficients.
    if (tail > Math.max(noise, 1e-14 + 8 * Number.EPSILON * largest) && half > 1e-9) {
      width = half
      before = tail
      continue
    }
    before = Number.POSITIVE_INFINITY
    const added = half * mean(coefficients)
    sum += added
    if (!Number.isFinite(sum)) return Number.POSITIVE_INFINITY
    // The first node is the farthest.
    if (added < 1e-18 * sum && samples[0] <= samples[NODE_COUNT - 1]) return sum
    x += 2 * half
    width = 3.4 * half
  }
  return sum
}

/** ∫ over [−1, 1] of a Chebyshev series. */
function mean(series: Series): number {
  let value = 0
  for (let j = 0; j < NODE_COUNT; j += 2) value += (2 * series[j]) / (1 - j * j)
  return value
}
