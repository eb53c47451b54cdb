/** Bracketed roots of equations whose roots are closed forms. */
import { expect, test } from 'vitest'
import { brent, newton } from '../../lib/numerics/roots'

const EPS = Number.EPSILON

/** Name, f, bracket, root, tolerance. */
const CASES: readonly (readonly [string, (x: number) => number, number, number, number, number])[] = [
  ['x² = 2', (x) => x * x - 2, 0, 2, Math.SQRT2, 4 * EPS],
  ['falling', (x) => 2 - x * x, 0, 2, Math.SQRT2, 4 * EPS],
  ['bracket the other way round', (x) => x * x - 2, 2, 0, Math.SQRT2, 4 * EPS],
  ['cos x = x', (x) => Math.cos(x) - x, 0, 1, 0.7390851332151607, 4 * EPS],
  ['eˣ = 1e10', (x) => Math.exp(x) - 1e10, 0, 700, Math.log(1e10), 64 * EPS],
  ['a root at zero', (x) => Math.expm1(x), -3, 1, 0, 1e-300],
  ['a tiny root', (x) => x - 1e-200, -1, 1, 1e-200, 1e-210],
  ['a triple root, where f leaves the doubles', (x) => (x - 1) ** 3, -1, 4, 1, 1e-6],
  ['a cusp, infinitely steep', (x) => Math.cbrt(x - 0.3), -1, 2, 0.3, 4 * EPS],
  ['atan, flat far away', Math.atan, -3, 10, 0, 1e-15],
  ['a step', (x) => (x < 0.7 ? -1 : 1), 0, 1, 0.7, 4 * EPS],
  ['a root at the upper end', (x) => x * (x - 3), 1, 3, 3, 0],
  ['a root at the lower end', (x) => x * (x - 3), 3, 5, 3, 12 * EPS],
]

test.each(CASES)('%s', (_, f, from, to, root, tolerance) => {
  let calls = 0
  const counted = (x: number) => {
    calls++
    return f(x)
  }
  expect(Math.abs(brent(counted, from, to) - root)).toBeLessThanOrEqual(tolerance)
  expect(calls).toBeLessThan(200)
})

test('Brent is quick on smooth functions', () => {
  let calls = 0
  brent(
    (x) => {
      calls++
      return Math.exp(x) - 2
    },
    0,
    1,
  )
  // Superlinear: bisection would take 53.
  expect(calls).toBeLessThan(14)
})

test.each([
  ['x² = 2', (x: number) => (x * x - 2) / (2 * x), 1.4, Math.SQRT2],
  ['cos x = x', (x: number) => (x - Math.cos(x)) / (1 + Math.sin(x)), 0.7, 0.7390851332151607],
  ['x = 0', (x: number) => x, 0, 0],
])('Newton: %s', (_, step, start, root) => {
  const found = newton(step, start)
  expect(Math.abs((found ?? Number.NaN) - root)).toBeLessThanOrEqual(2 * EPS * root)
})

test.each([
  ['runs away from a root of x/(1 + x²)', (x: number) => (x * (1 + x * x)) / (1 - x * x), 2],
  ['is no number', () => Number.NaN, 1],
])('Newton gives none where it %s', (_, step, start) => expect(newton(step, start)).toBeNull())
