/**
 * Davis & Lineweaver 2004, PASA 21, 97, arXiv:astro-ph/0310808 (DL1 to DL11 of published.json): flat, Ω_m = 0.3, H₀ = 70,
 * no radiation. Printed values to half a unit in the last place; values recomputed outside this project to their digits.
 */
import { describe, expect, test } from 'vitest'
import { sinceOrigin } from '../../lib/history/event'
import { brent } from '../../lib/numerics/roots'
import { expectNear, expectPrinted, expectRelative, PUBLISHED } from './published'
import { atRedshift, comoving, gly, gyr, measure, rate, universe } from './universe'

const solution = universe('matter:0.3,h0:70,cmb:0')

describe('measures of today', () => {
  test.each([
    ['superluminalRedshift', PUBLISHED.DL1],
    ['hubbleRadius', PUBLISHED.DL2],
    ['particleHorizon', PUBLISHED.DL3],
    ['eventHorizon', PUBLISHED.DL4],
    ['reachRedshift', PUBLISHED.DL5],
    ['age', PUBLISHED.DL8],
    ['futureVisibility', PUBLISHED.DL11],
  ] as const)('%s', (key, { value, recomputed }) => {
    expectPrinted(measure(solution, key), value)
    expectPrinted(measure(solution, key), recomputed)
  })
  test('age, closed form', () => {
    const closed = (2 / (3 * Math.sqrt(0.7))) * Math.asinh(Math.sqrt(0.7 / 0.3))
    // Rounding of 0.7 = 1 − 0.3 and of the sum over some forty panels.
    expectRelative(measure(solution, 'age'), closed * gyr(solution), 1e-14)
  })
})

describe('recession of the matter that emitted the background', () => {
  test('now', () => {
    expectPrinted(comoving(solution, 1100), PUBLISHED.DL6.value.replace(' c', ''))
    expectPrinted(comoving(solution, 1100), PUBLISHED.DL6.recomputed)
  })
  test('then', () => {
    const then = (rate(solution, 1100) * comoving(solution, 1100)) / 1101
    expectPrinted(then, PUBLISHED.DL7.value)
    expectPrinted(then, PUBLISHED.DL7.recomputed)
  })
})

describe('the past light cone', () => {
  const { DL9, DL10 } = PUBLISHED
  // Proper distance χ/(1+z) is largest where recession at emission is c: E χ = 1 + z.
  const z = brent((x) => rate(solution, x) * comoving(solution, x) - (1 + x), 0.5, 5)

  test('is widest where it crosses the Hubble sphere', () => {
    expectPrinted(z, DL9.recomputed.z)
    expectPrinted((comoving(solution, z) / (1 + z)) * gly(solution), DL9.recomputed.distance)
    const age = sinceOrigin(solution.history, atRedshift(solution, z), 'time') * gyr(solution)
    expectPrinted(age, DL9.recomputed.age)
  })
  test('and there indeed', () => {
    const width = (x: number) => comoving(solution, x) / (1 + x)
    for (const step of [1e-3, 0.1, 1]) {
      expect(width(z + step)).toBeLessThan(width(z))
      expect(width(z - step)).toBeLessThan(width(z))
    }
  })
  test('what has always receded faster than c', () => {
    // ȧ is smallest at the onset of acceleration, so that ȧ χ > 1 for ever beyond χ = 1/ȧ there.
    const onset = measure(solution, 'accelerationOnset')
    const chi = (1 + onset) / rate(solution, onset)
    expectPrinted(chi * gly(solution), DL10.recomputed.comoving)
    expectPrinted(
      brent((x) => comoving(solution, x) - chi, 1, 3),
      DL10.recomputed.z,
    )
  })
})

test('the redshift of a distance is the distance of a redshift', () => {
  // dχ/dz = 1/E is of order 1/2, so rounding of z and χ is all that may differ.
  expectNear(comoving(solution, measure(solution, 'superluminalRedshift')), 1, 1e-14)
  expectRelative(
    comoving(solution, measure(solution, 'reachRedshift')) * gly(solution),
    measure(solution, 'eventHorizon'),
    1e-14,
  )
})
