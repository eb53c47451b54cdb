/** Rules of thumb of the default universe: common practice, no source. Orders of magnitude hold to half a decade. */
import { expect, test } from 'vitest'
import { PARSEC } from '../../lib/constants'
import { perSecond } from '../../lib/units'
import { measure, universe } from './universe'

const solution = universe('matter:0.3111,h0:67.66')
const H = perSecond(solution.scenario.h0)

function expectOrder(actual: number, order: number): void {
  expect(Math.abs(Math.log10(actual / order)), `${actual} against ${order}`).toBeLessThan(0.5)
}

test('a metre stretches by about 1e-18 m per second', () => expectOrder(H, 1e-18))
test('about 1 km/s across a large galaxy, 30 kpc wide', () => expectOrder((H * 30e3 * PARSEC) / 1e3, 1))
test('recession at c near 14 to 15 Gly', () => {
  expect(measure(solution, 'hubbleRadius')).toBeGreaterThan(14)
  expect(measure(solution, 'hubbleRadius')).toBeLessThan(15)
})
test('an age of about 13.7 Gyr', () => {
  expect(measure(solution, 'age')).toBeGreaterThan(13.6)
  expect(measure(solution, 'age')).toBeLessThan(13.9)
})
