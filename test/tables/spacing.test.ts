import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { COLUMN_KEYS } from '../../lib/quantities/column'
import { SPACINGS, valuesInto } from '../../lib/tables/spacing'

test('logscale is the default', () => expect(SPACINGS[0].key).toBe('logscale'))

describe.each(SPACINGS.map((one) => [one.key, one] as const))('%s', (_, spacing) => {
  const end = fc.double({ min: Math.max(spacing.above, -1e308), minExcluded: true, max: 1e308, noNaN: true })
  test('says what it means, with a column that repeats it', () => {
    expect(spacing.meaning).toMatch(/^Equal steps in .*\.$/)
    expect(COLUMN_KEYS).toContain(spacing.column)
  })
  test('ends are exact, and everything lies between them', () => {
    fc.assert(
      fc.property(end, end, fc.integer({ min: 2, max: 1e6 }), fc.nat(), (from, to, rows, some) => {
        const one = new Float64Array(1)
        const at = (i: number) => {
          valuesInto(one, spacing, { from, to }, rows, i, 1)
          return one[0]
        }
        expect(at(0)).toBe(from)
        expect(at(rows - 1)).toBe(to)
        // A value may pass an end by rounding alone: of its logarithm, at most 745, for ratios.
        const slack = spacing.even === 'ratios' ? 1 + 4 * 745 * Number.EPSILON : 1 + 4 * Number.EPSILON
        // Below the normal doubles rounding is of a size of its own.
        const most = (slack - 1) * Math.max(Math.abs(from), Math.abs(to)) + 2 * Number.MIN_VALUE
        const between = at(some % rows)
        expect(between).toBeLessThanOrEqual(Math.max(from, to) + most)
        expect(between).toBeGreaterThanOrEqual(Math.min(from, to) - most)
      }),
    )
  })
})
