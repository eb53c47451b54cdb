/** The hunt for missed turning points at a modest size; `npm run hunt` is the large one. A failure names its seed and its code. */
import { describe, expect, test } from 'vitest'
import { hunt } from './hunt'

const { SEED } = process.env
/** Each run draws the same scenarios, or others on request. */
const first = SEED === undefined ? 1 : SEED === 'random' ? Math.floor(Math.random() * 2 ** 30) : Number(SEED)

describe('no turning point is missed, and none invented', () => {
  test('in random scenarios, against E² at a hundred thousand places', { timeout: 60_000 }, () => {
    const { scenarios, misses, unproven } = hunt(100, 0, first)
    expect(misses).toEqual([])
    expect(scenarios).toBe(100)
    // What the digits of doubles leave open has measure next to nothing.
    expect(unproven).toBeLessThanOrEqual(2)
  })
  test('in scenarios that graze, against decimals of 45 digits', { timeout: 60_000 }, () => {
    const { scenarios, misses, unproven } = hunt(0, 15, first)
    expect(misses).toEqual([])
    expect(scenarios).toBeGreaterThan(50)
    // 1e-16 from a double root is still decided, since its terms are known to twice the digits.
    expect(unproven).toBe(0)
  })
})
