/** What laws refuse, and what is known of a scalar field without its history. */
import { expect, it } from 'vitest'
import { familyOf } from '../../lib/dark-energy/index'
import { listOf, numberOf } from '../../lib/dark-energy/law'

// With ρ = K + V and p = K − V, n = 3(1 + w) = 6K/(K + V): from 0 to 6 while V ≥ 0, without bound where V < 0, and 0 at rest.
it.each([
  ['cosine', { v: 'cosine', width: 1, start: 0.5 }, [0, 6]],
  ['inverse', { v: 'inverse', slope: 1, start: 1 }, [0, 6]],
  ['linear', { v: 'linear', slope: 1 }, [0, Number.POSITIVE_INFINITY]],
  ['flat', { v: 'exponential', slope: 0 }, [0, 0]],
] as const)('a field on a %s potential has n within its bounds', (_, values, range) => {
  expect(familyOf('field').law(values).exponentRange(0, Number.POSITIVE_INFINITY)).toEqual(range)
})

it('a field has no density without its history', () => {
  expect(() => familyOf('field').law({ v: 'linear', slope: 1 }).density(0)).toThrow(TypeError)
})

it('an unknown family and values of the wrong kind are refused', () => {
  expect(() => familyOf('none')).toThrow(RangeError)
  expect(() => numberOf({ w: [1] }, 'w')).toThrow(TypeError)
  expect(() => listOf({ w: 1 }, 'w')).toThrow(TypeError)
})
