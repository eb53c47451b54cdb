/** u′ = α v, v′ = β u against closed forms; tolerances are some ten eps, the claim of the solver. */
import { expect, test } from 'vitest'
import { evaluate, NODE_COUNT, NODES } from '../../lib/numerics/chebyshev'
import { type Pair, solvePair } from '../../lib/numerics/linear-pair'

const sampled = (f: (x: number) => number) => Float64Array.from(NODES, f)
const constant = (value: number) => new Float64Array(NODE_COUNT).fill(value)
const SOME_EPS = 20 * Number.EPSILON

function sure(pair: Pair | null): Pair {
  if (pair === null) throw new Error('it does not settle')
  return pair
}

test.each([0.1, 0.5, 0.9])('constant slopes give cosh and sinh: half width %s', (half) => {
  const { u, v, left } = sure(solvePair(constant(1), constant(1), half, 1, 0))
  for (const x of [-1, -0.3, 0.2, 1]) {
    const t = half * (x + 1)
    expect(Math.abs(evaluate(u, x) - Math.cosh(t))).toBeLessThan(SOME_EPS * Math.cosh(2 * half))
    expect(Math.abs(evaluate(v, x) - Math.sinh(t))).toBeLessThan(SOME_EPS * Math.sinh(2 * half))
  }
  expect(left).toBeLessThan(1e-14)
})

test('slopes that vary: u = e^(t²/2), v = e^(t²/2) with α = β = t', () => {
  // t from 0 to 1 on the panel.
  const slope = sampled((x) => (x + 1) / 2)
  const { u, v } = sure(solvePair(slope, slope, 0.5, 1, 1))
  for (const x of [-1, 0, 0.5, 1]) {
    const exact = Math.exp(((x + 1) / 2) ** 2 / 2)
    expect(Math.abs(evaluate(u, x) - exact)).toBeLessThan(SOME_EPS * exact)
    expect(Math.abs(evaluate(v, x) - exact)).toBeLessThan(SOME_EPS * exact)
  }
})

test('sizes that differ by 1e150 keep their digits', () => {
  const { u, v } = sure(solvePair(constant(1e-150), constant(1e150), 0.5, 1, 1e150))
  expect(Math.abs(evaluate(u, 1) / Math.E - 1)).toBeLessThan(SOME_EPS)
  expect(Math.abs(evaluate(v, 1) / (Math.E * 1e150) - 1)).toBeLessThan(SOME_EPS)
})

test('a panel too wide for its slopes leaves something, says so, and in the end does not settle', () => {
  const leftAt = (half: number) => solvePair(constant(1), constant(1), half, 1, 1)?.left ?? Number.NaN
  // The last Chebyshev coefficient of e^(half x) is about (half/2)^15/15!.
  expect(leftAt(3)).toBeGreaterThan(1e-12)
  expect(leftAt(0.9)).toBeLessThan(1e-15)
  expect(solvePair(constant(1), constant(1), 40, 1, 1)).toBe(null)
})

test('beyond the doubles there is no pair', () => {
  expect(solvePair(constant(Number.POSITIVE_INFINITY), constant(1), 1, 1, 1)).toBe(null)
  expect(solvePair(constant(Number.NaN), constant(1), 1, 1, 1)).toBe(null)
})

test('no slope, no change', () => {
  const { u, v, left } = sure(solvePair(constant(0), constant(0), 100, 3, 0))
  expect([evaluate(u, 1), evaluate(v, 1), left]).toEqual([3, 0, 0])
})
