import { expect, test } from 'vitest'
import { decimalsCancel, exactSum } from '../../lib/scenario/exact-sum'

test.each([
  [[], 0, 0],
  [[1], 1, 0],
  // powers of two: exact by hand
  [[1, 2 ** -60], 1, 2 ** -60],
  [[2 ** 60, 1, -(2 ** 60)], 1, 0],
  [[1, 2 ** -53, 2 ** -100], 1 + 2 ** -52, -(2 ** -53) + 2 ** -100],
  [[1e308, 1, -1e308, -1], 0, 0],
  [[1, 2 ** -100, -1], 2 ** -100, 0],
  [[1e16, 1, 1e-16], 1e16 + 0, 1 + 1e-16],
])('the sum of %j', (terms, high, low) => {
  expect(exactSum(terms)).toEqual({ high, low })
})

test.each([
  [[1, -0.1, -0.9], true],
  [[1, -0.3, -0.7], true],
  [[1, -0.3, -0.7, 1e-300], false],
  [[0.1, 0.2, -0.3], true],
  [[1e21, -1e21], true],
  [[1e21, -1e21, 5e-324], false],
  [[0, -0], true],
  [[1.5, -1.25, -0.25], true],
  [[1, -0.3, -0.7000000000000001], false],
])('decimals of %j', (terms, cancels) => {
  expect(decimalsCancel(terms)).toBe(cancels)
})
