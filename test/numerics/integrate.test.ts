/** Adaptive integrals against closed forms; the error bound must hold, and be small where f is smooth. */
import { describe, expect, test } from 'vitest'
import { integrate } from '../../lib/numerics/integrate'

/** Name, f, interval, value, bound that may not be passed (relative). */
const CASES: readonly (readonly [string, (x: number) => number, number, number, number, number])[] = [
  ['a constant', () => 3, -1, 4, 15, 2e-15],
  ['zero', () => 0, 0, 1, 0, 0],
  ['eˣ', Math.exp, 0, 1, Math.E - 1, 1e-14],
  ['backwards', Math.exp, 1, 0, 1 - Math.E, 1e-14],
  ['nothing', Math.exp, 2, 2, 0, 0],
  ['a narrow bell', (x) => 1 / (1 + 1e6 * x * x), -1, 1, (2 * Math.atan(1e3)) / 1e3, 1e-13],
  ['fast waves', (x) => Math.sin(200 * x) ** 2, 0, Math.PI, Math.PI / 2, 1e-13],
  ['√x', Math.sqrt, 0, 1, 2 / 3, 1e-12],
  ['a kink', (x) => Math.abs(x - 1 / 3), 0, 1, 5 / 18, 1e-12],
  ['a step', (x) => (x < 1 / 3 ? 0 : 1), 0, 1, 2 / 3, 1e-8],
  // The last panel is 1e-9 wide and holds 6e-5 of the value.
  ['1/√x', (x) => 1 / Math.sqrt(x), 0, 1, 2, 1e-4],
]

describe.each(CASES)('%s', (_, f, from, to, value, allowed) => {
  const found = integrate(f, from, to)
  test('is within its bound', () => expect(Math.abs(found.value - value)).toBeLessThanOrEqual(found.error))
  test('and the bound is tight enough', () => expect(found.error).toBeLessThanOrEqual(allowed * Math.abs(value)))
})

describe('noise', () => {
  // A fixed hash of x: no halving resolves it.
  const noise = (x: number) => ((Math.sin(x * 1e9) * 43758.5453) % 1) - 0.5
  test.each([1e-13, 1e-8, 1])('of size %s ends after a bounded number of calls, and the bound tells', (size) => {
    let calls = 0
    const { value, error } = integrate(
      (x) => {
        calls++
        return 1 + size * noise(x)
      },
      0,
      1,
    )
    expect(calls).toBeLessThan(40000)
    expect(Math.abs(value - 1)).toBeLessThanOrEqual(size)
    expect(error).toBeGreaterThan(size / 1e3)
  })
})

test('what is not a number does not go on for ever', () => {
  expect(integrate(() => Number.NaN, 0, 1).value).toBeNaN()
})
