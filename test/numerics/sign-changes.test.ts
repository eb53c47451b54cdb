import fc from 'fast-check'
import { expect, test } from 'vitest'
import { coefficientsInto, NODE_COUNT, NODES } from '../../lib/numerics/chebyshev'
import { signChanges } from '../../lib/numerics/sign-changes'

/** The polynomial with these zeros, which sixteen nodes hold exactly. */
function seriesOf(zeros: readonly number[]): Float64Array {
  const out = new Float64Array(NODE_COUNT)
  coefficientsInto(
    out,
    NODES.map((x) => zeros.reduce((product, zero) => product * (x - zero), 1)),
  )
  return out
}

const NOISE = 1e-14
const holds = (zeros: readonly number[]) => {
  const found = signChanges(seriesOf(zeros), NOISE)
  expect(found.length).toBe(zeros.length)
  zeros
    .toSorted((one, other) => one - other)
    .forEach((zero, i) => {
      expect(found[i].from).toBeLessThanOrEqual(zero)
      expect(found[i].to).toBeGreaterThanOrEqual(zero)
    })
}

test('none', () => expect(signChanges(seriesOf([2, -3]), NOISE)).toEqual([]))

test.each([1e-1, 1e-2, 1e-3, 1e-4, 1e-5])('a pair %s apart between any two looks', (gap) => {
  for (const at of [-0.9, -0.123, 0.4567, 0.81]) holds([at, at + gap])
})

test('a double zero is none or a pair within noise, and costs no time', () => {
  for (const { from, to } of signChanges(seriesOf([0.3, 0.3]), NOISE)) expect(Math.abs(from - to)).toBeLessThan(1e-5)
  expect(signChanges(new Float64Array(NODE_COUNT), NOISE)).toEqual([])
})

test('every zero of a polynomial with well separated ones', () => {
  const separated = fc
    .uniqueArray(fc.integer({ min: -99, max: 99 }), { maxLength: 6 })
    .map((list) => list.map((one) => one / 100 + 0.00123))
  fc.assert(fc.property(separated, holds))
})

test('a series that is not finite decides nothing', () => {
  const series = new Float64Array(NODE_COUNT).fill(Number.NaN)
  expect(signChanges(series, NOISE)).toEqual([{ from: -1, to: 1 }])
})
