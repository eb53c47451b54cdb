/** ∫ f over a finite interval, adaptive, with an error bound. */
import { coefficientsInto, NODE_COUNT, NODES, relativeTail } from './chebyshev'

const samples = new Float64Array(NODE_COUNT)
const coefficients = new Float64Array(NODE_COUNT)

export interface Integral {
  readonly value: number
  readonly error: number
}

/**
 * Panels of sixteen Chebyshev nodes, halved until resolved to 1e-14 of the panel (Clenshaw & Curtis 1960, with first-kind nodes).
 * For piecewise smooth f, also with a power at an end; panels stop halving at 1e-9 of the interval, and the bound says so.
 */
export function integrate(f: (x: number) => number, from: number, to: number, depth = 0): Integral {
  const [centre, half] = [(from + to) / 2, (to - from) / 2]
  for (let k = 0; k < NODE_COUNT; k++) samples[k] = f(centre + half * NODES[k])
  coefficientsInto(coefficients, samples)
  if (relativeTail(coefficients) > 1e-14 && depth < 30) {
    const [left, right] = [integrate(f, from, centre, depth + 1), integrate(f, centre, to, depth + 1)]
    return { value: left.value + right.value, error: left.error + right.error }
  }
  const left = Math.abs(coefficients[NODE_COUNT - 1]) + Math.abs(coefficients[NODE_COUNT - 2])
  // ∫ T_j over [−1, 1] is 2/(1 − j²) for even j and zero for odd j.
  let value = 0
  for (let j = 0; j < NODE_COUNT; j += 2) value += (2 * coefficients[j]) / (1 - j * j)
  return { value: half * value, error: Math.abs(half) * left + 4 * Number.EPSILON * Math.abs(half * value) }
}
