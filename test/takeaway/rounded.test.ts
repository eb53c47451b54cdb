import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { readScenario } from '../../lib/scenario/read'
import { solve } from '../../lib/solve'
import { doubtsOf, halfUnit } from '../../lib/takeaway/known'
import { roundedBy, textOf } from '../../lib/takeaway/rounded'

const solved = (code: string) => {
  const reading = readScenario(code, null)
  if (!reading.ok) throw new Error(code)
  return solve(reading.value)
}

describe('half a unit of the last digit, with three digits at least', () => {
  test.each([
    [67.66, 0.005],
    [70, 0.05],
    [0.3, 0.0005],
    [0.3111, 0.00005],
    [-1.2, 0.005],
    [1e-6, 5e-9],
    [100, 0.5],
    [2.7255, 0.00005],
  ])('%d: %d', (value, half) => expect(halfUnit(value) / half).toBeCloseTo(1, 12))
})

describe('rounding', () => {
  test.each([
    [13.4623, 0.017, 0.01, '13.5'],
    [13.4623, 0.0099, 0.01, '13.46'],
    [13.4623, 0, 0.01, '13.46'],
    [3404.6, 12, 1, '3400'],
    [3404.6, 120, 1, '3000'],
    [0.64, 5, 0.01, '0.6'],
    [-0.5333, 0.0002, 0.001, '−0.533'],
    [0.0104131, 1e-8, 1e-6, '0.010413'],
    [99.96, 0.09, 0.01, '100.0'],
    [0, 0.1, 0.01, '0.00'],
    [12.3, Number.POSITIVE_INFINITY, 0.01, '10'],
    [1.23456e120, 1e118, 0.01, '1.23\u202f×\u202f10¹²⁰'],
    [9.996e-7, 1e-9, 1e-12, '1.000\u202f×\u202f10⁻⁶'],
  ])('%d known to %d: %s', (value, doubt, finest, text) => expect(textOf(roundedBy(value, doubt, finest))).toBe(text))

  test('the last digit is worth as much as the doubt or more, unless it is the only one', () => {
    const size = fc.integer({ min: -300, max: 300 }).map((power) => 10 ** (power / 100))
    fc.assert(
      fc.property(size, size, (value, doubt) => {
        const { value: kept, decimals } = roundedBy(value, doubt, 1e-9)
        const worth = 10 ** -decimals
        expect(Math.abs(kept - value)).toBeLessThanOrEqual(
          0.5 * Math.max(worth, 10 ** Math.ceil(Math.log10(doubt)), 0) * (1 + 1e-9),
        )
        if (decimals > 0)
          expect(worth >= doubt * (1 - 1e-9) || kept.toFixed(decimals).replace(/[0.]/g, '').length <= 1).toBe(true)
      }),
    )
  })
})

test('how far the age of a universe of matter alone is known', () => {
  // t = 2/(3 H) in flat space with Ω_m = 1: a change of H moves it by the same part; of Ω_m with the rest in Λ, by
  // dt/dΩ = −(2/3)(1/3)/H at Ω = 1 (expansion of the closed form of flat ΛCDM, t = (2/3) asinh√(Ω_Λ/Ω_m)/√Ω_Λ, in Ω_Λ).
  const solution = solved('h0:70,matter:1,cmb:0')
  const age = solution.measures.age.value as number
  const hubbleTime = 1.5 * age
  const expected = (age * 0.05) / 70 + (2 / 9) * hubbleTime * 0.005
  // Second order: (0.05/70)² and 0.005², of the first of which it is less than a hundredth.
  expect((doubtsOf(solution).get('age') as number) / expected).toBeCloseTo(1, 1.7)
})
