/** Twice the digits of a double, against decimals of 60 digits. */
import { Decimal } from 'decimal.js'
import { describe, expect, test } from 'vitest'
import {
  exponential,
  logarithm,
  minus,
  over,
  plus,
  TWOFOLD_EPSILON,
  type Twofold,
  times,
} from '../../lib/numerics/twofold'
import { chanceOf } from '../hunt/chance'
import { exactly } from '../hunt/laws'

const High = Decimal.clone({ precision: 60 })
const sum = ([high, low]: Twofold) => new High(exactly(high)).plus(exactly(low))
const chance = chanceOf(7)
const any = (size: number): Twofold => {
  const high = chance.between(-size, size)
  return [high, high * chance.between(-1, 1) * 2 ** -54]
}
const pairs = Array.from({ length: 200 }, () => [any(100), any(3)] as const)

describe('against decimals', () => {
  test('sums are right to the sizes of their terms', () => {
    for (const [a, b] of pairs) {
      for (const [mine, right] of [
        [plus(a, b), sum(a).plus(sum(b))],
        [minus(a, b), sum(a).minus(sum(b))],
      ] as const) {
        expect(sum(mine).minus(right).abs().toNumber()).toBeLessThanOrEqual(
          TWOFOLD_EPSILON * (Math.abs(a[0]) + Math.abs(b[0])),
        )
      }
    }
  })
  test('products and quotients', () => {
    for (const [a, b] of pairs) {
      expect(
        sum(times(a, b))
          .div(sum(a).times(sum(b)))
          .minus(1)
          .abs()
          .toNumber(),
      ).toBeLessThan(TWOFOLD_EPSILON)
      expect(
        sum(over(a, b))
          .div(sum(a).div(sum(b)))
          .minus(1)
          .abs()
          .toNumber(),
      ).toBeLessThan(TWOFOLD_EPSILON)
    }
  })
  test('exponentials and logarithms', () => {
    for (const [a] of pairs) {
      const power = exponential(a)
      const bound = TWOFOLD_EPSILON * (64 + Math.abs(a[0]))
      expect(sum(power).div(sum(a).exp()).minus(1).abs().toNumber()).toBeLessThan(bound)
      expect(sum(logarithm(power)).minus(sum(power).ln()).abs().toNumber()).toBeLessThan(bound)
    }
  })
  test('a product that doubles round is exact', () => {
    const [high, low] = times([1 + 2 ** -30, 0], [1 + 2 ** -30, 0])
    expect([high, low]).toEqual([1 + 2 ** -29, 2 ** -60])
  })
})
