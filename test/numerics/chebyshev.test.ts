/** Chebyshev series against their definitions: T_j(cos θ) = cos jθ, its integrals, and binomials for powers of x. */
import { describe, expect, test } from 'vitest'
import {
  antiderivative,
  coefficientsInto,
  evaluate,
  NODE_COUNT,
  NODES,
  noiseIn,
  relativeTail,
  solveIncreasing,
  sumAtOne,
} from '../../lib/numerics/chebyshev'

const EPS = Number.EPSILON
const POINTS = [-1, -0.99, -0.5, -1e-3, 0, 1e-9, 0.3, 0.7, 0.999, 1]

function coefficientsOf(f: (x: number) => number): Float64Array {
  const out = new Float64Array(NODE_COUNT)
  coefficientsInto(out, NODES.map(f))
  return out
}
const unit = (j: number, length = NODE_COUNT) => Float64Array.from({ length }, (_, i) => (i === j ? 1 : 0))
const T = (j: number, x: number) => Math.cos(j * Math.acos(x))

test('nodes: roots of T_16, descending and mirrored', () => {
  for (let k = 0; k < NODE_COUNT; k++) {
    // dT_16/dx is 16/sin θ, and at most 164 at the outermost node: half an ulp of the node, and of its angle, shows that much.
    expect(Math.abs(T(NODE_COUNT, NODES[k]))).toBeLessThan(164 * EPS)
    expect(NODES[k] + NODES[NODE_COUNT - 1 - k]).toBeCloseTo(0, 15)
    if (k > 0) expect(NODES[k]).toBeLessThan(NODES[k - 1])
  }
})

describe.each(Array.from({ length: NODE_COUNT }, (_, j) => j))('T_%s', (j) => {
  test('has one coefficient', () => {
    const found = coefficientsOf((x) => T(j, x))
    // Sixteen terms of size one, and the samples' own rounding j eps.
    found.forEach((c, i) => {
      expect(Math.abs(c - (i === j ? 1 : 0))).toBeLessThan((4 + j) * EPS)
    })
  })
  test('is evaluated as cos jθ', () => {
    for (const x of POINTS) expect(Math.abs(evaluate(unit(j), x) - T(j, x))).toBeLessThan((2 + j * j) * EPS)
  })
  test('has the integral ½[T_(j+1)/(j+1) − T_(j−1)/(j−1)] from −1', () => {
    const closed = (x: number): number => {
      if (j === 0) return x
      if (j === 1) return (x * x) / 2
      return (T(j + 1, x) / (j + 1) - T(j - 1, x) / (j - 1)) / 2
    }
    const series = antiderivative(unit(j), 3)
    expect(series).toHaveLength(NODE_COUNT + 1)
    for (const x of POINTS)
      expect(Math.abs(evaluate(series, x) - 3 * (closed(x) - closed(-1)))).toBeLessThan((8 + 3 * j) * EPS)
    expect(Math.abs(evaluate(series, -1))).toBeLessThan(4 * EPS)
    expect(Math.abs(sumAtOne(series) - (j % 2 === 1 ? 0 : 6 / (1 - j * j)))).toBeLessThan(8 * EPS)
  })
})

test('x^15 has the binomials of (cos θ)^15', () => {
  const found = coefficientsOf((x) => x ** 15)
  let binomial = 1
  const expected = new Float64Array(NODE_COUNT)
  for (let k = 0; k < 8; k++) {
    expected[15 - 2 * k] = binomial / 2 ** 14
    binomial *= (15 - k) / (k + 1)
  }
  found.forEach((c, i) => {
    expect(Math.abs(c - expected[i])).toBeLessThan(2 * EPS)
  })
})

test('x^16 is one too many: it aliases by 2^−15, as theory says', () => {
  // The interpolant of T_16 at its own roots is zero, and x^16 = 2^−15 T_16 + lower.
  const series = coefficientsOf((x) => x ** 16)
  expect(Math.abs(evaluate(series, 1) - (1 - 2 ** -15))).toBeLessThan(8 * EPS)
})

test('the tail is that of the last two coefficients, over the largest', () => {
  expect(relativeTail(new Float64Array(NODE_COUNT))).toBe(0)
  expect(relativeTail(unit(3))).toBe(0)
  expect(relativeTail(Float64Array.from({ length: NODE_COUNT }, (_, j) => 2 ** -j))).toBe(2 ** -15 + 2 ** -14)
  expect(relativeTail(Float64Array.from({ length: NODE_COUNT }, (_, j) => (j === 15 ? -8 : 1)))).toBe(9 / 8)
  // An entire function is resolved, a kink is not.
  expect(relativeTail(coefficientsOf(Math.exp))).toBeLessThan(1e-14)
  expect(relativeTail(coefficientsOf(Math.abs))).toBeGreaterThan(1e-3)
})

test('what half the width does not better is noise, unless it is more than may be', () => {
  const noisy = (half: number) =>
    relativeTail(coefficientsOf((x) => Math.exp(half * x) * (1 + 1e-12 * Math.sin(1e9 * x))))
  const [wide, narrow] = [noisy(0.5), noisy(0.25)]
  expect(noiseIn(wide, narrow, 1e-8)).toBe(4 * Math.max(wide, narrow))
  expect(noiseIn(wide, narrow, 1e-13)).toBe(0)
  const smooth = (half: number) => relativeTail(coefficientsOf((x) => 1 / (1.2 + half * x)))
  expect(noiseIn(smooth(1), smooth(0.5), 1)).toBe(0)
  expect(noiseIn(Number.POSITIVE_INFINITY, narrow, 1e-8)).toBe(0)
})

describe('inverting an increasing series', () => {
  // ∫ eˣ from −1: its inverse is ln(value + 1/e).
  const series = antiderivative(coefficientsOf(Math.exp), 1)
  test.each([0, 1e-12, 1e-6, 0.1, 0.5, 1, 2, Math.E - 1 / Math.E])('value %s', (value) => {
    // Value good to 4 eps, slope at least 1/e.
    expect(Math.abs(solveIncreasing(series, value) - Math.log(value + 1 / Math.E))).toBeLessThan(16 * EPS * Math.E)
  })
  test('beyond its range, the nearer end', () => {
    expect(solveIncreasing(series, -0.1)).toBeCloseTo(-1, 15)
    expect(solveIncreasing(series, 3)).toBeCloseTo(1, 15)
  })
  test('steep at one end: the cube (x + 1)³, flat to third order at −1', () => {
    const cube = coefficientsOf((x) => (x + 1) ** 3)
    for (const x of [-0.9, -0.5, 0, 0.9]) {
      // Rounding 16 eps of the series over the slope 3 (x + 1)².
      expect(Math.abs(solveIncreasing(cube, (x + 1) ** 3) - x)).toBeLessThan((16 * EPS) / (3 * (x + 1) ** 2) + 4 * EPS)
    }
  })
  test('a series that is zero throughout: some x inside', () => {
    const x = solveIncreasing(new Float64Array(NODE_COUNT), 0)
    expect(Math.abs(x)).toBeLessThanOrEqual(1)
  })
})
