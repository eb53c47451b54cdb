/** ψ(x) = eˣ − 1 − x against its series in exact integers. */
import { expect, test } from 'vitest'
import { expm2 } from '../../lib/numerics/exponential'

/** Σ xᵏ/k! from k = 2 in fixed point with 300 bits, for |x| ≤ 40 that is a multiple of 2^−60. */
function exact(x: number): number {
  const ONE = 1n << 300n
  const argument = BigInt(x * 2 ** 60) << 240n
  let [term, sum] = [(argument * argument) / ONE / 2n, 0n]
  for (let k = 3n; term !== 0n && k < 400n; k++) {
    sum += term
    term = (term * argument) / ONE / k
  }
  return Number(sum) / 2 ** 300
}

test.each(
  [2 ** -60, -(2 ** -50), 2 ** -30, -(2 ** -20), 0.001, 0.1, 0.25, 0.5, 0.50001, 0.75, 1, 3, 20, 40].flatMap((x) => {
    const dyadic = Math.round(x * 2 ** 60) / 2 ** 60
    return [dyadic, -dyadic]
  }),
)('ψ(%s)', (x) => {
  // At 0.5 the difference form cancels three bits of expm1; the series adds one rounding per term.
  expect(Math.abs(expm2(x) - exact(x)) / exact(x)).toBeLessThan(8 * Number.EPSILON)
})

test('zero, and both far ends', () => {
  expect(expm2(0)).toBe(0)
  expect(expm2(-800)).toBe(799)
  expect(expm2(800)).toBe(Number.POSITIVE_INFINITY)
})
