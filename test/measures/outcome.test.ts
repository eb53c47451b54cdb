import { expect, test } from 'vitest'
import { bounded, finiteOr, isMissing, missing } from '../../lib/measures/outcome'

test('a value carries some units in its last place beside other errors', () => {
  expect(bounded(2)).toEqual({ value: 2, error: 8 * Number.EPSILON })
  expect(bounded(-2, 1)).toEqual({ value: -2, error: 1 + 8 * Number.EPSILON })
  expect(bounded(1, 0, 1)).toEqual({ value: 1, error: Number.EPSILON })
})
test('infinite values turn into their reason', () => {
  expect(finiteOr(Number.POSITIVE_INFINITY, 0, 'why')).toEqual({ because: 'why' })
  expect(finiteOr(Number.NaN, 0, 'why')).toEqual({ because: 'why' })
  expect(finiteOr(0, 1, 'why')).toEqual({ value: 0, error: 1 })
})
test('what is missing is told from what is there', () => {
  expect(isMissing(missing('why'))).toBe(true)
  expect(isMissing(bounded(1))).toBe(false)
  expect(isMissing(1)).toBe(false)
})
