/** Redshift drift c H₀ Δt [1 − E/(1+z)]: Loeb 1998, ApJ 499, L111, arXiv:astro-ph/9802122 (SL1 to SL3 of published.json). */
import { expect, test } from 'vitest'
import { JULIAN_YEAR, SPEED_OF_LIGHT } from '../../lib/constants'
import { brent } from '../../lib/numerics/roots'
import { perSecond } from '../../lib/units'
import { expectPrinted, PUBLISHED } from './published'
import { rate, universe } from './universe'

const { SL1, SL2, SL3 } = PUBLISHED
const solution = universe('matter:0.3,h0:70,cmb:0')
/** cm/s */
const drift = (z: number, years: number) =>
  100 * SPEED_OF_LIGHT * perSecond(70) * years * JULIAN_YEAR * (1 - rate(solution, z) / (1 + z))

test('the unit: c times 100 km/s/Mpc times a year', () => {
  // The listed number counts 365 days to a year; ours is the Julian year of 365.25.
  const perYear = 100 * SPEED_OF_LIGHT * perSecond(100) * JULIAN_YEAR
  expectPrinted((perYear * 365) / 365.25, SL2.recomputed)
  expectPrinted(perYear, '3.066')
})
const { zero, ...table } = SL3.recomputed
test.each(Object.entries(table))('z = %s, over ten years', (z, expected) =>
  expectPrinted(drift(Number(z), 10), expected),
)
test('where it vanishes', () => {
  expectPrinted(
    brent((z) => drift(z, 1), 1, 3),
    zero,
  )
})
test('metres per second in a century', () => {
  // The abstract's order of magnitude: half a decade either side of 1 to 3 m/s at z of 5 and beyond.
  expect(SL1.value).toBe('a few m/s per century')
  expect(Math.abs(drift(5, 100)) / 100).toBeGreaterThan(0.3)
  expect(Math.abs(drift(5, 100)) / 100).toBeLessThan(10)
})
