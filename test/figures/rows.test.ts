import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { rowsOf } from '../../lib/figures/rows'

const STEP = 4
const HEIGHT = 16

/** Every way to place two rows, tried out. */
function leastOfTwo(costs: readonly ((y: number) => number)[], bottom: number): number {
  let least = Number.POSITIVE_INFINITY
  for (let one = 0; one + HEIGHT <= bottom; one += STEP)
    for (let other = one + HEIGHT; other + HEIGHT <= bottom; other += STEP)
      least = Math.min(least, (costs[0]?.(one) ?? 0) + (costs[1]?.(other) ?? 0))
  return least
}

describe('names one below the other', () => {
  it('keep their order, do not overlap and stay within', () => {
    const wished = fc.array(fc.double({ min: -50, max: 250, noNaN: true }), { minLength: 1, maxLength: 6 })
    fc.assert(
      fc.property(wished, (wishes) => {
        const rows = wishes.map((wish) => ({ height: HEIGHT, cost: (y: number) => Math.abs(y - wish) }))
        const edges = rowsOf(rows, 0, 200)
        edges.forEach((edge, i) => {
          expect(edge).toBeGreaterThanOrEqual(i === 0 ? 0 : (edges[i - 1] ?? 0) + HEIGHT)
          expect(edge + HEIGHT).toBeLessThanOrEqual(200)
        })
      }),
    )
  })

  it('stand where that costs least', () => {
    fc.assert(
      fc.property(fc.array(fc.nat(100), { minLength: 50, maxLength: 50 }), (prices) => {
        const costs = [0, 25].map((from) => (y: number) => prices[from + Math.round(y / STEP)] ?? 0)
        const rows = costs.map((cost) => ({ height: HEIGHT, cost }))
        const [one = 0, other = 0] = rowsOf(rows, 0, 100)
        expect((costs[0]?.(one) ?? 0) + (costs[1]?.(other) ?? 0)).toBe(leastOfTwo(costs, 100))
      }),
    )
  })

  it('have places even where there is no room for all', () => {
    const rows = [0, 0, 0].map(() => ({ height: HEIGHT, cost: () => 1 }))
    for (const edge of rowsOf(rows, 10, 30)) expect(edge).toBe(10)
  })
})
