/** The eight-point rule against its theory (Abramowitz & Stegun 1964, 25.4.29 and 25.4.30). */
import { expect, test } from 'vitest'
import { gaussLegendre } from '../../lib/numerics/gauss-legendre'

const EPS = Number.EPSILON

test.each(Array.from({ length: 16 }, (_, n) => n))('x^%s is exact', (n) => {
  for (const [from, to] of [
    [-1, 1],
    [0, 1],
    [-0.3, 0.7],
    [1, 0],
  ]) {
    const exact = (to ** (n + 1) - from ** (n + 1)) / (n + 1)
    // Sixteen-digit nodes: n eps/2 in x^n.
    expect(Math.abs(gaussLegendre((x) => x ** n, from, to) - exact)).toBeLessThan((4 + n) * EPS)
  }
})

test('x^16 misses by (b − a)^17 (8!)^4/(17 (16!)^2)', () => {
  const factorial = (n: number): number => (n === 0 ? 1 : n * factorial(n - 1))
  // The rule's error (b − a)^17 (8!)^4/(17 (16!)^3) times the sixteenth derivative, 16!.
  const missing = (2 ** 17 * factorial(8) ** 4) / (17 * factorial(16) ** 2)
  const found = 2 / 17 - gaussLegendre((x) => x ** 16, -1, 1)
  expect(Math.abs(found - missing)).toBeLessThan(8 * EPS)
  expect(missing).toBeGreaterThan(1e-6)
})

test('an empty interval', () => expect(gaussLegendre(Math.exp, 2, 2)).toBe(0))
